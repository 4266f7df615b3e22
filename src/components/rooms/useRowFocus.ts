import { nextTick, type Ref } from 'vue'
import { focusField } from './moveToNextField.ts'

/** Keeps the keyboard in a list of rows: in the first length of a new row, and at a neighbour when a row has gone. */
export function useRowFocus(list: Readonly<Ref<HTMLElement | null>>) {
  async function focusRow(id: number): Promise<void> {
    await nextTick()
    focusField(list.value?.querySelector(`[data-row="${id}"] input.control`))
  }

  async function focusAfterRemoval(index: number): Promise<void> {
    await nextTick()
    const rows = [...(list.value?.querySelectorAll('[data-row]') ?? [])]
    const neighbour = rows[Math.min(index, rows.length - 1)]
    focusField(neighbour?.querySelector('select, input.control'))
  }

  return { focusRow, focusAfterRemoval }
}
