import { flushPromises, type VueWrapper } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { useUndoToast } from '../../src/composables/useUndoToast.ts'
import AcceptInvitationView from '../../src/views/AcceptInvitationView.vue'
import AccountView from '../../src/views/AccountView.vue'
import ForgottenPasswordView from '../../src/views/ForgottenPasswordView.vue'
import ResetPasswordView from '../../src/views/ResetPasswordView.vue'
import { buildCurrentUser, mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, StubAnswer, stubApi } from '../support/stubApi.ts'

/** Pages are loaded when they are opened, which takes a busy machine its time. */
const PATIENTLY = { timeout: 10_000 }

afterEach(() => vi.unstubAllGlobals())

async function send(wrapper: VueWrapper): Promise<void> {
  await wrapper.get('form').trigger('submit')
  await flushPromises()
}

describe('AccountView', () => {
  async function openAccount(answers: Record<string, unknown> = {}) {
    const api = stubApi(answers)
    const mounted = await mountInApp(AccountView, { role: 'estimator', at: '/account' })
    return { api, ...mounted }
  }

  it('changes the password, says so and empties the fields', async () => {
    const { api, wrapper } = await openAccount({ 'PUT /account/password': new StubAnswer(204) })
    await wrapper.get('input[autocomplete=current-password]').setValue('the one until now')
    await wrapper.get('input[autocomplete=new-password]').setValue('another pass phrase')
    await send(wrapper)
    expect(api.callsTo('PUT /account/password')[0]?.body).toEqual({
      currentPassword: 'the one until now',
      newPassword: 'another pass phrase',
    })
    expect(useUndoToast().toasts.value.at(-1)?.text).toContain('Your password is changed')
    expect((wrapper.get('input[autocomplete=new-password]').element as HTMLInputElement).value).toBe('')
  })

  it('says at its field that the password until now is wrong', async () => {
    const errors = [{ path: 'currentPassword', code: 'wrong', message: 'is not your password' }]
    const { wrapper } = await openAccount({ 'PUT /account/password': problemAnswer(422, 'invalid', 'x', { errors }) })
    await wrapper.get('input[autocomplete=current-password]').setValue('guessed')
    await wrapper.get('input[autocomplete=new-password]').setValue('another pass phrase')
    await send(wrapper)
    expect(wrapper.text()).toContain('Password until now is not your password.')
  })

  it('asks for a longer password before it asks the server', async () => {
    const { api, wrapper } = await openAccount()
    await wrapper.get('input[autocomplete=current-password]').setValue('x')
    await wrapper.get('input[autocomplete=new-password]').setValue('short')
    await send(wrapper)
    expect(wrapper.text()).toContain('New password needs at least 12 characters.')
    expect(api.calls).toHaveLength(0)
  })

  it('signs out everywhere and says so at the sign-in', async () => {
    const { api, wrapper, router, session } = await openAccount({ 'DELETE /sessions': new StubAnswer(204), 'GET /firm': {} })
    await wrapper
      .findAll('button')
      .find((button) => button.text() === 'Sign out everywhere')!
      .trigger('click')
    await vi.waitFor(() => expect(router.currentRoute.value.name).toBe('sign-in'), PATIENTLY)
    expect(api.callsTo('DELETE /sessions')).toHaveLength(1)
    expect(session.notice).toBe('You are signed out on every device.')
  })
})

describe('ForgottenPasswordView', () => {
  it('answers the same for every address', async () => {
    const api = stubApi({ 'POST /password-resets': new StubAnswer(202) })
    const { wrapper } = await mountInApp(ForgottenPasswordView)
    await wrapper.get('input').setValue('Nobody@alderfinch.example')
    await send(wrapper)
    expect(api.callsTo('POST /password-resets')[0]?.body).toEqual({ email: 'nobody@alderfinch.example' })
    expect(wrapper.get('[role=alert]').text()).toContain('If an account has the address nobody@alderfinch.example')
  })
})

describe('ResetPasswordView', () => {
  it('sets the password by the link and leads to the sign-in', async () => {
    const api = stubApi({ 'POST /password-resets/redeem': new StubAnswer(204), 'GET /firm': {} })
    const { wrapper, router, session } = await mountInApp(ResetPasswordView, { at: '/reset-password?token=a.b.c' })
    await wrapper.get('input').setValue('another pass phrase')
    await send(wrapper)
    await vi.waitFor(() => expect(router.currentRoute.value.name).toBe('sign-in'), PATIENTLY)
    expect(api.calls[0]?.body).toEqual({ token: 'a.b.c', newPassword: 'another pass phrase' })
    expect(session.notice).toContain('Your new password is set')
  })

  it('says what is wrong with a link that was used', async () => {
    stubApi({ 'POST /password-resets/redeem': problemAnswer(409, 'spent', 'This link was used before. Ask for another.') })
    const { wrapper } = await mountInApp(ResetPasswordView, { at: '/reset-password?token=a.b.c' })
    await wrapper.get('input').setValue('another pass phrase')
    await send(wrapper)
    expect(wrapper.get('[role=alert]').text()).toContain('This link was used before.')
  })

  it('says so when the address holds no token', async () => {
    stubApi({})
    const { wrapper } = await mountInApp(ResetPasswordView, { at: '/reset-password' })
    expect(wrapper.find('form').exists()).toBe(false)
    expect(wrapper.text()).toContain('only part of the link')
  })
})

describe('AcceptInvitationView', () => {
  it('takes the name and a password, and signs in', async () => {
    const api = stubApi({ 'POST /invitations/accept': buildCurrentUser('owner'), 'GET /firm': {}, 'GET /houses': [] })
    const { wrapper, router, session } = await mountInApp(AcceptInvitationView, { at: '/accept-invitation?token=a.b.c' })
    await wrapper.get('input[autocomplete=name]').setValue('Ana Reed')
    await wrapper.get('input[autocomplete=new-password]').setValue('another pass phrase')
    await send(wrapper)
    await vi.waitFor(() => expect(router.currentRoute.value.name).toBe('houses'), PATIENTLY)
    expect(api.callsTo('POST /invitations/accept')[0]?.body).toEqual({
      token: 'a.b.c',
      name: 'Ana Reed',
      newPassword: 'another pass phrase',
    })
    expect(session.user?.role).toBe('owner')
  })
})
