import { LiveEstimate, toEstimateInput, type EstimateInput, type LineFigures } from '../../shared/engine/index.ts'
import type { EstimateSettings, EstimateWhole, Line, LineFields, Totals } from '../../shared/schemas/estimate.ts'
import type { Room } from '../../shared/schemas/room.ts'
import { lazyFormulaParser } from './formulaParser.ts'
import { lineInputOf, type LineRow } from './lineRow.ts'

export type SubtotalKind = 'room' | 'system' | 'trade'

/**
 * The engine's running figures of the estimate on this page, and which lines its totals leave out. `onReadable` is called when formulas that had to wait for
 * their parser can be read: then everything is to be opened again.
 */
export function createEstimateFigures(whole: EstimateWhole, onReadable: () => void) {
  const parse = lazyFormulaParser(onReadable)
  let input: EstimateInput = toEstimateInput(whole)
  let live = new LiveEstimate(input, parse)
  const leftOut = new Set<string>()
  for (const { id } of whole.lines) note(id, live.line(id))

  function note(key: string, figures: LineFigures): LineFigures {
    if (figures.error === null) leftOut.delete(key)
    else leftOut.add(key)
    return figures
  }

  return {
    of: (key: string): LineFigures => note(key, live.line(key)),

    /** Adds a line below another and answers with its figures. */
    add(key: string, fields: LineFields, book: Line['book'], afterKey: string | null): LineFigures {
      live.addLine(lineInputOf(key, fields, book), afterKey)
      return note(key, live.line(key))
    },

    remove(key: string): void {
      live.removeLine(key)
      leftOut.delete(key)
    },

    /** Computes the row anew, as it is or as it would be with `fields`. */
    set(row: LineRow, fields: LineFields = row.fields): void {
      live.setLine(row.key, lineInputOf(row.key, fields, row.book))
      row.figures = note(row.key, live.line(row.key))
    },

    setSettings(settings: EstimateSettings): void {
      input = { ...input, settings }
      live.setSettings(settings)
    },

    /** Computes all lines anew, formulas read afresh. */
    reopen(rows: readonly LineRow[]): void {
      const lines = rows.map(({ key, fields, previewed, book }) => lineInputOf(key, { ...fields, ...previewed }, book))
      live = new LiveEstimate({ ...input, lines }, parse)
      for (const row of rows) row.figures = note(row.key, live.line(row.key))
    },

    /** Takes in the house and rooms of a fresh read; the figures of every line may differ after it. */
    setMeasured(before: readonly Room[], fresh: EstimateWhole): void {
      input = { ...toEstimateInput(fresh), settings: input.settings }
      const versions = new Map(before.map(({ id, version }) => [id, version]))
      const kept = new Set(fresh.rooms.map(({ id }) => id))
      live.setHouse(input.house)
      for (const room of input.rooms) if (!versions.has(room.key)) live.addRoom(room)
      for (const room of input.rooms) if (versions.has(room.key)) live.setRoom(room.key, room)
      for (const { id } of before) if (!kept.has(id)) live.removeRoom(id)
    },

    totals: (): Totals => live.totals(),
    subtotals: (by: SubtotalKind) => live.subtotals(by),
    /** Keys of the lines that the totals leave out. */
    leftOut: (): ReadonlySet<string> => leftOut,
  }
}

export type EstimateFigures = ReturnType<typeof createEstimateFigures>
