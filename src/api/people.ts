import { queryOptions } from '@tanstack/vue-query'
import type { Invitation, Person, PersonPatch } from '../../shared/schemas/account.ts'
import { http } from './http.ts'

export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: ({ signal }) => http.get<Person[]>('/people', { signal }),
})

/** Sends an invitation by mail; repeated for the same person it sends a new link. */
export function invitePerson(invitation: Invitation): Promise<Person> {
  return http.post<Person>('/invitations', invitation)
}

export function updatePerson(person: Pick<Person, 'id' | 'version'>, patch: PersonPatch): Promise<Person> {
  return http.patch<Person>(`/people/${person.id}`, patch, { ifMatch: person.version })
}
