import type { GridApi, IRowNode } from 'ag-grid-community'
import { nextTick, onScopeDispose } from 'vue'
import type { GridRow } from './estimateRows.ts'
import { rowsDiff } from './rowsDiff.ts'
import type { EstimateRows, RowsNews } from './useEstimateRows.ts'

/** Keeps the grid's rows like the estimate's: a changed line is drawn anew alone, and after a move the focus stays with its line. */
export function useGridSync(rows: EstimateRows, api: () => GridApi<GridRow> | null) {
  let isStaying = false
  /** The rows that the grid has. */
  let shown = rows.rows.value
  const stop = rows.onNews((news) => {
    const grid = api()
    if (grid) follow(grid, news)
  })
  onScopeDispose(stop)

  function follow(grid: GridApi<GridRow>, news: RowsNews): void {
    if (news.kind === 'order') reorder(grid)
    else redraw(grid, news.rows)
  }

  function reorder(grid: GridApi<GridRow>): void {
    // The grid gives undefined, whatever its type says, while no cell has the focus.
    const focused = grid.getFocusedCell() ?? null
    const key = focused === null ? undefined : grid.getDisplayedRowAtIndex(focused.rowIndex)?.data?.key
    takeRows(grid)
    if (focused === null || key === undefined || isStaying) return
    const now = grid.getRowNode(key)?.rowIndex ?? null
    // Where the focused line is gone, the focus stays where it was, on the line that moved up.
    const goal = now ?? Math.min(focused.rowIndex, grid.getDisplayedRowCount() - 1)
    if (now !== focused.rowIndex && goal >= 0) grid.setFocusedCell(goal, focused.column)
  }

  /** What comes and goes is handed over by itself; only rows that changed places need the whole list, in which the grid finds its rows by their ids. */
  function takeRows(grid: GridApi<GridRow>): void {
    const diff = rowsDiff(shown, rows.rows.value)
    shown = rows.rows.value
    if (diff === null) grid.setGridOption('rowData', [...shown])
    else if (diff.remove.length + diff.add.length > 0) grid.applyTransaction(diff)
  }

  /** A cell that is being edited would begin anew. */
  function otherColumns(grid: GridApi<GridRow>, editedColumn: string): string[] {
    return grid.getAllDisplayedColumns().flatMap((column) => (column.getColId() === editedColumn ? [] : [column.getColId()]))
  }

  function refresh(grid: GridApi<GridRow>, rowNodes: IRowNode<GridRow>[], columns?: string[]): void {
    if (rowNodes.length > 0) grid.refreshCells({ rowNodes, force: true, suppressFlash: true, ...(columns ? { columns } : {}) })
  }

  /** Does something to the focused line that may take it elsewhere, and leaves the focus where it is, on the line that comes into its place. */
  function stay(grid: GridApi<GridRow>, act: () => void): void {
    const focused = grid.getFocusedCell()
    isStaying = true
    act()
    isStaying = false
    // The grid itself moves on after an entry, but from where its line went to.
    void nextTick(() => focused && grid.setFocusedCell(Math.min(focused.rowIndex, grid.getDisplayedRowCount() - 1), focused.column))
  }

  function redraw(grid: GridApi<GridRow>, changed: readonly GridRow[]): void {
    const isMany = changed.length > 100
    const rowNodes = isMany ? grid.getRenderedNodes() : changed.flatMap(({ key }) => grid.getRowNode(key) ?? [])
    const lineNodes = rowNodes.filter(({ data }) => data?.kind === 'line')
    const [edited] = grid.getEditingCells()
    const isEdited = (node: IRowNode<GridRow>) => edited !== undefined && node.rowIndex === edited.rowIndex
    refresh(
      grid,
      lineNodes.filter((node) => !isEdited(node)),
    )
    if (edited) refresh(grid, lineNodes.filter(isEdited), otherColumns(grid, edited.colId))
    for (const node of rowNodes) if (node.data && node.data.kind !== 'line') node.setData(node.data)
  }

  return { stay }
}
