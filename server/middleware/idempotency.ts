import { createHash } from 'node:crypto'
import type { Request, Response } from 'express'
import type { Clock } from '../config/clock.ts'
import { inWriteTransaction, type Database } from '../db/client.ts'
import { AppError, conflict } from '../errors/AppError.ts'
import { JsonText } from '../http/answers.ts'
import { jsonOf } from '../http/sendAnswer.ts'
import {
  deleteTriesBefore,
  deleteTry,
  findKeptAnswer,
  insertTry,
  keepAnswer,
  type KeptAnswer,
  type RepeatKey,
} from './idempotencyRepository.ts'

const KEEP_MS = 24 * 3_600_000
/** A first try that is this old was cut off by a crash; nobody is working on it any more. */
const ABANDONED_MS = 2 * 60_000
const KEY_PATTERN = /^[\x21-\x7e]{1,200}$/

interface Call {
  req: Request
  res: Response
  userId: string
  body: unknown
  status: number
  run: () => unknown
}

export type Idempotency = (call: Call) => Promise<{ status: number; answer: unknown }>

/**
 * Runs a write once for each Idempotency-Key of a person and answers a repeat as the first time, for 24 hours.
 * A call whose handler works synchronously commits together with its kept answer, so that a crash can't part the two.
 */
export function createIdempotency({ db, clock }: { db: Database; clock: Clock }): Idempotency {
  return async ({ req, res, userId, body, status, run }) => {
    const header = req.get('idempotency-key')
    if (header === undefined) return { status, answer: await run() }
    if (!KEY_PATTERN.test(header)) {
      throw new AppError({ status: 400, code: 'idempotency-key-malformed', detail: 'Idempotency-Key must be 1 to 200 visible characters.' })
    }
    const key: RepeatKey = { userId, method: req.method, path: pathOf(req), key: header }
    const bodyHash = createHash('sha256')
      .update(JSON.stringify(body ?? null))
      .digest('hex')
    const keep = (answer: unknown) => keepAnswer(db, key, { status, etag: etagOn(res), answer: jsonOf(answer) })

    const first = inWriteTransaction(db, () => {
      const kept = findLiving(key)
      if (kept) return { kept: answerOfRepeat(kept, bodyHash) }
      deleteTriesBefore(db, ago(KEEP_MS))
      insertTry(db, key, bodyHash, clock().toISOString())
      const answer = run()
      if (!(answer instanceof Promise)) keep(answer)
      return { answer }
    })
    if ('kept' in first && first.kept) {
      if (first.kept.etag) res.setHeader('ETag', first.kept.etag)
      return { status: first.kept.status, answer: new JsonText(first.kept.answer) }
    }
    return { status, answer: await finish(first.answer, keep, key) }
  }

  /** Waits for a handler that works in steps; a refused try is forgotten, so that the same key may be used again. */
  async function finish(answer: unknown, keep: (answer: unknown) => void, key: RepeatKey): Promise<unknown> {
    if (!(answer instanceof Promise)) return answer
    try {
      const finished: unknown = await answer
      keep(finished)
      return finished
    } catch (error) {
      deleteTry(db, key)
      throw error
    }
  }

  function findLiving(key: RepeatKey): KeptAnswer | null {
    const kept = findKeptAnswer(db, key)
    if (!kept) return null
    const isOver = kept.createdAt < ago(kept.status === null ? ABANDONED_MS : KEEP_MS)
    if (!isOver) return kept
    deleteTry(db, key)
    return null
  }

  function ago(ms: number): string {
    return new Date(clock().getTime() - ms).toISOString()
  }
}

function answerOfRepeat(kept: KeptAnswer, bodyHash: string): { status: number; etag: string | null; answer: string } {
  if (kept.bodyHash !== bodyHash) {
    throw new AppError({
      status: 422,
      code: 'idempotency-key-reused',
      detail: 'This Idempotency-Key was used with another body. Use a new key for a new request.',
    })
  }
  if (kept.status === null)
    throw conflict('in-progress', 'The first request with this Idempotency-Key is still being worked on. Try again in a moment.')
  return { status: kept.status, etag: kept.etag, answer: kept.answer ?? '' }
}

function pathOf(req: Request): string {
  return req.originalUrl.split('?')[0] ?? req.originalUrl
}

function etagOn(res: Response): string | null {
  const header = res.getHeader('etag')
  return typeof header === 'string' ? header : null
}
