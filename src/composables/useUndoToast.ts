import { readonly, ref } from 'vue'
import { ProblemError } from '../api/ProblemError.ts'
import { useErrorMessage } from './useErrorMessage.ts'

export interface Toast {
  id: number
  text: string
  isProblem: boolean
  undo: (() => Promise<unknown>) | null
}

const toasts = ref<Toast[]>([])
let lastId = 0

/** Short news at the foot of the window, with a way back where there is one. `ToastHost` shows it. */
export function useUndoToast() {
  const errorMessage = useErrorMessage()

  /** "Bedroom 2 removed", with an Undo that runs `undo`. */
  function offerUndo(text: string, undo: () => Promise<unknown>): void {
    show({ text, undo, isProblem: false })
  }

  function say(text: string): void {
    show({ text, undo: null, isProblem: false })
  }

  function sayProblem(error: unknown): void {
    // The sign-in page, to which that leads, says it.
    if (error instanceof ProblemError && error.status === 401) return
    show({ text: errorMessage(error), undo: null, isProblem: true })
  }

  function dismiss(id: number): void {
    toasts.value = toasts.value.filter((toast) => toast.id !== id)
  }

  async function runUndo(toast: Toast): Promise<void> {
    dismiss(toast.id)
    try {
      await toast.undo?.()
    } catch (error) {
      sayProblem(error)
    }
  }

  return { toasts: readonly(toasts), offerUndo, say, sayProblem, dismiss, runUndo }
}

function show(toast: Omit<Toast, 'id'>): void {
  lastId += 1
  const TOASTS_MAX = 3
  toasts.value = [...toasts.value, { ...toast, id: lastId }].slice(-TOASTS_MAX)
}
