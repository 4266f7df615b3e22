import type { GridApi } from 'ag-grid-community'
import type { GridRow } from './estimateRows.ts'
import type { CellColumn } from './lineCells.ts'
import { isCellColumn, type GridSelectionHand } from './useGridSelection.ts'

interface GridMouseOptions {
  api(): GridApi<GridRow> | null
  selection: GridSelectionHand
  /** A click on a head, or on the place at a foot where a line is added. */
  onHead(row: GridRow): void
  onFoot(row: GridRow): void
  onDoubleClick(row: GridRow, column: CellColumn): void
}

/**
 * The mouse in the grid, read from the page's own events: the grid hands its events over a moment later, and a key that is pressed right after a click would
 * find the selection of before.
 */
export function useGridMouse({ api, selection, onHead, onFoot, onDoubleClick }: GridMouseOptions) {
  /** The cell under an event; `column` is `null` on a head. */
  function placeOf({ target }: Event): { row: GridRow; rowIndex: number; column: CellColumn | null } | null {
    const rowElement = target instanceof Element ? target.closest('.ag-row') : null
    const isEditor = target instanceof Element && target.closest('.cell-editor') !== null
    const rowIndex = Number(rowElement?.getAttribute('row-index') ?? NaN)
    const row = Number.isNaN(rowIndex) || isEditor ? undefined : api()?.getDisplayedRowAtIndex(rowIndex)?.data
    const column = target instanceof Element ? (target.closest('.ag-cell')?.getAttribute('col-id') ?? '') : ''
    return row ? { row, rowIndex, column: isCellColumn(column) ? column : null } : null
  }

  /** Before the grid moves its focus: where it was is where Shift begins. */
  function onMouseDown(event: MouseEvent): void {
    const place = placeOf(event)
    if (event.button !== 0 || place === null || place.column === null) return
    const focused = api()?.getFocusedCell() ?? null
    const from = focused?.column.getColId() ?? ''
    if (event.shiftKey && focused && isCellColumn(from)) {
      selection.extendTo({ rowIndex: focused.rowIndex, column: from }, { rowIndex: place.rowIndex, column: place.column })
    } else if (event.ctrlKey || event.metaKey) {
      selection.toggleRow(place.row.key, focused === null ? null : (api()?.getDisplayedRowAtIndex(focused.rowIndex)?.data?.key ?? null))
    } else {
      selection.clear()
    }
  }

  /** Dragging makes a block from the cell that was pressed. */
  function onMouseOver(event: MouseEvent): void {
    const place = event.buttons === 1 ? placeOf(event) : null
    const focused = api()?.getFocusedCell() ?? null
    const from = focused?.column.getColId() ?? ''
    const isEditing = (api()?.getEditingCells().length ?? 0) > 0
    if (place === null || place.column === null || focused === null || !isCellColumn(from) || isEditing) return
    const isSameCell = focused.rowIndex === place.rowIndex && from === place.column
    if (isSameCell && selection.selection.value.keys.size === 0) return
    selection.extendTo({ rowIndex: focused.rowIndex, column: from }, { rowIndex: place.rowIndex, column: place.column })
  }

  function onClick(event: MouseEvent): void {
    const place = placeOf(event)
    if (place?.row.kind === 'head') onHead(place.row)
    if (place?.row.kind === 'foot' && place.column === 'description') onFoot(place.row)
  }

  function onDblClick(event: MouseEvent): void {
    const place = placeOf(event)
    if (place?.column) onDoubleClick(place.row, place.column)
  }

  return { placeOf, onMouseDown, onMouseOver, onClick, onDblClick }
}
