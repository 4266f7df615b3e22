import type { Role } from '../../shared/schemas/account.ts'
import type { TestApp } from './buildTestApp.ts'
import { buildUser, type TestUser } from './buildUser.ts'

export interface HeardEvent {
  type: string
  id: string
  version: number
}

/** What a person hears of changes from now on, as their event stream would carry it. A role stands for a new person of it. */
export function heardEvents({ db, events }: TestApp, listener: Role | TestUser): HeardEvent[] {
  const user = typeof listener === 'string' ? buildUser(db, { role: listener }) : listener
  const heard: HeardEvent[] = []
  events.join({
    sessionIdHash: user.id,
    user,
    send: ({ type, id, version }) => heard.push({ type, id, version }),
    close: () => {},
  })
  return heard
}
