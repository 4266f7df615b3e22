import type { GridApi, SuppressKeyboardEventParams } from 'ag-grid-community'
import type { GridRow, GroupRow } from './estimateRows.ts'
import { gridIntent, type GridIntent } from './gridKeys.ts'
import type { CellColumn } from './lineCells.ts'
import type { LineRow } from './lineRow.ts'
import type { EstimateDesk } from './useEstimateDesk.ts'
import type { GridSelectionHand } from './useGridSelection.ts'
import type { useGridEditing } from './useGridEditing.ts'

interface GridKeysOptions {
  desk: EstimateDesk
  selection: GridSelectionHand
  editing: ReturnType<typeof useGridEditing>
  /** Begins to add a line below a row of the grid. */
  addBelow(row: GridRow, typed: string): void
  /** Commands that the page has for itself. */
  command(intent: 'undo' | 'redo' | 'find' | 'saved' | 'help'): void
  /** Moves the focus out of the grid. */
  leave(isBack: boolean): void
}

interface Focus {
  row: GridRow
  column: CellColumn
  rowIndex: number
}

/** The spreadsheet's hand on the grid: everything that the community grid doesn't do by itself. */
export function useGridKeys({ desk, selection, editing, addBelow, command, leave }: GridKeysOptions) {
  const { edits, rows, isReadOnly } = desk
  /** Escape was the last key: Tab now leaves the grid. */
  let isLeaving = false

  /** For the grid's `suppressKeyboardEvent`: `true` when the key has been taken here. */
  function onKey({ event, editing: isEditing, data, column, node, api }: SuppressKeyboardEventParams<GridRow>): boolean {
    if (data === undefined || event.isComposing) return false
    if (isEditing) return onEditorKey(event, api)
    const focus: Focus = { row: data, column: column.getColId() as CellColumn, rowIndex: node.rowIndex ?? 0 }
    if (data.kind === 'foot' && addsAtFoot(event, focus.row)) return true
    const intent = gridIntent(event, focus.column)
    const wasLeaving = isLeaving
    isLeaving = intent?.kind === 'escape'
    if (intent === null) {
      if (!event.shiftKey && !event.ctrlKey && /^(Arrow|Page)/.test(event.key)) selection.clear()
      return false
    }
    if (intent.kind === 'tab' && !wasLeaving) return false
    event.preventDefault()
    carryOut(intent, focus, api)
    return true
  }

  /** Tab keeps what was keyed and moves on, as a spreadsheet does it; the grid would begin to edit the next cell. */
  function onEditorKey(event: KeyboardEvent, api: GridApi<GridRow>): boolean {
    if (event.key !== 'Tab') return false
    event.preventDefault()
    api.stopEditing()
    if (event.shiftKey) api.tabToPreviousCell()
    else api.tabToNextCell()
    return true
  }

  /** At the foot of a group Enter, or the beginning of a word, adds a line. */
  function addsAtFoot(event: KeyboardEvent, row: GridRow): boolean {
    const isPlain = !event.ctrlKey && !event.metaKey && !event.altKey
    const isLetter = [...event.key].length === 1 && event.key !== '?' && event.key !== ' '
    const isOpening = event.key === 'Enter' || event.key === 'F2'
    if (isReadOnly || !isPlain || !(isLetter || isOpening)) return false
    event.preventDefault()
    addBelow(row, isLetter ? event.key : '')
    return true
  }

  function carryOut(intent: GridIntent, focus: Focus, api: GridApi<GridRow>): void {
    switch (intent.kind) {
      case 'undo':
      case 'redo':
      case 'find':
      case 'saved':
      case 'help':
        return command(intent.kind)
      case 'escape':
        return selection.clear()
      case 'tab':
        return leave(intent.isBack)
      case 'extend': {
        const corner = selection.extendBy(focus, intent.rows, intent.across)
        return api.ensureIndexVisible(corner.rowIndex)
      }
      case 'go':
        selection.clear()
        return go(intent.to, focus, api)
      case 'select-all':
        return selection.selectRows(rows.shownLines().map(({ key }) => key))
      case 'select-row':
        if (focus.row.kind === 'line') selection.toggleRow(focus.row.key, null)
        return
      default:
        if (!isReadOnly) change(intent, focus)
    }
  }

  function go(to: 'row-start' | 'row-end' | 'first' | 'last', { rowIndex }: Focus, api: GridApi<GridRow>): void {
    const columns = selection.columns()
    const column = to === 'row-start' || to === 'first' ? columns[0] : columns.at(-1)
    const row = to === 'first' ? 0 : to === 'last' ? api.getDisplayedRowCount() - 1 : rowIndex
    if (column === undefined) return
    api.ensureIndexVisible(row)
    api.setFocusedCell(row, column)
  }

  function change(intent: GridIntent, { row, column }: Focus): void {
    if (intent.kind === 'add-line') return addBelow(row, '')
    if (row.kind !== 'line') return
    const targets = selection.rows().length > 0 ? selection.rows() : [row]
    const columns = selection.rows().length > 0 ? selection.selection.value.columns : [column]
    switch (intent.kind) {
      case 'clear':
        return editing.clear(targets, columns)
      case 'fill-down':
        return fillDown(row, targets, columns)
      case 'remove-lines':
        return desk.removeLines(targets.map(({ key }) => key))
      case 'move':
        return move(row, targets, intent.step)
      case 'mark':
        edits.edit(
          targets.map(({ key }) => ({ key, after: { evidence: intent.mark } })),
          'change of evidence',
        )
        return
      case 'basis':
        edits.edit(
          targets.map((target) => ({ key: target.key, after: { basis: basisFor(intent.basis, target) } })),
          'change between own hands and hired',
        )
        return
      case 'price':
        return desk.open({ kind: 'price', key: row.key, typed: intent.typed })
    }
  }

  /** With nothing selected the cell takes what stands above it. */
  function fillDown(row: LineRow, targets: readonly LineRow[], columns: readonly CellColumn[]): void {
    const shown = rows.shownLines()
    const above = shown[shown.indexOf(row) - 1]
    editing.fillDown(targets.length > 1 ? targets : above ? [above, row] : [], columns)
  }

  function move(row: LineRow, targets: readonly LineRow[], step: -1 | 1): void {
    const group = rows.group(row).map(({ key }) => key)
    const inGroup = targets.map(({ key }) => key).filter((key) => group.includes(key))
    const isMoved = edits.move(inGroup, step, group)
    if (!isMoved) desk.say(step === -1 ? 'It is the first of its group already.' : 'It is the last of its group already.')
  }

  /** A head folds and opens. */
  function onHeadKey(event: KeyboardEvent, head: GroupRow): void {
    const folds = event.key === 'ArrowLeft' && !head.isCollapsed
    const opens = event.key === 'ArrowRight' && head.isCollapsed
    if (event.key === 'Enter' || event.key === ' ' || folds || opens) {
      event.preventDefault()
      rows.toggle(head.groupKey)
    }
  }

  return { onKey, onHeadKey }
}

function basisFor(wanted: 'own-hands' | 'hired' | 'other', { fields }: LineRow): LineRow['fields']['basis'] {
  if (wanted !== 'other') return wanted
  return fields.basis === 'hired' ? 'own-hands' : 'hired'
}
