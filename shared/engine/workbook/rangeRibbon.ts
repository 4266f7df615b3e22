const LINE = '━'
const TICK = '┃'
/** Before the range: no blank, which a file's reader may drop from the beginning of a text. */
export const DOTTED = '·'
export const CLEAR = '\u00a0'

/** Cells of a range, as a formula on their sheet writes them. */
interface RibbonCells {
  low: string
  likely: string
  high: string
  /** What the right end of the ribbon stands for. */
  most: string
}

/**
 * A formula that draws low to high as a run of strokes with a tick at likely, `width` characters for the most.
 * Text rather than a chart: it recalculates, prints in grey and is read aloud by nothing that the figures beside it don't say.
 */
export function ribbonFormula({ low, likely, high, most }: RibbonCells, width: number, before: string): string {
  const at = (cell: string) => `ROUND(${cell}/${most}*${width},0)`
  const run = (from: string, to: string) => `REPT("${LINE}",${at(to)}-${at(from)})`
  return `IF(${most}<=0,"",REPT("${before}",${at(low)})&${run(low, likely)}&"${TICK}"&${run(likely, high)})`
}

/** What the formula draws now. */
export function ribbonText(range: { low: number; likely: number; high: number }, most: number, width: number, before: string): string {
  if (most <= 0) return ''
  const at = (value: number) => Math.round((value / most) * width)
  return (
    before.repeat(at(range.low)) + LINE.repeat(at(range.likely) - at(range.low)) + TICK + LINE.repeat(at(range.high) - at(range.likely))
  )
}
