import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import ShareHouseDialog from '../../src/components/sharing/ShareHouseDialog.vue'
import { useUndoToast } from '../../src/composables/useUndoToast.ts'
import { mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, StubAnswer, stubApi } from '../support/stubApi.ts'

const OWNERS = [
  { id: 'o1', name: 'Ilse Varden', email: 'ilse@varden.example' },
  { id: 'o2', name: 'Piet Anker', email: 'piet@anker.example' },
]
const SHARE = { userId: 'o1', name: 'Ilse Varden', email: 'ilse@varden.example', sharedAt: '2026-02-01T10:00:00.000Z' }

async function openDialog(answers: Record<string, unknown> = {}, role: 'admin' | 'estimator' = 'estimator') {
  const api = stubApi({ 'GET /owners': OWNERS, 'GET /houses/h1/shares': [SHARE], ...answers })
  const { wrapper } = await mountInApp(ShareHouseDialog, { role, props: { houseId: 'h1', isOpen: true } })
  const dialog = await vi.waitUntil(() => document.querySelector<HTMLElement>('[role="dialog"]'))
  await flushPromises()
  return { api, wrapper, dialog }
}

function press(dialog: HTMLElement, name: string): Promise<unknown> {
  const button = [...dialog.querySelectorAll('button')].find((one) => (one.getAttribute('aria-label') ?? one.textContent)?.trim() === name)
  button?.click()
  return flushPromises()
}

async function choose(dialog: HTMLElement, ownerName: string): Promise<void> {
  const select = dialog.querySelector('select') as HTMLSelectElement
  select.selectedIndex = [...select.options].findIndex(({ text }) => text.startsWith(ownerName))
  select.dispatchEvent(new Event('change'))
  await flushPromises()
}

afterEach(() => vi.unstubAllGlobals())

describe('ShareHouseDialog', () => {
  it('lists those who have the house and offers the others', async () => {
    const { dialog } = await openDialog()

    expect(dialog.querySelector('[aria-label="Shared with"]')?.textContent).toContain('Ilse Varden')
    expect([...dialog.querySelectorAll('option')].map(({ text }) => text)).toEqual(['Choose an owner', 'Piet Anker, piet@anker.example'])
  })

  it('shares with the owner chosen', async () => {
    const { api, dialog } = await openDialog({ 'POST /houses/h1/shares': { ...SHARE, userId: 'o2' } })

    await choose(dialog, 'Piet Anker')
    await press(dialog, 'Share')

    expect(api.callsTo('POST /houses/h1/shares').map(({ body }) => body)).toEqual([{ userId: 'o2' }])
    expect(api.callsTo('GET /houses/h1/shares')).toHaveLength(2)
  })

  it('asks for an owner when none is chosen, and sends nothing', async () => {
    const { api, dialog } = await openDialog()

    await press(dialog, 'Share')

    expect(dialog.textContent).toContain('Choose the owner to share with.')
    expect(api.callsTo('POST /houses/h1/shares')).toEqual([])
  })

  it('says why somebody can’t have it', async () => {
    const { dialog } = await openDialog({ 'POST /houses/h1/shares': problemAnswer(422, 'invalid', 'Piet Anker is not an active owner.') })

    await choose(dialog, 'Piet Anker')
    await press(dialog, 'Share')

    expect(dialog.textContent).toContain('Piet Anker is not an active owner.')
  })

  it('stops sharing, and shares again by undo', async () => {
    const { api, dialog } = await openDialog({ 'DELETE /houses/h1/shares/o1': new StubAnswer(204), 'POST /houses/h1/shares': SHARE })

    await press(dialog, 'Stop sharing with Ilse Varden')
    const { toasts, runUndo } = useUndoToast()
    const toast = toasts.value.at(-1)
    expect(toast?.text).toBe('No longer shared with Ilse Varden.')
    if (toast) await runUndo(toast)

    expect(api.callsTo('DELETE /houses/h1/shares/o1')).toHaveLength(1)
    expect(api.callsTo('POST /houses/h1/shares').map(({ body }) => body)).toEqual([{ userId: 'o1' }])
  })

  it('sends an admin to the people when there is no owner yet', async () => {
    const { dialog } = await openDialog({ 'GET /owners': [], 'GET /houses/h1/shares': [] }, 'admin')

    expect(dialog.textContent).toContain('No owner has an account yet.')
    expect(dialog.querySelector('a')?.getAttribute('href')).toBe('/people')
  })
})
