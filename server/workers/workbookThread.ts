import type { Worker } from 'node:worker_threads'
import type { WorkbookContext } from '../../shared/engine/index.ts'
import { AppError } from '../errors/AppError.ts'
import { startWorker } from './startWorker.ts'
import type { WorkbookJob, WorkbookJobDone } from './workbookWorker.ts'

/** A tenth of a second each for a usual house: whoever stands behind these waits too long. */
const QUEUE_MAX = 30
/** The thread holds the libraries in memory; after so long without work it ends. */
const IDLE_MS = 120_000

/** From a whole estimate as JSON text to the bytes of its workbook. */
export type MakeWorkbook = (wholeText: string, context: WorkbookContext) => Promise<Buffer>

interface Waiting {
  resolve(bytes: Buffer): void
  reject(error: Error): void
}

/**
 * Makes workbooks on a thread of its own: the figures, the sheets and the file, none of which may hold up other requests.
 * The thread starts with the first workbook and starts anew after a crash.
 */
export function startWorkbookThread(): { makeWorkbook: MakeWorkbook; stop(): Promise<void> } {
  const waiting = new Map<number, Waiting>()
  let worker: Worker | null = null
  let idle: NodeJS.Timeout | undefined
  let lastId = 0

  function running(): Worker {
    if (worker) return worker
    const started = startWorker(new URL('./workbookWorker.ts', import.meta.url), null)
    started.unref()
    started.on('message', settle)
    started.on('error', (error) => end(started, error))
    started.on('exit', () => end(started, new Error('The workbook thread ended.')))
    worker = started
    return started
  }

  function settle(done: WorkbookJobDone): void {
    const job = waiting.get(done.id)
    waiting.delete(done.id)
    if (waiting.size === 0) idle = setTimeout(() => void stop(), IDLE_MS).unref()
    if ('error' in done) job?.reject(new Error(`A workbook could not be made: ${done.error}`))
    else job?.resolve(Buffer.from(done.bytes.buffer))
  }

  /** A thread that was stopped on purpose is forgotten already, and its successor's jobs are none of its business. */
  function end(ended: Worker, error: Error): void {
    if (worker !== ended) return
    worker = null
    for (const job of waiting.values()) job.reject(error)
    waiting.clear()
  }

  async function stop(): Promise<void> {
    clearTimeout(idle)
    const stopped = worker
    if (!stopped) return
    end(stopped, new Error('The workbook thread was stopped.'))
    await stopped.terminate()
  }

  return {
    makeWorkbook(wholeText, context) {
      if (waiting.size >= QUEUE_MAX) return Promise.reject(tooManyWait())
      clearTimeout(idle)
      return new Promise((resolve, reject) => {
        lastId += 1
        waiting.set(lastId, { resolve, reject })
        running().postMessage({ id: lastId, wholeText, context } satisfies WorkbookJob)
      })
    },
    stop,
  }
}

function tooManyWait(): AppError {
  return new AppError({
    status: 503,
    code: 'busy',
    detail: 'Many workbooks are being made at this moment. Try again in ten seconds.',
    headers: { 'Retry-After': '10' },
  })
}
