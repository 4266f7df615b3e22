import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import SignInView from '../../src/views/SignInView.vue'
import { buildCurrentUser, mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, StubAnswer, stubApi } from '../support/stubApi.ts'

const DEMO = {
  name: 'Alder & Finch House Advisers',
  isDemo: true,
  hasOutbox: true,
  demoAccounts: [{ email: 'owner@alderfinch.example', password: 'quarry lantern moss', role: 'owner', name: 'Mara Quill' }],
}
const NO_DEMO = { name: 'A firm', isDemo: false, hasOutbox: false, demoAccounts: [] }

/** Pages are loaded when they are opened, which takes a busy machine its time. */
const PATIENTLY = { timeout: 10_000 }

afterEach(() => vi.unstubAllGlobals())

async function openSignIn(answers: Record<string, unknown>, at = '/sign-in') {
  const api = stubApi({ 'GET /firm': NO_DEMO, 'GET /houses': [], ...answers })
  const mounted = await mountInApp(SignInView, { at })
  return { api, ...mounted }
}

describe('SignInView', () => {
  it('signs in and goes back to the page that was wanted', async () => {
    const { wrapper, router, session } = await openSignIn(
      { 'POST /sessions': new StubAnswer(201, buildCurrentUser('estimator')) },
      '/sign-in?next=/account',
    )
    await wrapper.get('input[type=email]').setValue(' Estimator@AlderFinch.example ')
    await wrapper.get('input[type=password]').setValue('a pass phrase')
    await wrapper.get('form').trigger('submit')
    await vi.waitFor(() => expect(router.currentRoute.value.path).toBe('/account'), PATIENTLY)
    expect(session.user?.role).toBe('estimator')
  })

  it.each(['//elsewhere.example', 'https://elsewhere.example'])('never leads out of the app to %s', async (next) => {
    const { wrapper, router } = await openSignIn(
      { 'POST /sessions': new StubAnswer(201, buildCurrentUser('owner')) },
      `/sign-in?next=${encodeURIComponent(next)}`,
    )
    await wrapper.get('input[type=email]').setValue('owner@alderfinch.example')
    await wrapper.get('input[type=password]').setValue('a pass phrase')
    await wrapper.get('form').trigger('submit')
    await vi.waitFor(() => expect(router.currentRoute.value.path).toBe('/'), PATIENTLY)
  })

  it('says what the server has against it and keeps what was typed', async () => {
    const { wrapper } = await openSignIn({ 'POST /sessions': problemAnswer(401, 'wrong', 'E-mail and password don’t belong together.') })
    await wrapper.get('input[type=email]').setValue('owner@alderfinch.example')
    await wrapper.get('input[type=password]').setValue('wrong')
    await wrapper.get('form').trigger('submit')
    await flushPromises()
    expect(wrapper.get('[role=alert]').text()).toContain('don’t belong together')
    expect((wrapper.get('input[type=email]').element as HTMLInputElement).value).toBe('owner@alderfinch.example')
  })

  it('says how long to wait after too many tries', async () => {
    const { wrapper } = await openSignIn({
      'POST /sessions': problemAnswer(429, 'too-many', 'Too many tries.', {}, { 'Retry-After': '300' }),
    })
    await wrapper.get('input[type=email]').setValue('owner@alderfinch.example')
    await wrapper.get('input[type=password]').setValue('wrong')
    await wrapper.get('form').trigger('submit')
    await flushPromises()
    expect(wrapper.get('[role=alert]').text()).toContain('Try again in 5 minutes.')
  })

  it('asks for both fields before it asks the server', async () => {
    const { wrapper, api } = await openSignIn({})
    await wrapper.get('form').trigger('submit')
    await flushPromises()
    expect(wrapper.text()).toContain('E-mail is not an e-mail address.')
    expect(wrapper.text()).toContain('Password is empty.')
    expect(api.callsTo('POST /sessions')).toHaveLength(0)
  })

  it('takes a pasted password and can show it', async () => {
    const { wrapper } = await openSignIn({})
    const field = wrapper.get('input[autocomplete=current-password]')
    await wrapper.get('button[aria-label="Show password"]').trigger('click')
    expect(field.attributes('type')).toBe('text')
  })

  describe('in a demo', () => {
    it('lists the accounts, and a press on one fills in the form', async () => {
      const { wrapper } = await openSignIn({ 'GET /firm': DEMO })
      await wrapper.get('.demo-accounts button').trigger('click')
      expect((wrapper.get('input[type=email]').element as HTMLInputElement).value).toBe('owner@alderfinch.example')
      expect((wrapper.get('input[type=password]').element as HTMLInputElement).value).toBe('quarry lantern moss')
    })
  })

  it('shows no account elsewhere', async () => {
    const { wrapper } = await openSignIn({})
    expect(wrapper.find('.demo-accounts').exists()).toBe(false)
  })
})
