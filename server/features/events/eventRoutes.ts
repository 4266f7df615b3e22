import type { Request, Response } from 'express'
import { tooMany } from '../../errors/AppError.ts'
import { AlreadyAnswered } from '../../http/answers.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { SessionService } from '../accounts/sessionService.ts'
import type { AppEvent, EventHub } from './eventHub.ts'

/** A person has a handful of tabs; more streams than this are a fault. */
const STREAMS_PER_PERSON = 20
const STREAMS_MAX = 500
/** Keeps proxies from closing a quiet stream, and notices that a session ran out. */
const HEARTBEAT_MS = 25_000

interface EventServices {
  events: EventHub
  sessions: SessionService
}

export function eventOperations({ events, sessions }: EventServices): Operation[] {
  return [
    operation(
      {
        id: 'events',
        method: 'get',
        path: '/events',
        action: 'account.self',
        summary: 'Tells what changed, as server-sent events, of what the reader may see. Ends with the session.',
        produces: 'text/event-stream',
      },
      ({ req, res }) => {
        openStream(req, res, { events, sessions })
        return new AlreadyAnswered()
      },
    ),
  ]
}

function openStream(req: Request, res: Response, { events, sessions }: EventServices): void {
  const session = req.activeSession
  if (!session) return
  const hasTooMany = events.countOf(session.user.id) >= STREAMS_PER_PERSON || events.count() >= STREAMS_MAX
  if (hasTooMany) throw tooMany('Too many screens are open for live changes. Close some tabs.', 60)

  res.writeHead(200, { 'Content-Type': 'text/event-stream', 'Cache-Control': 'no-store', 'X-Accel-Buffering': 'no' })
  if (req.method === 'HEAD') {
    res.end()
    return
  }
  res.write(': open\n\n')
  const leave = events.join({
    sessionIdHash: session.idHash,
    user: session.user,
    send: (event) => res.write(asEventText(event)),
    close: () => res.end(),
  })
  const heartbeat = setInterval(() => {
    const isOver = sessions.findByHash(session.idHash, { isUse: false }) === null
    if (isOver) res.end()
    else res.write(': still here\n\n')
  }, HEARTBEAT_MS)
  heartbeat.unref()
  res.on('close', () => {
    clearInterval(heartbeat)
    leave()
  })
}

function asEventText({ type, id, version }: AppEvent): string {
  return `data: ${JSON.stringify({ type, id, version })}\n\n`
}
