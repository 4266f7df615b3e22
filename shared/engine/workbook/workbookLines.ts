import { HOUSE_SYSTEMS } from '../../catalogue/houseSystems.ts'
import { TRADES } from '../../catalogue/trades.ts'
import type { LowLikelyHigh } from '../../schemas/common.ts'
import type { EstimateWhole, Line } from '../../schemas/estimate.ts'
import type { EstimateResults, LineResult } from '../../schemas/results.ts'

/** The house as a whole stands in the room column under this number; rooms count from 1. */
export const HOUSE_NUMBER = 0
export const HOUSE_TITLE = 'House as a whole'

/** A line with what the sheets say of it. */
export interface WorkbookLine {
  line: Line
  /** From 1, in the order of the estimate. */
  number: number
  roomNumber: number
  roomTitle: string
  systemTitle: string
  tradeTitle: string
  /** The book's own price for the line's basis. */
  bookPriceE4: LowLikelyHigh | null
  /** The price that counts. */
  priceE4: LowLikelyHigh | null
  /** `null` where the line is left out. */
  figures: LineResult | null
  /** Why the line is left out, in words. */
  problem: string | null
}

const systemTitles = new Map<string, string>(HOUSE_SYSTEMS.map(({ key, title }) => [key, title]))
const tradeTitles = new Map<string, string>(TRADES.map(({ key, title }) => [key, title]))

/** What a system or a trade that the catalogue doesn't know is called: words that no spreadsheet takes for a number or a pattern. */
function otherTitle(key: string): string {
  return `Other: ${key}`
}

/** The lines of an estimate in their order, each with its titles, price and figures. */
export function workbookLines({ lines, rooms }: EstimateWhole, results: EstimateResults): WorkbookLine[] {
  const roomNumbers = new Map(rooms.map(({ id }, index) => [id, index + 1]))
  const roomNames = new Map(rooms.map(({ id, name }) => [id, name]))
  const figuresByKey = new Map(results.lines.map((figures) => [figures.key, figures]))
  const problems = problemsByLine(results)
  return lines.map((line, index) => {
    const problem = problems.get(index) ?? null
    const bookPriceE4 = line.basis === 'own-hands' ? line.book.materials : line.book.installed
    return {
      line,
      number: index + 1,
      roomNumber: line.roomId === null ? HOUSE_NUMBER : (roomNumbers.get(line.roomId) ?? HOUSE_NUMBER),
      roomTitle: line.roomId === null ? HOUSE_TITLE : (roomNames.get(line.roomId) ?? HOUSE_TITLE),
      systemTitle: systemTitles.get(line.system) ?? otherTitle(line.system),
      tradeTitle: tradeTitles.get(line.trade) ?? otherTitle(line.trade),
      bookPriceE4,
      priceE4: line.override?.price ?? bookPriceE4,
      figures: problem === null ? (figuresByKey.get(line.id) ?? null) : null,
      problem,
    }
  })
}

/** `lines[3].quantity` → line 3, with the words of its first error. */
function problemsByLine({ errors }: EstimateResults): Map<number, string> {
  const problems = new Map<number, string>()
  for (const { path, message } of errors) {
    const match = /^lines\[(\d+)\]/.exec(path)
    if (match && !problems.has(Number(match[1]))) problems.set(Number(match[1]), message)
  }
  return problems
}
