import type { CellMark, EstimateChange } from './estimateChange.ts'
import { CELL_COLUMNS, type CellColumn } from './lineCells.ts'
import { clipLines, readClip } from './lineClip.ts'
import type { LineRow } from './lineRow.ts'
import { planPaste, type PastePlan } from './pastePlan.ts'
import type { EstimateDesk } from './useEstimateDesk.ts'

/** A paste of more rows than this is shown before it is done. */
const PREVIEW_OVER_ROWS = 50

/** Where the keyboard is: the focused cell, and what is selected. */
export interface ClipboardPlace {
  focused: { row: LineRow; column: CellColumn } | null
  selected: readonly LineRow[]
  columns: readonly CellColumn[]
  isWholeRows: boolean
  /** Columns in the order that they are shown. */
  shownColumns: readonly CellColumn[]
}

/** Copy, cut and paste of lines and cells, with other programs as with this one. */
export function useGridClipboard(desk: EstimateDesk, clear: (rows: readonly LineRow[], columns: readonly CellColumn[]) => void) {
  const { model, edits, rows, say } = desk

  /** Puts the selection, or the focused cell, on the clipboard. Answers whether there was something. */
  function copy(data: DataTransfer, place: ClipboardPlace): boolean {
    const { lines, columns, isWholeRows } = taken(place)
    if (lines.length === 0) return false
    const { text, html } = clipLines(lines, columns, isWholeRows, model.rooms.value)
    data.setData('text/plain', text)
    data.setData('text/html', html)
    return true
  }

  function cut(data: DataTransfer, place: ClipboardPlace): boolean {
    if (!copy(data, place)) return false
    const { lines, columns, isWholeRows } = taken(place)
    if (isWholeRows) desk.removeLines(lines.map(({ key }) => key))
    else clear(lines, columns)
    return true
  }

  function taken({ focused, selected, columns, isWholeRows }: ClipboardPlace) {
    if (selected.length > 0) return { lines: selected, columns: isWholeRows ? CELL_COLUMNS : columns, isWholeRows }
    return { lines: focused ? [focused.row] : [], columns: focused ? [focused.column] : [], isWholeRows: false }
  }

  function paste(text: string, place: ClipboardPlace): void {
    const clip = readClip(text)
    if (clip.lines !== null) {
      pasteLines(clip.lines, place)
      return
    }
    const plan = planOf(clip.cells, place)
    if (plan === null) return
    if (plan.rowCount > PREVIEW_OVER_ROWS) desk.open({ kind: 'paste', plan, confirm: () => carryOut(plan) })
    else carryOut(plan)
  }

  /** Lines copied here come back as lines of their own, below the focused one. */
  function pasteLines(lines: Parameters<typeof edits.add>[0], { focused }: ClipboardPlace): void {
    edits.add(lines, focused?.row.key ?? null, `paste of ${counted(lines.length)}`)
    say(`${counted(lines.length)} pasted.`)
  }

  function planOf(cells: string[][], place: ClipboardPlace): PastePlan | null {
    const shown = rows.shownLines()
    const start = place.selected[0] ?? place.focused?.row
    const startColumn = place.selected.length > 0 ? place.columns[0] : place.focused?.column
    const [firstRow] = cells
    if (!firstRow || startColumn === undefined) return null
    const isOneCell = cells.length === 1 && firstRow.length === 1
    const fillsSelection = isOneCell && place.selected.length > 0
    const target = fillsSelection ? [...place.selected] : start ? shown.slice(shown.indexOf(start)) : []
    const columns = fillsSelection ? place.columns : place.shownColumns.slice(place.shownColumns.indexOf(startColumn))
    const block = fillsSelection ? target.map(() => columns.map(() => firstRow[0] ?? '')) : cells
    return planPaste({ cells: block, rows: target, columns, rooms: model.rooms.value, findItem: desk.findItemByName, last: shown.at(-1) })
  }

  /** The whole paste as one step. */
  function carryOut(plan: PastePlan): void {
    const placed = edits.place(plan.added, rows.shownLines().at(-1)?.key ?? null)
    const marks = plan.wrong.flatMap(({ at, field, text, words: why }): CellMark[] => {
      const key = typeof at === 'number' ? placed[at]?.key : at
      const before = key === undefined ? undefined : model.list.find(key)?.wrong[field]
      return key === undefined ? [] : [{ key, field, before: before ?? null, after: { text, words: why } }]
    })
    const changes: EstimateChange[] = [
      { kind: 'edit', edits: plan.edits },
      { kind: 'add', lines: placed },
      { kind: 'mark', marks },
    ]
    edits.run({ words: words(plan), changes: changes.filter(isSomething) })
    const wrongWords =
      plan.wrong.length === 0
        ? ''
        : `; ${plan.wrong.length === 1 ? 'one cell couldn’t be taken and is' : `${plan.wrong.length} cells couldn’t be taken and are`} marked`
    if (plan.rowCount > 1 || plan.wrong.length > 0) say(`${counted(plan.rowCount)} pasted${wrongWords}.`)
  }

  return { copy, cut, paste }
}

function isSomething(change: EstimateChange): boolean {
  if (change.kind === 'edit') return change.edits.length > 0
  if (change.kind === 'mark') return change.marks.length > 0
  return change.kind !== 'add' || change.lines.length > 0
}

function words(plan: PastePlan): string {
  return `paste of ${counted(plan.rowCount)}`
}

function counted(count: number): string {
  return count === 1 ? '1 line' : `${count} lines`
}
