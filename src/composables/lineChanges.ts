import type { EstimateChange, LineEdit, PlacedLine } from './estimateChange.ts'
import type { EstimateFigures } from './estimateFigures.ts'
import type { LineList } from './lineList.ts'
import { newRow, type LineField, type LineRow, type WrongEntry } from './lineRow.ts'

interface LineChangesOptions {
  list: LineList
  /** Lines that were taken out and may come back. */
  removed: Map<string, LineRow>
  figures: EstimateFigures
}

/** Applies changes of lines to what the page holds; each answers with the rows that it touched. */
export function createLineChanges({ list, removed, figures }: LineChangesOptions) {
  function apply(change: Exclude<EstimateChange, { kind: 'settings' }>): readonly LineRow[] {
    switch (change.kind) {
      case 'edit':
        return change.edits.flatMap((edit) => applyEdit(edit))
      case 'mark':
        return change.marks.flatMap(({ key, field, after }) => {
          const row = list.find(key)
          if (row) setWrong(row, field, after)
          return row ?? []
        })
      case 'add':
        return change.lines.map((line) => bringIn(line))
      case 'remove':
        return change.lines.flatMap(({ key }) => {
          const row = list.find(key)
          if (row) drop(row)
          return row ?? []
        })
      case 'order':
        list.reorder(change.after)
        return []
    }
  }

  function applyEdit({ key, after }: LineEdit): LineRow[] {
    const row = list.find(key)
    if (!row) return []
    row.fields = { ...row.fields, ...after }
    for (const field of Object.keys(after) as LineField[]) delete row.wrong[field]
    if (row.state === 'refused') row.state = 'saving'
    figures.set(row)
    return [row]
  }

  function bringIn({ key, afterKey, fields, book }: PlacedLine): LineRow {
    const back = removed.get(key)
    const lineFigures = figures.add(key, back?.fields ?? fields, back?.book ?? book, afterKey)
    const row = back ?? newRow(key, fields, book, lineFigures)
    row.figures = lineFigures
    row.isRemoved = false
    removed.delete(key)
    list.insertAfter(row, afterKey)
    return row
  }

  function drop(row: LineRow): void {
    row.isRemoved = true
    list.remove(row.key)
    figures.remove(row.key)
    removed.set(row.key, row)
  }

  function setWrong(row: LineRow, field: LineField, entry: WrongEntry | null): void {
    if (entry === null) delete row.wrong[field]
    else row.wrong = { ...row.wrong, [field]: entry }
  }

  function setAtOdds(row: LineRow, field: LineField, mine: unknown): void {
    row.conflicts = [...row.conflicts.filter(({ path }) => path !== field), { path: field, mine, theirs: row.fields[field] }]
    row.fields = { ...row.fields, [field]: mine }
    row.state = 'at-odds'
    figures.set(row)
  }

  return { apply, drop, setAtOdds }
}
