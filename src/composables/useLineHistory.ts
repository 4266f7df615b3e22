import { computed, shallowRef } from 'vue'
import { invertCommand, type EstimateCommand } from './estimateChange.ts'

/** Enough for a day's work; each step holds only what it changed. */
const STEPS_MAX = 500

/**
 * Undo and redo over everything that is done to an estimate: edits, additions, removals, moves, settings, and a paste or a fill as one step.
 * Steps go through `apply` like any other change, so they are saved against the lines' current versions.
 */
export function useLineHistory(apply: (command: EstimateCommand) => void) {
  const done = shallowRef<readonly EstimateCommand[]>([])
  const undone = shallowRef<readonly EstimateCommand[]>([])

  function run(command: EstimateCommand): void {
    if (command.changes.length === 0) return
    apply(command)
    done.value = [...done.value, command].slice(-STEPS_MAX)
    undone.value = []
  }

  /** Takes the last step back and answers with it, or `null` when there is none. */
  function undo(): EstimateCommand | null {
    const command = done.value.at(-1)
    if (!command) return null
    done.value = done.value.slice(0, -1)
    undone.value = [...undone.value, command]
    apply(invertCommand(command))
    return command
  }

  function redo(): EstimateCommand | null {
    const command = undone.value.at(-1)
    if (!command) return null
    undone.value = undone.value.slice(0, -1)
    done.value = [...done.value, command]
    apply(command)
    return command
  }

  /** Takes one step back wherever it stands, as the Undo of a toast does; later steps stay. */
  function takeBack(command: EstimateCommand): void {
    if (!done.value.includes(command)) return
    done.value = done.value.filter((step) => step !== command)
    apply(invertCommand(command))
  }

  return {
    run,
    undo,
    redo,
    takeBack,
    canUndo: computed(() => done.value.length > 0),
    canRedo: computed(() => undone.value.length > 0),
  }
}
