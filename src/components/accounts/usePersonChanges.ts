import { useQueryClient } from '@tanstack/vue-query'
import { ref } from 'vue'
import type { Person, Role } from '../../../shared/schemas/account.ts'
import { invitePerson, peopleQuery, updatePerson } from '../../api/people.ts'
import { useUndoToast } from '../../composables/useUndoToast.ts'

/** What an admin does to one person, with its news and its way back. */
export function usePersonChanges() {
  const queries = useQueryClient()
  const { offerUndo, say, sayProblem } = useUndoToast()
  const isBusy = ref(false)

  async function run(change: () => Promise<void>): Promise<void> {
    isBusy.value = true
    try {
      await change()
    } catch (error) {
      sayProblem(error)
    } finally {
      await queries.invalidateQueries(peopleQuery)
      isBusy.value = false
    }
  }

  function changeRole(person: Person, role: Role): Promise<void> {
    return run(async () => {
      const changed = await updatePerson(person, { role })
      offerUndo(`${person.name} is now an ${role}`, () => run(async () => void (await updatePerson(changed, { role: person.role }))))
    })
  }

  function deactivate(person: Person): Promise<void> {
    return run(async () => {
      const changed = await updatePerson(person, { active: false })
      offerUndo(`${person.name} can’t sign in any more`, () => run(async () => void (await updatePerson(changed, { active: true }))))
    })
  }

  function reactivate(person: Person): Promise<void> {
    return run(async () => {
      await updatePerson(person, { active: true })
      say(`${person.name} can sign in again`)
    })
  }

  function inviteAgain({ email, name, role }: Person): Promise<void> {
    return run(async () => {
      await invitePerson({ email, name, role })
      say(`A new invitation is on its way to ${email}`)
    })
  }

  return { isBusy, changeRole, deactivate, reactivate, inviteAgain }
}
