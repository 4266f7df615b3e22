import type { Request, Response } from 'express'
import { AppError } from '../errors/AppError.ts'

/** The version as an entity tag: `"3"`. */
function etagOf(version: number): string {
  return `"${version}"`
}

/** Says which version an answer is of. */
export function setEtag(res: Response, version: number): void {
  res.setHeader('ETag', etagOf(version))
}

/**
 * The version that a write was made against, from `If-Match: "3"`.
 * Throws 428 when the header is missing and 400 when it holds no version; `*` would overwrite blindly and is refused too.
 */
export function readIfMatch(req: Request): number {
  const header = req.get('if-match')
  if (header === undefined) {
    throw new AppError({
      status: 428,
      code: 'if-match-missing',
      detail: 'Say which version you changed: send its ETag in If-Match.',
    })
  }
  const match = /^\s*"?(\d{1,15})"?\s*$/.exec(header)
  if (!match)
    throw new AppError({ status: 400, code: 'if-match-malformed', detail: 'If-Match must hold one ETag as the read gave it, like "3".' })
  return Number(match[1])
}
