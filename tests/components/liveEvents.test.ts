import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { defineComponent } from 'vue'
import { queryClient } from '../../src/api/queryClient.ts'
import { useLiveEvents } from '../../src/composables/useLiveEvents.ts'
import { buildCurrentUser, mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, stubApi } from '../support/stubApi.ts'

/** The browser's own, driven by hand. */
class StubEventSource {
  static readonly CONNECTING = 0
  static readonly CLOSED = 2
  static opened: StubEventSource[] = []
  readyState = 1
  onmessage: ((event: { data: string }) => void) | null = null
  onerror: (() => void) | null = null
  isClosed = false
  constructor(readonly url: string) {
    StubEventSource.opened.push(this)
  }
  close() {
    this.isClosed = true
  }
  send(event: unknown) {
    this.onmessage?.({ data: typeof event === 'string' ? event : JSON.stringify(event) })
  }
  fail(readyState: number) {
    this.readyState = readyState
    this.onerror?.()
  }
}

const onSignedOut = vi.fn()
const Listener = defineComponent({ setup: () => useLiveEvents(onSignedOut), render: () => null })

beforeEach(() => {
  StubEventSource.opened = []
  onSignedOut.mockClear()
  vi.stubGlobal('EventSource', StubEventSource)
})
afterEach(() => {
  vi.unstubAllGlobals()
  vi.useRealTimers()
})

async function listen() {
  const api = stubApi({ 'GET /sessions/current': buildCurrentUser('estimator') })
  const { wrapper } = await mountInApp(Listener, { role: 'estimator' })
  for (const queryKey of [['houses'], ['house', 'h1'], ['house', 'h2'], ['estimate', 'e1', 'summary'], ['people']])
    queryClient.setQueryData(queryKey, {})
  return { api, wrapper, stream: StubEventSource.opened[0]! }
}
function isStale(...queryKey: string[]): boolean {
  return queryClient.getQueryState(queryKey)?.isInvalidated ?? false
}

describe('useLiveEvents', () => {
  it('listens while its page is open', async () => {
    const { wrapper, stream } = await listen()
    expect(stream.url).toBe('/api/events')
    wrapper.unmount()
    expect(stream.isClosed).toBe(true)
  })

  it('has what hangs on a changed house read again, and nothing of its neighbour', async () => {
    const { stream } = await listen()
    stream.send({ type: 'house', id: 'h1', version: 2 })
    expect([isStale('house', 'h1'), isStale('houses'), isStale('house', 'h2'), isStale('people')]).toEqual([true, true, false, false])
  })

  it('reaches all that hangs on an estimate', async () => {
    const { stream } = await listen()
    stream.send({ type: 'estimate', id: 'e1', version: 2 })
    expect([isStale('estimate', 'e1', 'summary'), isStale('houses')]).toEqual([true, true])
  })

  it.each(['no JSON', '{"type":"unheard-of"}'])('lets %s pass', async (data) => {
    const { stream } = await listen()
    stream.send(data)
    expect(isStale('houses')).toBe(false)
  })

  it('tells when the stream ended because the session did', async () => {
    const { api, stream } = await listen()
    api.answers['GET /sessions/current'] = problemAnswer(401, 'signed-out', 'Sign in first.')
    stream.fail(StubEventSource.CLOSED)
    await flushPromises()
    expect(onSignedOut).toHaveBeenCalledOnce()
    expect(stream.isClosed).toBe(true)
  })

  it('opens a stream that was refused once more after a while, the session still standing', async () => {
    const { stream } = await listen()
    vi.useFakeTimers()
    stream.fail(StubEventSource.CLOSED)
    await vi.advanceTimersByTimeAsync(6_000)
    expect(StubEventSource.opened).toHaveLength(2)
    expect(onSignedOut).not.toHaveBeenCalled()
  })

  it('leaves a stream alone that the browser is reopening', async () => {
    const { api, stream } = await listen()
    api.answers['GET /sessions/current'] = new TypeError('Failed to fetch')
    stream.fail(StubEventSource.CONNECTING)
    await flushPromises()
    expect(stream.isClosed).toBe(false)
    expect(onSignedOut).not.toHaveBeenCalled()
  })
})
