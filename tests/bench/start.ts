import { spawn, type ChildProcess, type StdioOptions } from 'node:child_process'
import { once } from 'node:events'
import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { firmFileIn } from '../../server/db/firmFile.ts'
import { freePort, startApp } from '../support/startApp.ts'
import { benchFigure, type BenchFigure } from './figure.ts'
import { median } from './median.ts'

const ROUNDS = 7
/** The whole command builds the pages each time. */
const COMMAND_ROUNDS = 3
const ASK_EVERY_MS = 10
const GIVE_UP_MS = 120_000
const OWN_GROUP = { stdio: ['ignore', 'ignore', 'inherit'] as StdioOptions, detached: true }

/** From the command to the first answer on a seeded database: the server alone against a bare one that opens the same file, and `npm start` with its build. */
export async function* startBench(): AsyncGenerator<BenchFigure> {
  const dataDir = await mkdtemp(join(tmpdir(), 'quoinbook-bench-'))
  try {
    await seed(dataDir)
    const server: number[] = []
    const bare: number[] = []
    for (let round = 0; round < ROUNDS; round += 1) {
      server.push(await serverStartMs(dataDir))
      bare.push(await bareStartMs(firmFileIn(dataDir)))
    }
    yield benchFigure({
      name: 'start: the server on a seeded database, to its first answer',
      value: median(server),
      unit: 'ms',
      floor: median(bare),
      note: 'The floor opens the same file and answers; the rest goes into finding and compiling some 600 modules at each start.',
    })
    const command: number[] = []
    const build: number[] = []
    for (let round = 0; round < COMMAND_ROUNDS; round += 1) {
      command.push(await commandStartMs(dataDir))
      build.push(await buildMs())
    }
    yield benchFigure({
      name: 'start: npm start on a seeded database, to its first answer',
      value: median(command),
      unit: 'ms',
      note: `Building the pages alone takes ${Math.round(median(build))} ms of it.`,
    })
  } finally {
    await rm(dataDir, { recursive: true, force: true })
  }
}

async function seed(dataDir: string): Promise<void> {
  const app = await startApp({ DATA_DIR: dataDir })
  await app.stop()
}

async function serverStartMs(dataDir: string): Promise<number> {
  const { env, url } = await freshPlace(dataDir)
  return untilAnswered(url, () => spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], { ...OWN_GROUP, env }))
}

async function commandStartMs(dataDir: string): Promise<number> {
  const { env, url } = await freshPlace(dataDir)
  return untilAnswered(url, () => spawn('npm', ['start'], { ...OWN_GROUP, env }))
}

async function bareStartMs(databasePath: string): Promise<number> {
  const port = await freePort()
  const args = ['--import', 'tsx', 'tests/bench/bareServer.ts', databasePath, String(port)]
  return untilAnswered(`http://127.0.0.1:${port}/`, () => spawn(process.execPath, args, OWN_GROUP))
}

async function buildMs(): Promise<number> {
  const startedAt = performance.now()
  const build = spawn('npm', ['run', '--silent', 'build'], { stdio: ['ignore', 'ignore', 'inherit'] })
  await once(build, 'exit')
  return performance.now() - startedAt
}

async function freshPlace(dataDir: string): Promise<{ env: NodeJS.ProcessEnv; url: string }> {
  const port = await freePort()
  const env = { ...process.env, NODE_ENV: 'development', PORT: String(port), HOST: '127.0.0.1', APP_URL: '', DATA_DIR: dataDir }
  return { env, url: `http://127.0.0.1:${port}/api/ready` }
}

/** Milliseconds from the start of a server to its first answer. The server is stopped then. */
async function untilAnswered(url: string, start: () => ChildProcess): Promise<number> {
  const startedAt = performance.now()
  const child = start()
  try {
    while (!(await hasAnswer(url))) {
      if (child.exitCode !== null) throw new Error(`The server ended with ${child.exitCode} before it answered.`)
      if (performance.now() - startedAt > GIVE_UP_MS) throw new Error(`The server did not answer within ${GIVE_UP_MS / 1000} s.`)
      await new Promise((resolve) => setTimeout(resolve, ASK_EVERY_MS))
    }
    return performance.now() - startedAt
  } finally {
    await stopGroup(child)
  }
}

function hasAnswer(url: string): Promise<boolean> {
  return fetch(url).then(
    ({ ok }) => ok,
    () => false,
  )
}

/** Ends a command and what it started: npm puts a shell between. */
async function stopGroup(child: ChildProcess): Promise<void> {
  if (child.pid === undefined || child.exitCode !== null) return
  const ended = once(child, 'exit')
  process.kill(-child.pid, 'SIGTERM')
  await ended
}
