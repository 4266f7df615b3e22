import type { GridApi } from 'ag-grid-community'
import { shallowRef } from 'vue'
import type { GridRow } from './estimateRows.ts'
import { CELL_COLUMNS, type CellColumn } from './lineCells.ts'
import type { LineRow } from './lineRow.ts'

/** Lines and the columns of them that are selected: a block of cells, or whole rows picked one by one. */
export interface GridSelection {
  keys: ReadonlySet<string>
  columns: readonly CellColumn[]
}

export interface CellPlace {
  rowIndex: number
  column: CellColumn
}

const NOTHING: GridSelection = { keys: new Set(), columns: [] }
const MARK = 'is-selected'

/**
 * The light selection of the grid, which the community grid lacks: Shift with arrows or the mouse makes a block of cells, Ctrl with the mouse picks whole rows,
 * Shift+Space the row. It is drawn by classes on the cells that are on the screen; cells that scroll in ask `has`.
 */
export function useGridSelection(api: () => GridApi<GridRow> | null, root: () => HTMLElement | null) {
  const selection = shallowRef<GridSelection>(NOTHING)
  let anchor: CellPlace | null = null
  let head: CellPlace | null = null

  function columns(): CellColumn[] {
    const shown = api()?.getAllDisplayedColumns() ?? []
    return shown.map((column) => column.getColId()).filter(isCellColumn)
  }

  /** A block of cells from one corner to the other. */
  function extendTo(from: CellPlace, to: CellPlace): void {
    anchor = from
    head = to
    set(block(from, to))
  }

  /** One step of Shift with an arrow, from the focused cell where nothing is selected yet; answers where the far corner now is. */
  function extendBy(focused: CellPlace, rows: number, across: number): CellPlace {
    const isGoingOn = selection.value.keys.size > 0 && anchor !== null && head !== null
    const from = isGoingOn && anchor ? anchor : focused
    const before = isGoingOn && head ? head : focused
    const shown = columns()
    const at = Math.min(Math.max(shown.indexOf(before.column) + across, 0), shown.length - 1)
    const lastRow = (api()?.getDisplayedRowCount() ?? 1) - 1
    const to = { rowIndex: Math.min(Math.max(before.rowIndex + rows, 0), lastRow), column: shown[at] ?? before.column }
    extendTo(from, to)
    return to
  }

  /** Puts a whole row in or takes it out. The first time the focused row comes along. */
  function toggleRow(key: string, focusedKey: string | null): void {
    const isFirst = selection.value.keys.size === 0
    const keys = new Set(selection.value.keys)
    if (isFirst && focusedKey !== null && focusedKey !== key) keys.add(focusedKey)
    if (!keys.delete(key)) keys.add(key)
    set({ keys, columns: columns() })
  }

  function selectRows(keys: readonly string[]): void {
    set({ keys: new Set(keys), columns: columns() })
  }

  function clear(): void {
    anchor = null
    head = null
    set(NOTHING)
  }

  function block(from: CellPlace, to: CellPlace): GridSelection {
    const shown = columns()
    const [first, last] = sorted(from.rowIndex, to.rowIndex)
    const [left, right] = sorted(shown.indexOf(from.column), shown.indexOf(to.column))
    const keys = new Set<string>()
    for (let index = first; index <= last; index += 1) {
      const row = api()?.getDisplayedRowAtIndex(index)?.data
      if (row?.kind === 'line') keys.add(row.key)
    }
    return { keys, columns: shown.slice(left, right + 1) }
  }

  function set(fresh: GridSelection): void {
    const isSame = fresh.keys.size === 0 && selection.value.keys.size === 0
    selection.value = fresh
    if (!isSame) draw()
  }

  /** Classes of the rendered cells follow the selection; the grid itself needn't draw anything anew. */
  function draw(): void {
    root()
      ?.querySelectorAll(`.${MARK}`)
      .forEach((cell) => cell.classList.remove(MARK))
    if (selection.value.keys.size === 0) return
    const wanted = selection.value.columns.map((column) => `.ag-cell[col-id="${column}"]`).join(',')
    for (const node of api()?.getRenderedNodes() ?? []) {
      if (node.data === undefined || !selection.value.keys.has(node.data.key)) continue
      root()
        ?.querySelectorAll(`.ag-row[row-index="${node.rowIndex}"]`)
        .forEach((row) => row.querySelectorAll(wanted).forEach((cell) => cell.classList.add(MARK)))
    }
  }

  function has(key: string, column: string): boolean {
    return selection.value.keys.has(key) && (selection.value.columns as readonly string[]).includes(column)
  }

  /** The selected lines in the order that they are shown; none selected, none. */
  function rows(): LineRow[] {
    const found: LineRow[] = []
    if (selection.value.keys.size === 0) return found
    api()?.forEachNode(({ data }) => {
      if (data?.kind === 'line' && selection.value.keys.has(data.key)) found.push(data)
    })
    return found
  }

  /** Whether whole rows are meant and not cells of them. */
  function isWholeRows(): boolean {
    return selection.value.keys.size > 0 && selection.value.columns.length === columns().length
  }

  return { selection, extendTo, extendBy, toggleRow, selectRows, clear, has, rows, columns, isWholeRows }
}

export type GridSelectionHand = ReturnType<typeof useGridSelection>

export function isCellColumn(id: string): id is CellColumn {
  return (CELL_COLUMNS as readonly string[]).includes(id)
}

function sorted(a: number, b: number): [number, number] {
  return a <= b ? [a, b] : [b, a]
}
