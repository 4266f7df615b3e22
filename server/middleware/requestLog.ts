import { randomUUID } from 'node:crypto'
import type { IncomingMessage, ServerResponse } from 'node:http'
import type { RequestHandler } from 'express'
import type { Logger } from 'pino'
import { pinoHttp } from 'pino-http'

/** Gives each request an id and logs how it ended. Bodies, cookies and query strings (they may hold a token) stay out of the log. */
export function requestLog(logger: Logger): RequestHandler {
  return pinoHttp({
    logger,
    genReqId(_req: IncomingMessage, res: ServerResponse) {
      const id = randomUUID()
      res.setHeader('X-Request-Id', id)
      return id
    },
    customLogLevel: (_req, res) => (res.statusCode >= 500 ? 'error' : 'info'),
    wrapSerializers: false,
    serializers: {
      req: (req: IncomingMessage) => ({ id: req.id, method: req.method, path: pathOf(req) }),
      res: (res: ServerResponse) => ({ status: res.statusCode }),
    },
  }) as RequestHandler
}

function pathOf(req: IncomingMessage & { originalUrl?: string }): string {
  const [path = ''] = (req.originalUrl ?? req.url ?? '').split('?')
  return path
}
