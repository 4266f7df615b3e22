import type { Worker } from 'node:worker_threads'
import { AppError } from '../errors/AppError.ts'
import { createPasswordHasher, type PasswordHasher } from '../features/accounts/passwordHasher.ts'
import type { HashJob, HashJobDone } from './hashingWorker.ts'
import { startWorker } from './startWorker.ts'

/** At a third of a second each, whoever stands behind these waits too long: refuse rather than pile up. */
const QUEUE_MAX = 40

interface Waiting {
  resolve(result: string | boolean): void
  reject(error: Error): void
}

/**
 * A password hasher on a thread of its own, so that a hash (a third of a second of one core) holds up no other request.
 * The thread starts at once and anew after a crash.
 */
export function startHashingThread(cost: number): PasswordHasher & { stop(): Promise<void> } {
  const waiting = new Map<number, Waiting>()
  let worker: Worker | null = null
  let lastId = 0

  function running(): Worker {
    if (worker) return worker
    const started = startWorker(new URL('./hashingWorker.ts', import.meta.url), { cost })
    started.on('message', ({ id, result }: HashJobDone) => {
      waiting.get(id)?.resolve(result)
      waiting.delete(id)
    })
    started.on('error', (error) => end(started, error))
    started.on('exit', () => end(started, new Error('The hashing thread ended.')))
    // After the listeners, which would hold the process open again.
    started.unref()
    worker = started
    return started
  }

  /** What was asked of a thread that is gone fails; the next question starts another. */
  function end(ended: Worker, error: Error): void {
    if (worker !== ended) return
    worker = null
    for (const job of waiting.values()) job.reject(error)
    waiting.clear()
  }

  function perform(job: Omit<HashJob, 'id'>): Promise<string | boolean> {
    if (waiting.size >= QUEUE_MAX) return Promise.reject(tooManyWait())
    return new Promise((resolve, reject) => {
      lastId += 1
      waiting.set(lastId, { resolve, reject })
      running().postMessage({ id: lastId, ...job } satisfies HashJob)
    })
  }

  running()
  const work = {
    hash: async (password: string) => String(await perform({ password })),
    compare: async (password: string, passwordHash: string) => (await perform({ password, passwordHash })) === true,
  }
  return {
    ...createPasswordHasher(work, cost),
    async stop() {
      await worker?.terminate()
    },
  }
}

function tooManyWait(): AppError {
  return new AppError({
    status: 503,
    code: 'busy',
    detail: 'Many people are signing in at this moment. Try again in ten seconds.',
    headers: { 'Retry-After': '10' },
  })
}
