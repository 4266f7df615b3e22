import type { RequestHandler } from 'express'
import compression from 'compression'

/** Compresses what is worth it. A stream of events is left alone: compressed, it would reach the reader in clumps. */
export function compressResponses(): RequestHandler {
  return compression({
    filter: (req, res) => !String(res.getHeader('Content-Type')).startsWith('text/event-stream') && compression.filter(req, res),
  })
}
