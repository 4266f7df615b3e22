import { afterEach, describe, expect, it, vi } from 'vitest'
import { messageParts } from '../../src/components/accounts/messageParts.ts'
import OutboxView from '../../src/views/OutboxView.vue'
import { mountInApp } from '../support/mountInApp.ts'
import { stubApi } from '../support/stubApi.ts'

afterEach(() => vi.unstubAllGlobals())

describe('messageParts', () => {
  it('opens a link to the app in the app, whatever host the server thinks it has', () => {
    expect(messageParts('Follow http://127.0.0.1:4400/accept-invitation?token=a.b-c_d to join.')).toEqual([
      { text: 'Follow ', to: null },
      { text: 'http://127.0.0.1:4400/accept-invitation?token=a.b-c_d', to: '/accept-invitation?token=a.b-c_d' },
      { text: ' to join.', to: null },
    ])
  })

  it.each(['https://elsewhere.example/page', 'http://[broken/reset-password', 'javascript:alert(1)'])('leaves %s as text', (link) => {
    expect(messageParts(`See ${link}`).every(({ to }) => to === null)).toBe(true)
  })

  it('loses no character of the message', () => {
    const text = 'a http://x.example/reset-password?token=1\nb\n\nhttps://y.example c'
    expect(
      messageParts(text)
        .map((part) => part.text)
        .join(''),
    ).toBe(text)
  })
})

describe('OutboxView', () => {
  it('shows each message with its link', async () => {
    const message = {
      id: 'm1',
      to: 'new@alderfinch.example',
      subject: 'You are invited',
      text: 'Come: http://localhost:4400/accept-invitation?token=t',
      sentAt: '2026-01-05T10:00:00.000Z',
    }
    stubApi({ 'GET /outbox': [message] })
    const { wrapper } = await mountInApp(OutboxView, { role: 'admin' })
    expect(wrapper.get('h2').text()).toBe('You are invited')
    expect(wrapper.get('article a').attributes('href')).toBe('/accept-invitation?token=t')
  })

  it('says what goes there while it is empty', async () => {
    stubApi({ 'GET /outbox': [] })
    const { wrapper } = await mountInApp(OutboxView, { role: 'admin' })
    expect(wrapper.text()).toContain('No message yet')
  })
})
