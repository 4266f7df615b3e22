import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { freePort } from '../support/startApp.ts'

export interface BareServer {
  port: number
  stop(): Promise<void>
}

/** Starts the bare server over a database file, in a process of its own, and waits until it listens. */
export async function startBareServer(databasePath: string): Promise<BareServer> {
  const port = await freePort()
  const child = spawn(process.execPath, ['--import', 'tsx', 'tests/bench/bareServer.ts', databasePath, String(port)], {
    stdio: ['ignore', 'pipe', 'inherit'],
  })
  const ended = once(child, 'exit')
  const failed = ended.then(() => {
    throw new Error('The bare server ended before it listened.')
  })
  await Promise.race([once(child.stdout, 'data'), failed])
  failed.catch(() => {})
  return {
    port,
    async stop() {
      child.kill('SIGTERM')
      await ended
    },
  }
}
