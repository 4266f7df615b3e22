import { computed, getCurrentScope, onScopeDispose, ref, shallowRef } from 'vue'
import { ProblemError } from '../api/ProblemError.ts'
import type { FieldProblem } from '../../shared/schemas/problem.ts'
import { fieldAt, withFieldAt } from './fieldPaths.ts'
import { isSame, mergeFields, type FieldConflict } from './mergeFields.ts'

export interface MergedSaveOptions<Fields extends object, Saved extends { version: number }> {
  /** What a person keys of the record. */
  fieldsOf(saved: Saved): Fields
  /** Writes a patch against the version that it was made from; throws what `http` throws. */
  send(saved: Saved, patch: Partial<Fields>): Promise<Saved>
  onSaved?(saved: Saved): void
  /** Somebody else's values have come in for these fields, and nothing of mine stood against them. */
  onTheirs?(fields: Fields, keys: (keyof Fields)[]): void
  /** How long typing must rest before it is sent. */
  delayMs?: number
}

/** `waiting`: for the connection; `refused`: for a person to put a field right; `conflict`: for a person to choose. */
export type SaveStatus = 'saved' | 'saving' | 'waiting' | 'refused' | 'conflict'

const DELAY_MS = 600
const RETRY_FIRST_MS = 2_000
const RETRY_LONGEST_MS = 30_000
/** Two people typing into one record overtake each other now and then, not forever. */
const MERGES_MAX = 5

/**
 * Saves a record as it is keyed: waits for a rest in the typing, writes with `If-Match`, merges what somebody else saved meanwhile, keeps both values of
 * what is at odds, keeps what the server refuses, and tries again by itself when there is no connection. `mine` never loses what was typed.
 */
