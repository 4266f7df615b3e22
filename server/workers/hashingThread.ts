import { AppError } from '../errors/AppError.ts'
import { createPasswordHasher, type PasswordHasher } from '../features/accounts/passwordHasher.ts'
import type { HashJob, HashJobDone } from './hashingWorker.ts'
import { startWorker } from './startWorker.ts'

/** At a third of a second each, whoever stands behind these waits too long: refuse rather than pile up. */
const QUEUE_MAX = 40

/** A password hasher on a thread of its own, so that a hash (a third of a second of one core) holds up no other request. */
export function startHashingThread(cost: number): PasswordHasher & { stop(): Promise<void> } {
  const waiting = new Map<number, { resolve: (result: string | boolean) => void; reject: (error: Error) => void }>()
  const worker = startWorker(new URL('./hashingWorker.ts', import.meta.url), { cost })
  let lastId = 0

  worker.on('message', ({ id, result }: HashJobDone) => {
    waiting.get(id)?.resolve(result)
    waiting.delete(id)
  })
  worker.on('error', failAll)
  worker.on('exit', () => failAll(new Error('The hashing thread ended.')))
  // After the listeners, which would hold the process open again.
  worker.unref()

  function failAll(error: Error): void {
    for (const job of waiting.values()) job.reject(error)
    waiting.clear()
  }

  function perform(job: Omit<HashJob, 'id'>): Promise<string | boolean> {
    if (waiting.size >= QUEUE_MAX) return Promise.reject(tooManyWait())
    return new Promise((resolve, reject) => {
      lastId += 1
      waiting.set(lastId, { resolve, reject })
      worker.postMessage({ id: lastId, ...job })
    })
  }

  const hasher = createPasswordHasher({
    hash: async (password) => String(await perform({ password })),
    compare: async (password, passwordHash) => (await perform({ password, passwordHash })) === true,
  })
  return {
    ...hasher,
    async stop() {
      await worker.terminate()
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
