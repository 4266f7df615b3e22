import { computed, ref, shallowRef, watch } from 'vue'
import { roomName } from './lineCells.ts'
import type { LineRow } from './lineRow.ts'
import type { EstimateDesk } from './useEstimateDesk.ts'
import { findHouseSystem } from '../../shared/catalogue/houseSystems.ts'

/** Find in the estimate: the browser's own sees only the rows that are drawn. Every word must be somewhere in the line. */
export function useLineFind({ model, rows }: EstimateDesk) {
  const isOpen = ref(false)
  const question = ref('')
  const found = shallowRef<readonly string[]>([])
  const at = ref(-1)
  const isFound = (key: string): boolean => isOpen.value && keys.value.has(key)
  const keys = computed(() => new Set(found.value))

  watch([question, isOpen], look)

  function look(): void {
    const words = question.value.toLowerCase().split(/\s+/).filter(Boolean)
    const inOrder = words.length === 0 || !isOpen.value ? [] : linesInOrder().filter((row) => matches(row, words))
    found.value = inOrder.map(({ key }) => key)
    at.value = -1
  }

  /** Lines in the order that they are shown, those in folded groups too. */
  function linesInOrder(): LineRow[] {
    const shown = rows.shownLines()
    const isShown = new Set(shown)
    return [...shown, ...model.list.rows().filter((row) => !isShown.has(row))]
  }

  function matches(row: LineRow, words: readonly string[]): boolean {
    const { description, note, quantity, system, trade, roomId } = row.fields
    const systemTitle = findHouseSystem(system)?.title ?? system
    const text = [description, note, quantity, systemTitle, trade, roomName(roomId, model.rooms.value)].join('\n').toLowerCase()
    return words.every((word) => text.includes(word))
  }

  /** The next (1) or the previous (-1) line that holds what is looked for; wraps. */
  function step(by: -1 | 1): LineRow | null {
    if (found.value.length === 0) return null
    at.value = at.value < 0 && by === -1 ? found.value.length - 1 : (at.value + by + found.value.length) % found.value.length
    const key = found.value[at.value]
    const row = key === undefined ? undefined : model.list.find(key)
    if (row) rows.reveal(row)
    return row ?? null
  }

  return { isOpen, question, found, at, isFound, step }
}

export type LineFind = ReturnType<typeof useLineFind>
