import type { EstimateWhole, Line } from '../../shared/schemas/estimate.ts'
import type { EstimateFigures } from './estimateFigures.ts'
import type { LineList } from './lineList.ts'
import { rowOfLine, type LineRow } from './lineRow.ts'
import { mergeLine } from './mergeLine.ts'

interface TakeOptions {
  list: LineList
  removed: Map<string, LineRow>
  figures: EstimateFigures
  /** The order was changed here and isn't saved yet: it stands. */
  isOrderOurs: boolean
  /** Somebody is typing in it here. */
  isBeingEdited(row: LineRow): boolean
}

/** What a fresh read changed: rows to be drawn again, and rows with something left to say to the server. */
export interface TakenWhole {
  changed: LineRow[]
  isStructural: boolean
}

/**
 * Merges the estimate as the server has it into the page's lines: others' new lines come in, lines that others removed go, and a line that was changed on both
 * sides is merged field by field. A line that is changed here and removed there is kept and marked.
 */
export function takeWhole(whole: EstimateWhole, options: TakeOptions): TakenWhole {
  const { list, removed, figures, isOrderOurs, isBeingEdited } = options
  const lines = [...whole.lines].sort((a, b) => a.position - b.position)
  const changed: LineRow[] = []
  const removedById = new Map([...removed.values()].flatMap((row) => (row.id === null ? [] : [[row.id, row]])))
  const orderBefore = list.keys().join()

  lines.forEach((line, index) => {
    const row = list.findById(line.id) ?? removedById.get(line.id)
    if (row === undefined) insert(line, lines[index - 1])
    else if (line.version > row.version || row.isRemovedAtServer) merge(row, line)
  })
  dropMissing(new Set(lines.map(({ id }) => id)))
  if (!isOrderOurs) list.reorder(lines.flatMap(({ id }) => list.findById(id)?.key ?? []))

  function insert(line: Line, above: Line | undefined): void {
    const afterKey = above ? (list.findById(above.id)?.key ?? null) : null
    const row = rowOfLine(line, figures.add(line.id, line, line.book, afterKey))
    list.insertAfter(row, afterKey)
    changed.push(row)
  }

  function merge(row: LineRow, line: Line): void {
    const wasGone = row.state === 'gone'
    row.isRemovedAtServer = false
    mergeLine(row, line)
    if (wasGone) row.problem = ''
    row.state = row.conflicts.length > 0 ? 'at-odds' : 'saved'
    if (row.isRemoved) return
    figures.set(row)
    changed.push(row)
  }

  function dropMissing(present: ReadonlySet<string>): void {
    for (const row of [...list.rows()]) {
      const isTheirs = row.id !== null && !present.has(row.id)
      if (!isTheirs) continue
      row.isRemovedAtServer = true
      if (row.state !== 'saved' || isBeingEdited(row)) keepMarked(row)
      else drop(row)
      changed.push(row)
    }
  }

  function drop(row: LineRow): void {
    row.isRemoved = true
    list.remove(row.key)
    figures.remove(row.key)
    removed.set(row.key, row)
  }

  return { changed, isStructural: orderBefore !== list.keys().join() || changed.length > 0 }
}

function keepMarked(row: LineRow): void {
  row.state = 'gone'
  row.problem = 'Somebody removed this line while you changed it.'
}
