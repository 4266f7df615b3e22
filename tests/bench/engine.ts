import { openEstimate, type EstimateInput } from '../../shared/engine/index.ts'
import { EngineFloor } from './engineFloor.ts'
import { EngineHyperFormula } from './engineHyperFormula.ts'
import { EngineMathjs } from './engineMathjs.ts'
import { modelEstimate, modelLine, modelRoom } from './engineModel.ts'
import { benchFigure, type BenchFigure } from './figure.ts'
import { medianMs, mediansInTurn } from './median.ts'

const SIZES = [300, 5_000, 10_000]
const CHANGE_SIZE = 5_000
const CHANGES_A_ROUND = 500
/** A spreadsheet takes seconds for what takes the engine a millisecond; more rounds of it would change nothing. */
const SPREADSHEET_ROUNDS = 1

/** Recalculating and changing an estimate: the engine, mathjs compiled once, HyperFormula with the same workbook, and a loop written by hand over typed arrays. */
export function* engineBench(): Iterable<BenchFigure> {
  for (const size of SIZES) yield* recalculation(size)
  yield* changes()
}

function* recalculation(size: number): Iterable<BenchFigure> {
  const input = modelEstimate(size)
  const live = openEstimate(input)
  const floor = new EngineFloor(input)
  const mathjs = new EngineMathjs(input)
  floor.recalculate()
  mathjs.recalculate()
  const spreadsheet = new EngineHyperFormula(input)
  expectSame(input, live.totals().directCents.likely, {
    floor: floor.total[1] as number,
    mathjs: mathjs.total.likely,
    spreadsheet: Math.round(spreadsheet.likelyTotal() * 100),
  })
  const times = mediansInTurn(
    {
      engine: () => {
        live.recalculate()
        return live.totals()
      },
      floor: () => floor.recalculate(),
      mathjs: () => mathjs.recalculate(),
    },
    { rounds: 101, warmUps: 60 },
  )
  const spreadsheetMs = medianMs(() => spreadsheet.recalculate(), { rounds: SPREADSHEET_ROUNDS, warmUps: 0 })
  spreadsheet.destroy()
  const lines = `${size.toLocaleString('en-US')} lines`
  const common = { value: times.engine, unit: 'ms', floor: times.floor }
  yield benchFigure({
    ...common,
    name: `engine: full recalculation of ${lines}, against mathjs`,
    peer: { name: 'mathjs, compiled once', value: times.mathjs },
  })
  yield benchFigure({
    ...common,
    name: `engine: full recalculation of ${lines}, against HyperFormula`,
    peer: { name: 'HyperFormula, the same model', value: spreadsheetMs },
  })
  const openedMs = medianMs(() => openEstimate(input).totals(), { rounds: 15, warmUps: 5 })
  const builtMs = medianMs(() => new EngineHyperFormula(input).destroy(), { rounds: 1, warmUps: 0 })
  yield benchFigure({
    name: `engine: opening an estimate of ${lines}`,
    value: openedMs,
    unit: 'ms',
    peer: { name: 'HyperFormula, building the same model', value: builtMs },
  })
}

function* changes(): Iterable<BenchFigure> {
  const input = modelEstimate(CHANGE_SIZE)
  const roomCount = input.rooms.length
  const live = openEstimate(input)
  const floor = new EngineFloor(input)
  floor.recalculate()
  const spreadsheet = new EngineHyperFormula(input)
  // Lines and rooms as somebody keyed them, made beforehand: making them is not the engine's work.
  const lines = Array.from({ length: CHANGES_A_ROUND }, (_, step) => modelLine((step * 37) % CHANGE_SIZE, roomCount, 20_000 + step * 10))
  const rooms = Array.from({ length: CHANGES_A_ROUND }, (_, step) => modelRoom((step * 37) % roomCount, 120 + (step % 50)))
  let shift = 0

  const ofLine = perChange({
    engine: () => {
      for (const line of lines) {
        live.setLine(line.key, line)
        live.totals()
      }
    },
    floor: () => {
      for (let step = 0; step < CHANGES_A_ROUND; step += 1) floor.setPrice((step * 37) % CHANGE_SIZE, 20_000 + step * 10)
    },
  })
  const ofLineInSpreadsheet =
    medianMs(() => spreadsheet.setPrice(37, 20_000 + (shift += 10)), { rounds: SPREADSHEET_ROUNDS, warmUps: 1 }) * 1000
  yield benchFigure({
    name: 'engine: one line of 5,000 changed, with totals',
    value: ofLine.engine,
    unit: 'µs',
    peer: { name: 'HyperFormula, the same model', value: ofLineInSpreadsheet },
    floor: ofLine.floor,
    note: 'The floor changes a price in place; the engine takes a whole line, finds its formula and works out the adders as well.',
  })

  const ofRoom = perChange({
    engine: () => {
      for (const room of rooms) {
        live.setRoom(room.key, room)
        live.totals()
      }
    },
    floor: () => {
      for (let step = 0; step < CHANGES_A_ROUND; step += 1) floor.setRoomLength((step * 37) % roomCount, 120 + (step % 50))
    },
  })
  const ofRoomInSpreadsheet =
    medianMs(() => spreadsheet.setRoomLength(37, 120 + (shift += 1)), { rounds: SPREADSHEET_ROUNDS, warmUps: 1 }) * 1000
  spreadsheet.destroy()
  yield benchFigure({
    name: 'engine: one room of 5,000 lines changed, with totals',
    value: ofRoom.engine,
    unit: 'µs',
    peer: { name: 'HyperFormula, the same model', value: ofRoomInSpreadsheet },
    floor: ofRoom.floor,
    note: 'The room has 50 lines.',
  })
}

/** Microseconds for one change. */
function perChange(ways: { engine: () => void; floor: () => void }): { engine: number; floor: number } {
  const { engine, floor } = mediansInTurn(ways, { rounds: 31, warmUps: 10 })
  return { engine: (engine * 1000) / CHANGES_A_ROUND, floor: (floor * 1000) / CHANGES_A_ROUND }
}

/** What doesn't compute the same may not be compared. A spreadsheet rounds some halves down, as their binary fraction has it: a cent a line. */
function expectSame({ lines }: EstimateInput, engineCents: number, others: { floor: number; mathjs: number; spreadsheet: number }): void {
  for (const [name, cents] of Object.entries(others)) {
    const isSame = Math.abs(cents - engineCents) <= (name === 'spreadsheet' ? lines.length : 0)
    if (!isSame) throw new Error(`${name} computes ${cents} cents for ${lines.length} lines, and the engine ${engineCents}.`)
  }
}
