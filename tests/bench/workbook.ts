import { monitorEventLoopDelay } from 'node:perf_hooks'
import { writeWorkbook } from '../../server/features/workbook/writeWorkbook.ts'
import { startWorkbookThread } from '../../server/workers/workbookThread.ts'
import { workbookSheets } from '../../shared/engine/index.ts'
import type { EstimateWhole } from '../../shared/schemas/estimate.ts'
import { buildContext, buildLine, buildRoom, buildWhole, resultsOf } from '../support/buildWorkbookEstimate.ts'
import { bareXlsx } from './bareXlsx.ts'
import { benchFigure, type BenchFigure } from './figure.ts'
import { median } from './median.ts'

const ROUNDS = 9
const WARM_UPS = 3
/** The longest that the event loop may be held while a workbook is made. */
const HELD_AIM_MS = 50
const NANOSECONDS_PER_MS = 1e6

/** Workbooks of 1,000 and 10,000 lines: the writer against a bare zip of the same cells, and what the thread leaves of the event loop. */
export async function* workbookBench(): AsyncGenerator<BenchFigure> {
  for (const lineCount of [1000, 10_000]) yield await writerFigure(lineCount)
  yield* threadFigures(1000)
}

async function writerFigure(lineCount: number): Promise<BenchFigure> {
  const whole = modelWhole(lineCount)
  const sheets = workbookSheets(whole, resultsOf(whole), buildContext())
  const times = { writer: [] as number[], bare: [] as number[] }
  for (let round = -WARM_UPS; round < ROUNDS; round += 1) {
    const [writer, bare] = [await timeOf(() => writeWorkbook(sheets)), await timeOf(() => bareXlsx(sheets))]
    if (round >= 0) {
      times.writer.push(writer)
      times.bare.push(bare)
    }
  }
  const [value, floor] = [median(times.writer), median(times.bare)]
  return benchFigure({
    name: `workbook of ${lineCount} lines, written`,
    value,
    unit: 'ms',
    floor,
    ...(value > 2.2 * floor
      ? { note: 'Over 2.2 times the bare zip: the library makes an object of every cell and looks its style up before it is text.' }
      : {}),
  })
}

async function* threadFigures(lineCount: number): AsyncGenerator<BenchFigure> {
  const wholeText = JSON.stringify(modelWhole(lineCount))
  const thread = startWorkbookThread()
  const first = await timeOf(() => thread.makeWorkbook(wholeText, buildContext()))
  const delay = monitorEventLoopDelay({ resolution: 1 })
  const times: number[] = []
  delay.enable()
  for (let round = 0; round < ROUNDS; round += 1) times.push(await timeOf(() => thread.makeWorkbook(wholeText, buildContext())))
  delay.disable()
  await thread.stop()
  const held = delay.max / NANOSECONDS_PER_MS
  yield benchFigure({ name: `workbook of ${lineCount} lines, from the estimate's text to the file`, value: median(times), unit: 'ms' })
  yield benchFigure({
    name: `workbook of ${lineCount} lines, the first one of a thread`,
    value: first,
    unit: 'ms',
    note: 'The thread starts with it and loads the engine and the writer.',
  })
  yield benchFigure({
    name: `workbook of ${lineCount} lines, event loop held at most`,
    value: held,
    unit: 'ms',
    ...(held > HELD_AIM_MS ? { note: `Over ${HELD_AIM_MS} ms: the machine has fewer free cores than threads.` } : {}),
  })
}

async function timeOf(run: () => Promise<unknown>): Promise<number> {
  const start = performance.now()
  await run()
  return performance.now() - start
}

const QUANTITIES = [
  'floor_area',
  'wall_area * 2',
  'ceil(wall_area / 32)',
  'base_length',
  '12',
  'sum_rooms(floor_area)',
  'max(floor_area, 100)',
]
const UNITS = ['sf', 'sf', 'sheet', 'lf', 'each', 'sf', 'sf']

/** An estimate of so many lines, some fifty a room. */
function modelWhole(lineCount: number): EstimateWhole {
  const roomCount = Math.min(200, Math.ceil(lineCount / 50))
  const rooms = Array.from({ length: roomCount }, (_, index) =>
    buildRoom({
      id: `room-${index}`,
      name: `Room ${index}`,
      shape: { kind: 'rectangle', lengthIn: 120 + index, widthIn: 110 + (index % 9) * 6 },
    }),
  )
  const lines = Array.from({ length: lineCount }, (_, index) =>
    buildLine({
      id: `line-${index}`,
      roomId: `room-${index % roomCount}`,
      itemKey: `floor/item-${index % 300}`,
      description: `Piece of work ${index % 300}`,
      quantity: QUANTITIES[index % QUANTITIES.length] ?? '1',
      unit: UNITS[index % UNITS.length] ?? 'each',
      wastePercent: index % 11,
      basis: index % 3 === 0 ? 'own-hands' : 'hired',
      note: index % 5 === 0 ? `Seen on the day, note ${index}` : '',
    }),
  )
  return buildWhole({ rooms, lines })
}
