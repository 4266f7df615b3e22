import { cp, mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { firmFileIn } from '../../server/db/firmFile.ts'
import { startApp } from '../support/startApp.ts'
import { importHouse, openBenchSession, readWholeEstimate, UNLIMITED } from './benchSession.ts'
import { benchFigure, type BenchFigure } from './figure.ts'
import { load, type LoadPlan } from './load.ts'
import { median } from './median.ts'
import { readPlan, savePlan } from './serverPlans.ts'
import { startBareServer } from './startBareServer.ts'

const LINES = 300
const SLICE_SECONDS = 0.5
const ROUNDS = 15
const WARM_UPS = 3

type Work = 'read' | 'bareRows' | 'bareText' | 'save' | 'bareSave'
interface Measured {
  perSecond: number
  p99Ms: number
}

/** An estimate of 300 lines read, and one of its lines saved durably: the app, and node:http with the same statements over a copy of the file. */
export async function* serverBench(): AsyncGenerator<BenchFigure> {
  const folder = await mkdtemp(join(tmpdir(), 'quoinbook-bench-'))
  const [appData, bareData] = [join(folder, 'app'), join(folder, 'bare')]
  try {
    const estimateId = await makeEstimate(appData)
    await cp(appData, bareData, { recursive: true })
    const app = await startApp({ ...UNLIMITED, DATA_DIR: appData })
    const bare = await startBareServer(firmFileIn(bareData))
    try {
      const session = await openBenchSession(app.url)
      const { lines } = await readWholeEstimate(session, estimateId)
      const port = Number(new URL(app.url).port)
      const headers = { cookie: session.cookie, origin: app.url }
      yield* figuresOf(
        await measureInTurn({
          read: readPlan({ port, headers, path: `/api/estimates/${estimateId}` }),
          bareRows: readPlan({ port: bare.port, path: `/rows/${estimateId}` }),
          bareText: readPlan({ port: bare.port, path: `/text/${estimateId}` }),
          save: savePlan({ port, headers, lines, pathOf: (lineId) => `/api/estimates/${estimateId}/lines/${lineId}` }),
          bareSave: savePlan({ port: bare.port, lines, pathOf: (lineId) => `/lines/${estimateId}/${lineId}` }),
        }),
      )
    } finally {
      await app.stop()
      await bare.stop()
    }
  } finally {
    await rm(folder, { recursive: true, force: true })
  }
}

async function makeEstimate(dataDir: string): Promise<string> {
  const app = await startApp({ DATA_DIR: dataDir })
  try {
    return (await importHouse(await openBenchSession(app.url), LINES)).estimateId
  } finally {
    await app.stop()
  }
}

/** Short slices of each in turn, so that a slow moment of the machine meets all of them. */
async function measureInTurn(plans: Record<Work, LoadPlan>): Promise<Record<Work, Measured>> {
  const works = Object.keys(plans) as Work[]
  const slices = Object.fromEntries(works.map((work) => [work, { perSecond: [] as number[], latenciesMs: [] as number[] }]))
  for (let round = -WARM_UPS; round < ROUNDS; round += 1) {
    for (const work of works) {
      const { requestsPerSecond, latenciesMs } = await load(plans[work], SLICE_SECONDS)
      if (round < 0) continue
      slices[work]?.perSecond.push(requestsPerSecond)
      slices[work]?.latenciesMs.push(...latenciesMs)
    }
  }
  return Object.fromEntries(
    Object.entries(slices).map(([work, { perSecond, latenciesMs }]) => [
      work,
      { perSecond: median(perSecond), p99Ms: latenciesMs.sort((a, b) => a - b)[Math.floor(latenciesMs.length * 0.99)] },
    ]),
  ) as Record<Work, Measured>
}

function* figuresOf({ read, bareRows, bareText, save, bareSave }: Record<Work, Measured>): Iterable<BenchFigure> {
  const rows = 'node:http, rows to objects to text'
  const isReadShort = read.perSecond < bareRows.perSecond || read.perSecond < bareText.perSecond / 3
  yield benchFigure({
    name: `server: an estimate of ${LINES} lines read`,
    value: read.perSecond,
    unit: 'requests/s',
    peer: { name: rows, value: bareRows.perSecond },
    floor: bareText.perSecond,
    ...(isReadShort && {
      note: 'Beside the statement: the session is looked up, what the reader may see is asked, and the answer goes through express.',
    }),
  })
  yield benchFigure({
    name: `server: an estimate of ${LINES} lines read, p99`,
    value: read.p99Ms,
    unit: 'ms',
    peer: { name: rows, value: bareRows.p99Ms },
    floor: bareText.p99Ms,
  })
  const same = 'node:http, the same statements'
  const isSaveShort = save.perSecond < bareSave.perSecond / 2
  yield benchFigure({
    name: `server: one line of ${LINES} saved durably`,
    value: save.perSecond,
    unit: 'requests/s',
    peer: { name: same, value: bareSave.perSecond },
    floor: bareSave.perSecond,
    ...(isSaveShort && {
      note: 'A third is the durable commit; the rest is spread over express with its headers, limits and log, session, checks and totals, none of them over a tenth.',
    }),
  })
  yield benchFigure({
    name: `server: one line of ${LINES} saved durably, p99`,
    value: save.p99Ms,
    unit: 'ms',
    peer: { name: same, value: bareSave.p99Ms },
    floor: bareSave.p99Ms,
  })
}
