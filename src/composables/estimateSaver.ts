import { computed, shallowRef } from 'vue'
import type { LineRow } from './lineRow.ts'
import type { SaveStep, StepOutcome } from './lineSaver.ts'

/** Patches of different lines need not wait for each other. */
const PATCHES_AT_ONCE = 4
const RETRY_FIRST_MS = 2_000
const RETRY_MAX_MS = 30_000
const NEEDS_A_PERSON = new Set<LineRow['state']>(['refused', 'at-odds', 'gone'])

export type EstimateSaveState = 'saved' | 'saving' | 'unsaved'

interface EstimateSaverOptions {
  nextStep(row: LineRow): SaveStep | null
  take(row: LineRow, step: SaveStep): Promise<StepOutcome>
  /** Sends what isn't a line's own (order, settings) once the lines are where they belong; `null` when there is nothing to send. */
  nextWhole(): (() => Promise<StepOutcome>) | null
  onState(rows: readonly LineRow[]): void
  /** Everything that could be sent has been. */
  onIdle(): void
}

/** Sends what has changed as soon as it can: additions and removals one by one in order, edits a few at a time, all else after them. */
export function createEstimateSaver({ nextStep, take, nextWhole, onState, onIdle }: EstimateSaverOptions) {
  const pending = new Set<LineRow>()
  const inFlight = new Map<LineRow, SaveStep>()
  let isSendingWhole = false
  let timer: ReturnType<typeof setTimeout> | undefined
  let retryMs = RETRY_FIRST_MS
  const isWaiting = shallowRef(false)
  const openCount = shallowRef(0)
  const troubled = shallowRef<readonly LineRow[]>([])

  const state = computed<EstimateSaveState>(() => {
    if (isWaiting.value || troubled.value.length > 0) return 'unsaved'
    return openCount.value > 0 ? 'saving' : 'saved'
  })

  /** Says that these lines may have something to send. */
  function want(rows: readonly LineRow[]): void {
    for (const row of rows) pending.add(row)
    review(rows)
    pump()
  }

  function pump(): void {
    if (!isWaiting.value) {
      startLines()
      startWhole()
    }
    recount()
    const isIdle = inFlight.size === 0 && !isSendingWhole && !isWaiting.value
    if (isIdle) onIdle()
  }

  function startLines(): void {
    let isOrderHeld = [...inFlight.values()].some((step) => step !== 'update')
    for (const row of pending) {
      if (inFlight.has(row)) continue
      if (isOrderHeld && inFlight.size >= PATCHES_AT_ONCE) break
      const step = nextStep(row)
      if (step === null) {
        pending.delete(row)
        continue
      }
      const isHeld = step === 'update' ? inFlight.size >= PATCHES_AT_ONCE : isOrderHeld
      if (isHeld) continue
      if (step !== 'update') isOrderHeld = true
      void send(row, step)
    }
  }

  async function send(row: LineRow, step: SaveStep): Promise<void> {
    inFlight.set(row, step)
    row.state = 'saving'
    onState([row])
    const outcome = await take(row, step).finally(() => inFlight.delete(row))
    follow(outcome)
    review([row])
    onState([row])
    pump()
  }

  function startWhole(): void {
    if (isSendingWhole || inFlight.size > 0 || pending.size > 0) return
    const sendWhole = nextWhole()
    if (!sendWhole) return
    isSendingWhole = true
    void sendWhole()
      .then(follow)
      .finally(() => {
        isSendingWhole = false
        pump()
      })
  }

  function follow(outcome: StepOutcome): void {
    if (outcome === 'done') {
      retryMs = RETRY_FIRST_MS
      return
    }
    isWaiting.value = true
    clearTimeout(timer)
    timer = setTimeout(retry, retryMs)
    retryMs = Math.min(retryMs * 2, RETRY_MAX_MS)
  }

  /** Tries again at once what waits for the server. */
  function retry(): void {
    clearTimeout(timer)
    isWaiting.value = false
    pump()
  }

  function recount(): void {
    openCount.value = pending.size + (isSendingWhole ? 1 : 0)
  }

  /** Keeps the list of lines whose changes a person has to see to before they can be saved. */
  function review(rows: readonly LineRow[]): void {
    const looked = new Set(rows)
    const inTrouble = rows.filter((row) => !row.isRemoved && NEEDS_A_PERSON.has(row.state))
    const hasNews = inTrouble.length > 0 || troubled.value.some((row) => looked.has(row))
    if (hasNews) troubled.value = [...troubled.value.filter((row) => !looked.has(row)), ...inTrouble]
  }

  return {
    state,
    troubled,
    want,
    retry,
    review,
    isBusy: () => inFlight.size > 0 || isSendingWhole,
    hasUnsent: () => pending.size > 0 || isSendingWhole || isWaiting.value,
    stop: () => clearTimeout(timer),
  }
}
