import { computed, nextTick, reactive, ref, watch, type Ref } from 'vue'
import type { z } from 'zod'
import { fieldProblems, issueWords } from '../../shared/schemas/fieldProblems.ts'
import { ProblemError } from '../api/ProblemError.ts'
import { useErrorMessage } from './useErrorMessage.ts'

interface FormSpec<Values extends object, Body> {
  /** The schema of the body, shared with the server. */
  schema: z.ZodType<Body>
  /** What the fields hold at first. */
  initial: () => Values
  submit: (body: Body) => Promise<void>
}

/**
 * A form as a declaration: checks its values by the shared schema, shows what is wrong field by field (what the server found, too)
 * and keeps everything that was typed when saving fails.
 */
export function useForm<Values extends object, Body>({ schema, initial, submit: send }: FormSpec<Values, Body>) {
  const errorMessage = useErrorMessage()
  const values = reactive(initial()) as Values
  const startText = ref(JSON.stringify(values))
  const schemaErrors: Ref<Record<string, string>> = ref({})
  /** What the server has against a field, until the field changes. */
  const serverErrors: Ref<Record<string, { message: string; about: string }>> = ref({})
  /** Fields that the form shows. What the server has against any other is said for the whole. */
  const shownPaths = new Set<string>()
  /** Fields whose text can't be read yet, by what their own control says. */
  const held: Record<string, string> = reactive({})
  /** What is wrong with the whole. */
  const problem = ref('')
  const isBusy = ref(false)
  const isChanged = computed(() => JSON.stringify(values) !== startText.value)
  let hasBeenTried = false

  watch(values, () => {
    if (hasBeenTried) check()
    const stillTrue = Object.entries(serverErrors.value).filter(([path, { about }]) => about === textAt(path))
    serverErrors.value = Object.fromEntries(stillTrue)
  })

  function check(): Body | null {
    const parsed = schema.safeParse(values, { error: issueWords })
    schemaErrors.value = parsed.success ? {} : firstByPath(fieldProblems(parsed.error))
    return parsed.success ? parsed.data : null
  }

  function errorOf(path: string): string {
    shownPaths.add(path)
    return schemaErrors.value[path] ?? serverErrors.value[path]?.message ?? ''
  }

  /** Keeps the form from being sent while a control holds text that can't be read; no message releases it. */
  function hold(path: string, message: string): void {
    if (message === '') delete held[path]
    else held[path] = message
  }

  async function submit(event?: Event): Promise<void> {
    const form = event?.currentTarget
    event?.preventDefault()
    if (isBusy.value) return
    hasBeenTried = true
    problem.value = ''
    const body = check()
    const isReadable = Object.keys(held).length === 0
    if (body !== null && isReadable) await trySending(body)
    if (form instanceof HTMLElement) await focusFirstError(form)
  }

  async function trySending(body: Body): Promise<void> {
    isBusy.value = true
    try {
      await send(body)
      startText.value = JSON.stringify(values)
    } catch (error) {
      take(error)
    } finally {
      isBusy.value = false
    }
  }

  function take(error: unknown): void {
    const errors = error instanceof ProblemError ? error.errors : []
    serverErrors.value = Object.fromEntries(errors.map(({ path, message }) => [path, { message, about: textAt(path) }]))
    const isSaidByFields = errors.length > 0 && errors.every(({ path }) => shownPaths.has(path))
    problem.value = isSaidByFields ? '' : errorMessage(error)
  }

  function textAt(path: string): string {
    return JSON.stringify(valueAt(values, path)) ?? ''
  }

  /** Puts other values in, as though the form had just been opened with them. */
  function reset(fresh: Values = initial()): void {
    Object.assign(values, fresh)
    startText.value = JSON.stringify(values)
    schemaErrors.value = {}
    serverErrors.value = {}
    problem.value = ''
    hasBeenTried = false
  }

  return reactive({ values, problem, isBusy, isChanged, errorOf, hold, submit, reset })
}

async function focusFirstError(form: HTMLElement): Promise<void> {
  await nextTick()
  form.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus()
}

function firstByPath(problems: readonly { path: string; message: string }[]): Record<string, string> {
  return Object.fromEntries([...problems].reverse().map(({ path, message }) => [path, message]))
}

/** `openings[0].widthIn` in a value, or `undefined`. */
function valueAt(value: unknown, path: string): unknown {
  const steps = path.split(/[.[\]]+/).filter((step) => step !== '')
  return steps.reduce<unknown>(
    (at, step) => (typeof at === 'object' && at !== null ? (at as Record<string, unknown>)[step] : undefined),
    value,
  )
}
