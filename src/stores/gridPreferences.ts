import type { ColumnState } from 'ag-grid-community'
import { defineStore } from 'pinia'
import { ref, watch } from 'vue'
import { GROUPINGS, type Grouping } from '../composables/estimateRows.ts'

const STORAGE_KEY = 'quoinbook-estimate-grid'

interface Remembered {
  grouping: Grouping
  columns: ColumnState[]
  isWhyOpen: boolean
}

/** How a person likes the estimate grid: its grouping, its columns' widths and order, whether the working is open. Remembered on this device. */
export const useGridPreferences = defineStore('grid-preferences', () => {
  const remembered = read()
  const grouping = ref<Grouping>(GROUPINGS.find((known) => known === remembered.grouping) ?? 'room')
  const columns = ref<ColumnState[]>(Array.isArray(remembered.columns) ? remembered.columns : [])
  const isWhyOpen = ref(remembered.isWhyOpen === true)

  watch([grouping, columns, isWhyOpen], () => keep({ grouping: grouping.value, columns: columns.value, isWhyOpen: isWhyOpen.value }))

  return { grouping, columns, isWhyOpen }
})

function read(): Partial<Remembered> {
  try {
    const value: unknown = JSON.parse(localStorage.getItem(STORAGE_KEY) ?? '{}')
    return typeof value === 'object' && value !== null ? value : {}
  } catch {
    // Storage is switched off, or holds something else: the grid then begins as it comes.
    return {}
  }
}

function keep(preferences: Remembered): void {
  try {
    localStorage.setItem(STORAGE_KEY, JSON.stringify(preferences))
  } catch {
    return
  }
}
