import { spawn, type ChildProcess } from 'node:child_process'
import { mkdtemp, rm } from 'node:fs/promises'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

export interface RunningApp {
  url: string
  dataDir: string
  /** Stops the server and removes its data. */
  stop(): Promise<void>
}

const START_LIMIT_MS = 60_000

/**
 * Starts the real server in a process of its own over a fresh data folder, seeded with the demo, and waits until it answers.
 * Needs `dist/` built. Throws with the server's output when it doesn't come up.
 */
export async function startApp(env: Record<string, string> = {}): Promise<RunningApp> {
  const dataDir = env.DATA_DIR ?? (await mkdtemp(join(tmpdir(), 'quoinbook-')))
  const port = await freePort()
  const server = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
    env: { ...process.env, NODE_ENV: 'development', LOG_LEVEL: 'warn', ...env, PORT: String(port), HOST: '127.0.0.1', DATA_DIR: dataDir },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  const output = collectOutput(server)
  const url = `http://127.0.0.1:${port}`
  await waitUntilReady(url, server, output)
  return {
    url,
    dataDir,
    async stop() {
      await stopProcess(server)
      if (!env.DATA_DIR) await rm(dataDir, { recursive: true, force: true })
    },
  }
}

/** A port of the loopback address that nobody listens on. */
export async function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', reject)
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address()
      probe.close(() => (address && typeof address === 'object' ? resolve(address.port) : reject(new Error('no port'))))
    })
  })
}

function collectOutput(server: ChildProcess): () => string {
  let text = ''
  const keep = (chunk: Buffer) => {
    text = (text + chunk.toString()).slice(-8000)
  }
  server.stdout?.on('data', keep)
  server.stderr?.on('data', keep)
  return () => text
}

async function waitUntilReady(url: string, server: ChildProcess, output: () => string): Promise<void> {
  const giveUpAt = Date.now() + START_LIMIT_MS
  while (Date.now() < giveUpAt) {
    if (server.exitCode !== null) throw new Error(`The server stopped before it answered:\n${output()}`)
    const isReady = await fetch(`${url}/api/ready`).then(
      (answer) => answer.ok,
      () => false,
    )
    if (isReady) return
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  server.kill('SIGKILL')
  throw new Error(`The server did not answer within ${START_LIMIT_MS / 1000} s:\n${output()}`)
}

async function stopProcess(server: ChildProcess): Promise<void> {
  if (server.exitCode !== null) return
  const ended = new Promise((resolve) => server.once('exit', resolve))
  server.kill('SIGTERM')
  const timer = setTimeout(() => server.kill('SIGKILL'), 10_000)
  await ended
  clearTimeout(timer)
}
