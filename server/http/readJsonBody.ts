import express, { type Request, type RequestHandler, type Response } from 'express'
import { AppError } from '../errors/AppError.ts'

/** Largest body that a call takes unless it says otherwise, in bytes. */
const BODY_LIMIT_BYTES = 1_000_000

/** Lists and objects inside one another; an estimate document has eight. What takes a value apart by recursion is safe below it. */
const NESTING_MAX = 64

const parsers = new Map<number, RequestHandler>()

/** One parser a limit: they hold no state of a request. */
function parserFor(limit: number): RequestHandler {
  const parser = parsers.get(limit) ?? express.json({ limit, strict: true, type: 'application/json' })
  parsers.set(limit, parser)
  return parser
}

/**
 * Reads the JSON body of a request. Throws 415 for another content type, 400 for a missing or malformed body or one that nests without end, 413 over the limit.
 * Read after the guards, so that nobody's 50 MB are taken in before it is known who sends them.
 */
export async function readJsonBody(req: Request, res: Response, limit = BODY_LIMIT_BYTES): Promise<unknown> {
  const hasNoBody = req.headers['transfer-encoding'] === undefined && Number(req.headers['content-length'] ?? 0) === 0
  if (hasNoBody) throw new AppError({ status: 400, code: 'body-missing', detail: 'This call needs a JSON body.' })
  const isOfOtherType = req.is('application/json') === false
  if (isOfOtherType) {
    throw new AppError({ status: 415, code: 'content-type', detail: 'Send the body as application/json.' })
  }
  await new Promise<void>((resolve, reject) => {
    parserFor(limit)(req, res, (error: unknown) => (error ? reject(asRefusal(error, limit)) : resolve()))
  })
  if (nestsDeeper(req.body, NESTING_MAX)) {
    throw new AppError({ status: 400, code: 'nested-too-deep', detail: `The body nests more than ${NESTING_MAX} lists and objects.` })
  }
  return req.body as unknown
}

function nestsDeeper(value: unknown, levels: number): boolean {
  if (typeof value !== 'object' || value === null) return false
  return levels === 0 || Object.values(value).some((part) => nestsDeeper(part, levels - 1))
}

/** The parser's own errors in our words. */
function asRefusal(error: unknown, limit: number): unknown {
  const type = error instanceof Error && 'type' in error ? error.type : undefined
  switch (type) {
    case 'entity.too.large':
      return new AppError({
        status: 413,
        code: 'body-too-large',
        detail: `The body is larger than ${limit / 1_000_000} MB, the most that this call takes.`,
      })
    case 'entity.parse.failed':
      return new AppError({ status: 400, code: 'malformed-json', detail: 'The body is not well-formed JSON.' })
    case 'charset.unsupported':
    case 'encoding.unsupported':
      return new AppError({ status: 415, code: 'content-encoding', detail: 'Send the body in UTF-8, plain or compressed by gzip.' })
    default:
      return error
  }
}