export function useMergedSave<Fields extends object, Saved extends { version: number }>(
  first: Saved,
  options: MergedSaveOptions<Fields, Saved>,
) {
  const { fieldsOf, send, onSaved, onTheirs, delayMs = DELAY_MS } = options
  type Key = keyof Fields & string

  const saved = shallowRef(first)
  const mine = shallowRef(fieldsOf(first))
  const conflicts = ref<FieldConflict[]>([])
  /** What the server had against a field, by its path in the patch. */
  const fieldErrors = ref<readonly FieldProblem[]>([])
  const problem = shallowRef<unknown>(null)
  const isSending = ref(false)
  let underWay: Promise<void> | null = null
  let timer: ReturnType<typeof setTimeout> | undefined
  let failures = 0

  const changedKeys = computed(() => {
    const was = fieldsOf(saved.value)
    return (Object.keys(mine.value) as Key[]).filter((key) => !isSame(mine.value[key], was[key]))
  })
  const sendableKeys = computed(() => {
    const heldBack = [...conflicts.value, ...fieldErrors.value].map(({ path }) => topKey(path))
    return changedKeys.value.filter((key) => !heldBack.includes(key))
  })
  const isWaiting = computed(() => problem.value !== null && isWorthRetrying(problem.value))
  const status = computed<SaveStatus>(() => {
    if (conflicts.value.length > 0) return 'conflict'
    if (isWaiting.value) return 'waiting'
    if (problem.value !== null || fieldErrors.value.length > 0) return 'refused'
    return isSending.value || changedKeys.value.length > 0 ? 'saving' : 'saved'
  })

  function edit(change: Partial<Fields>): void {
    const edited = (Object.keys(change) as Key[]).filter((key) => !isSame(change[key], mine.value[key]))
    if (edited.length === 0) return
    mine.value = { ...mine.value, ...change }
    fieldErrors.value = fieldErrors.value.filter(({ path }) => !edited.includes(topKey(path) as Key))
    conflicts.value = conflicts.value
      .map((conflict) => ({ ...conflict, mine: fieldAt(mine.value, conflict.path) }))
      .filter((conflict) => !isSame(conflict.mine, conflict.theirs))
    if (!isWaiting.value) problem.value = null
    schedule(isWaiting.value ? retryDelay() : delayMs)
  }

  /** Sends what there is to send now; resolves when it is saved or can't be. */
  function flush(): Promise<void> {
    clearTimeout(timer)
    underWay ??= sendAll().finally(() => {
      underWay = null
    })
    return underWay
  }

  async function sendAll(): Promise<void> {
    isSending.value = true
    try {
      for (let merges = 0; sendableKeys.value.length > 0 && merges < MERGES_MAX;) {
        const wasStale = await sendOnce()
        if (wasStale) merges += 1
        if (problem.value !== null) return
      }
    } finally {
      isSending.value = false
    }
  }

  /** Whether the record had moved on, so that the patch must be made anew. */
  async function sendOnce(): Promise<boolean> {
    const patch = Object.fromEntries(sendableKeys.value.map((key) => [key, mine.value[key]])) as Partial<Fields>
    try {
      accept(await send(saved.value, patch), patch)
      failures = 0
      problem.value = null
      return false
    } catch (error) {
      if (error instanceof ProblemError && error.isStale && isRecord<Saved>(error.current)) {
        hear(error.current)
        return true
      }
      refuse(error, patch)
      return false
    }
  }

  function accept(answer: Saved, patch: Partial<Fields>): void {
    const isOutrun = answer.version < saved.value.version
    if (isOutrun) return
    const [was, now] = [fieldsOf(saved.value), fieldsOf(answer)]
    const next = { ...mine.value }
    for (const key of Object.keys(now) as Key[]) {
      const sent = key in patch ? patch[key] : was[key]
      if (isSame(next[key], sent)) next[key] = now[key]
    }
    mine.value = next
    saved.value = answer
    onSaved?.(answer)
  }

  function refuse(error: unknown, patch: Partial<Fields>): void {
    const isAboutPatch = error instanceof ProblemError && error.status === 422 && error.errors.some(({ path }) => topKey(path) in patch)
    if (isAboutPatch) {
      fieldErrors.value = [...fieldErrors.value, ...error.errors]
      return
    }
    problem.value = error
    if (!isWorthRetrying(error)) return
    failures += 1
    schedule(retryDelay(error))
  }

  /** Takes in the record as somebody else left it. */
  function hear(current: Saved): void {
    if (current.version <= saved.value.version) return
    const before = mine.value
    const { merged, conflicts: fresh } = mergeFields(fieldsOf(saved.value), before, fieldsOf(current))
    const stillOpen = conflicts.value.filter(({ path }) => fresh.every((conflict) => conflict.path !== path))
    saved.value = current
    mine.value = fresh.reduce((fields, conflict) => withFieldAt(fields, conflict.path, conflict.mine), merged)
    conflicts.value = [...stillOpen, ...fresh]
    tellTheirs(before)
    onSaved?.(current)
  }

  function tellTheirs(before: Fields): void {
    const keys = (Object.keys(mine.value) as Key[]).filter((key) => !isSame(mine.value[key], before[key]))
    if (keys.length > 0) onTheirs?.(mine.value, keys)
  }

  function keepMine(path: string): void {
    conflicts.value = conflicts.value.filter((conflict) => conflict.path !== path)
    schedule(0)
  }

  function takeTheirs(path: string): void {
    const before = mine.value
    mine.value = withFieldAt(before, path, fieldAt(fieldsOf(saved.value), path))
    tellTheirs(before)
    keepMine(path)
  }

  function retryDelay(error: unknown = null): number {
    const asked = error instanceof ProblemError ? error.retryAfterSeconds : null
    return asked === null ? Math.min(RETRY_FIRST_MS * 2 ** Math.max(0, failures - 1), RETRY_LONGEST_MS) : asked * 1000
  }

  function schedule(inMs: number): void {
    clearTimeout(timer)
    timer = setTimeout(() => void flush(), inMs)
  }

  /** Tries again at once: a person asked for it, or the connection is back. */
  function retry(): Promise<void> {
    problem.value = null
    fieldErrors.value = []
    return flush()
  }

  function retryWhenBack(): void {
    if (isWaiting.value) void retry()
  }

  window.addEventListener('online', retryWhenBack)

  /** Sends what is left and stops trying by itself. */
  function stop(): Promise<void> {
    window.removeEventListener('online', retryWhenBack)
    return flush().finally(() => clearTimeout(timer))
  }

  if (getCurrentScope()) onScopeDispose(() => void stop())

  return { saved, mine, status, problem, fieldErrors, conflicts, edit, hear, keepMine, takeTheirs, flush, retry, stop }
}

function topKey(path: string): string {
  return /^[^.[]*/.exec(path)?.[0] ?? path
}

function isRecord<Saved extends { version: number }>(value: unknown): value is Saved {
  return typeof value === 'object' && value !== null && 'version' in value && typeof value.version === 'number'
}

/** The connection or the server failed, not the patch. */
function isWorthRetrying(error: unknown): boolean {
  return error instanceof ProblemError && (error.isUnreachable || error.status === 429 || error.status >= 500)
}
