import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { Person } from '../../shared/schemas/account.ts'
import { useUndoToast } from '../../src/composables/useUndoToast.ts'
import PeopleView from '../../src/views/PeopleView.vue'
import { buildCurrentUser, mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, StubAnswer, stubApi } from '../support/stubApi.ts'

function buildPerson(overrides: Partial<Person> = {}): Person {
  return {
    id: 'p1',
    email: 'tobias@alderfinch.example',
    name: 'Tobias Finch',
    role: 'estimator',
    status: 'active',
    version: 4,
    createdAt: '2026-01-01T00:00:00.000Z',
    lastSignInAt: null,
    ...overrides,
  }
}

afterEach(() => vi.unstubAllGlobals())

async function openPeople(people: Person[], answers: Record<string, unknown> = {}) {
  const api = stubApi({ 'GET /people': people, ...answers })
  const { wrapper } = await mountInApp(PeopleView, { role: 'admin' })
  return { api, wrapper }
}
function button(words: string): HTMLButtonElement {
  const found = [...document.querySelectorAll('button')].find(({ textContent }) => textContent?.includes(words))
  if (!found) throw new Error(`There is no button that says "${words}"`)
  return found
}

describe('PeopleView', () => {
  it('says of each person what they may do and how their account stands', async () => {
    const { wrapper } = await openPeople([buildPerson(), buildPerson({ id: 'p2', name: 'Ana Reed', status: 'invited' })])
    const rows = wrapper.findAll('tbody tr').map((row) => row.text())
    expect(rows[0]).toContain('Ana Reed')
    expect(rows[0]).toContain('Invited, not yet accepted')
    expect(rows[1]).toContain('Active')
  })

  it('changes a role against the version that was read, and offers the way back', async () => {
    const { api, wrapper } = await openPeople([buildPerson()], { 'PATCH /people/p1': buildPerson({ role: 'admin', version: 5 }) })
    await wrapper.get('select').setValue('admin')
    await flushPromises()
    const [change] = api.callsTo('PATCH /people/p1')
    expect(change?.body).toEqual({ role: 'admin' })
    expect(change?.headers.get('if-match')).toBe('"4"')

    const { toasts, runUndo } = useUndoToast()
    const toast = toasts.value.at(-1)!
    expect(toast.text).toBe('Tobias Finch is now an admin')
    await runUndo(toast)
    const back = api.callsTo('PATCH /people/p1').at(-1)
    expect(back?.body).toEqual({ role: 'estimator' })
    expect(back?.headers.get('if-match')).toBe('"5"')
  })

  it('asks before it deactivates somebody, and names them', async () => {
    const { api } = await openPeople([buildPerson()], { 'PATCH /people/p1': buildPerson({ status: 'deactivated', version: 5 }) })
    button('Deactivate').click()
    await flushPromises()
    expect(api.callsTo('PATCH /people/p1')).toHaveLength(0)
    expect(document.body.textContent).toContain('Every device they are signed in on is signed out at once')
    const confirm = [...document.querySelectorAll('[role=dialog] button')].find(({ textContent }) =>
      textContent?.includes('Deactivate Tobias Finch'),
    )
    ;(confirm as HTMLButtonElement).click()
    await flushPromises()
    expect(api.callsTo('PATCH /people/p1')[0]?.body).toEqual({ active: false })
  })

  it('lets nobody change or deactivate themselves', async () => {
    const self = buildCurrentUser('admin')
    const { wrapper } = await openPeople([buildPerson({ id: self.id, name: self.name, role: 'admin' })])
    expect(wrapper.find('tbody select').exists()).toBe(false)
    expect(wrapper.find('tbody button').exists()).toBe(false)
  })

  it('takes a deactivated person back', async () => {
    const { api } = await openPeople([buildPerson({ status: 'deactivated' })], { 'PATCH /people/p1': buildPerson() })
    button('Reactivate').click()
    await flushPromises()
    expect(api.callsTo('PATCH /people/p1')[0]?.body).toEqual({ active: true })
  })

  it('invites somebody, keeps the dialog with its words when that is refused', async () => {
    const { api } = await openPeople([], {
      'POST /invitations': problemAnswer(409, 'already-active', 'This person has an account already.'),
    })
    button('Invite somebody').click()
    await flushPromises()
    const dialog = document.querySelector('[role=dialog]')!
    const [name, email] = [...dialog.querySelectorAll('input')]
    name!.value = 'Ana Reed'
    name!.dispatchEvent(new Event('input'))
    email!.value = 'ana@alderfinch.example'
    email!.dispatchEvent(new Event('input'))
    dialog.querySelector('form')!.dispatchEvent(new Event('submit', { cancelable: true }))
    await flushPromises()
    expect(dialog.textContent).toContain('This person has an account already.')
    expect(name!.value).toBe('Ana Reed')

    api.answers['POST /invitations'] = new StubAnswer(201, buildPerson({ status: 'invited' }))
    dialog.querySelector('form')!.dispatchEvent(new Event('submit', { cancelable: true }))
    await flushPromises()
    expect(api.callsTo('POST /invitations').at(-1)?.body).toEqual({ name: 'Ana Reed', email: 'ana@alderfinch.example', role: 'estimator' })
  })

  it('says why the people can’t be shown and tries again when asked', async () => {
    const { api, wrapper } = await openPeople([], { 'GET /people': problemAnswer(403, 'forbidden', 'Only an admin sees the people.') })
    expect(wrapper.get('[role=alert]').text()).toContain('Only an admin sees the people.')
    api.answers['GET /people'] = [buildPerson()]
    button('Try again').click()
    await flushPromises()
    expect(wrapper.text()).toContain('Tobias Finch')
  })
})
