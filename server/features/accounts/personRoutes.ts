import type { RequestHandler } from 'express'
import { z } from 'zod'
import {
  currentUserSchema,
  invitationAcceptSchema,
  invitationSchema,
  personPatchSchema,
  personSchema,
} from '../../../shared/schemas/account.ts'
import { idSchema } from '../../../shared/schemas/common.ts'
import { setEtag } from '../../http/etag.ts'
import { operation, type Operation } from '../../http/operation.ts'
import { setSessionCookie } from '../../http/sessionCookie.ts'
import type { AccountServices } from './accountServices.ts'
import { SESSION_MAX_MS } from './sessionService.ts'

const ownersSchema = z.array(z.object({ id: idSchema, name: z.string(), email: z.string() }))
const personParams = z.object({ id: idSchema })

export function personOperations({ accounts, accountLimit }: { accounts: AccountServices; accountLimit: RequestHandler }): Operation[] {
  const { people, invitations } = accounts
  return [
    operation(
      {
        id: 'listPeople',
        method: 'get',
        path: '/people',
        action: 'person.read',
        summary: 'The people of the firm.',
        response: z.array(personSchema),
      },
      () => people.list(),
    ),
    operation(
      {
        id: 'updatePerson',
        method: 'patch',
        path: '/people/:id',
        action: 'person.write',
        summary: 'Rename a person, change the role, deactivate or take back. Another role or a deactivation ends their sessions.',
        params: personParams,
        ifMatch: true,
        body: personPatchSchema,
        response: personSchema,
      },
      ({ user, params, ifMatch, body, res }) => {
        const person = people.update(user, params.id, ifMatch, body)
        setEtag(res, person.version)
        return person
      },
    ),
    operation(
      {
        id: 'listOwners',
        method: 'get',
        path: '/owners',
        action: 'house.share',
        summary: 'Active owners, to share a house with.',
        response: ownersSchema,
      },
      () => people.listOwners(),
    ),
    operation(
      {
        id: 'invitePerson',
        method: 'post',
        path: '/invitations',
        action: 'person.write',
        summary: 'Invite somebody by mail, or once more somebody who has not answered yet.',
        body: invitationSchema,
        response: personSchema,
        status: 201,
      },
      ({ user, body }) => invitations.invite(user, body),
    ),
    operation(
      {
        id: 'acceptInvitation',
        method: 'post',
        path: '/invitations/accept',
        action: 'public',
        summary: 'Follow an invitation: set name and password, and be signed in.',
        guards: [accountLimit],
        body: invitationAcceptSchema,
        response: currentUserSchema,
      },
      async ({ body, req, res }) => {
        const { user, sessionToken } = await invitations.accept(body.token, body, req.activeSession)
        setSessionCookie(res, sessionToken, SESSION_MAX_MS)
        return user
      },
    ),
  ]
}
