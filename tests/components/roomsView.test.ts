import { flushPromises, type VueWrapper } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { queryClient } from '../../src/api/queryClient.ts'
import { useUndoToast } from '../../src/composables/useUndoToast.ts'
import RoomsView from '../../src/views/RoomsView.vue'
import type { Room } from '../../shared/schemas/room.ts'
import { buildKeyedRoom } from '../support/buildKeyedRoom.ts'
import { mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, stubApi, type ApiCall } from '../support/stubApi.ts'

const bedroom = buildKeyedRoom({ id: 'r1', houseId: 'h1', ceiling: null })
const kitchen = buildKeyedRoom({ id: 'r2', houseId: 'h1', name: 'Kitchen', use: 'kitchen', position: 1 })

/** Answers as the server would for a house whose rooms are these. */
function serveRooms(rooms: Room[]): Record<string, unknown> {
  const list = [...rooms]
  return {
    'GET /houses': [],
    'GET /houses/h1/rooms': () => list,
    'POST /houses/h1/rooms': ({ body }: ApiCall) => {
      const { afterRoomId: _afterRoomId, ...fields } = body as Room & { afterRoomId?: string }
      const room = { ...fields, id: `n${list.length}`, houseId: 'h1', position: list.length, version: 1 }
      list.push(room)
      return room
    },
    'DELETE /houses/h1/rooms/r2': () => {
      list.splice(1, 1)
      return { room: kitchen, removedLineIds: ['l1', 'l2', 'l3'] }
    },
    'POST /houses/h1/rooms/r2/restore': () => {
      list.push(kitchen)
      return kitchen
    },
    'PUT /houses/h1/rooms/order': ({ body }: ApiCall) => {
      const { ids } = body as { ids: string[] }
      list.sort((one, other) => ids.indexOf(one.id) - ids.indexOf(other.id))
      return list
    },
  }
}

async function openRooms(rooms: Room[], query = '') {
  const api = stubApi(serveRooms(rooms))
  const { wrapper, router } = await mountInApp(RoomsView, { role: 'estimator', at: `/houses/h1/rooms${query}` })
  await flushPromises()
  return { api, wrapper, router }
}

function button(wrapper: VueWrapper, name: string) {
  const found = wrapper.findAll('button').find((one) => (one.attributes('aria-label') ?? one.text()) === name)
  if (!found) throw new Error(`There is no button ${name}.`)
  return found
}

function names(wrapper: VueWrapper): string[] {
  return wrapper.findAll('.room-list .name').map((name) => name.text())
}

afterEach(() => {
  vi.unstubAllGlobals()
  localStorage.clear()
})

describe('RoomsView', () => {
  it('lists the rooms with floor area, and marks the one that has no ceiling height', async () => {
    const { wrapper } = await openRooms([bedroom, kitchen])
    const [first, second] = wrapper.findAll('.room-list li')

    expect(first?.text()).toContain('125.00 sq ft')
    expect(first?.text()).toContain('no ceiling height')
    expect(second?.find('.mark').exists()).toBe(false)
  })

  it('says beside the measures why some can’t be had', async () => {
    const { wrapper } = await openRooms([bedroom])
    const measures = wrapper.get('.measures')

    expect(measures.text()).toContain('125.00 sq ft')
    expect(measures.get('.missing').text()).toMatch(/ceiling height/i)
    expect(measures.get('.missing').text()).toContain('Walls less openings')
  })

  it('says when the measures stand on a height that is being retyped', async () => {
    const { wrapper } = await openRooms([kitchen])
    const height = wrapper.findAll('.ceiling input.control').at(0)

    await height?.setValue('')
    expect(wrapper.text()).toContain('these measures stand on the height before')
    await height?.setValue('8-6')
    expect(wrapper.text()).not.toContain('these measures stand on the height before')
  })

  it('offers the first step while there is no room', async () => {
    const { wrapper, router } = await openRooms([])

    expect(wrapper.text()).toContain('No rooms yet')
    await button(wrapper, 'Add the first room').trigger('click')
    await flushPromises()
    expect(router.currentRoute.value.query).toEqual({ room: 'new' })
  })

  it('adds a room from a name and two lengths, its use guessed from the name', async () => {
    const { api, wrapper } = await openRooms([kitchen], '?room=new')
    const [name, , , , length, width] = wrapper.findAll('.new-room input')

    await name?.setValue('Rear bedroom')
    await length?.setValue('12-6')
    await width?.setValue('3.81 m')
    await wrapper.get('.new-room').trigger('submit')
    await flushPromises()

    expect(api.callsTo('POST /houses/h1/rooms').map(({ body }) => body)).toEqual([
      {
        name: 'Rear bedroom',
        use: 'sleeping',
        shape: { kind: 'rectangle', lengthIn: 150, widthIn: 150 },
        ceiling: { kind: 'flat', heightIn: 96 },
        openings: [],
        deductions: [],
        note: '',
      },
    ])
    expect(names(wrapper)).toEqual(['Kitchen', 'Rear bedroom'])
  })

  it('says at the fields what is missing, and adds nothing', async () => {
    const { api, wrapper } = await openRooms([kitchen], '?room=new')

    await wrapper.get('.new-room').trigger('submit')
    await flushPromises()

    expect(wrapper.get('.new-room').text()).toContain('Name is empty.')
    expect(wrapper.get('.new-room').text()).toContain('Length is empty.')
    expect(api.callsTo('POST /houses/h1/rooms')).toEqual([])
  })

  it('keeps a new room that the server can’t take now, and sends it with the same key', async () => {
    const { api, wrapper } = await openRooms([kitchen], '?room=new')
    const answer = api.answers['POST /houses/h1/rooms']
    api.answers['POST /houses/h1/rooms'] = new TypeError('no connection')
    const [name, , , , length, width] = wrapper.findAll('.new-room input')
    await name?.setValue('Bath')
    await length?.setValue('8')
    await width?.setValue('5')
    await wrapper.get('.new-room').trigger('submit')
    await flushPromises()
    expect(wrapper.get('.waiting').text()).toContain('Bath')

    api.answers['POST /houses/h1/rooms'] = answer
    await button(wrapper, 'Try again now').trigger('click')
    await flushPromises()

    const keys = api.callsTo('POST /houses/h1/rooms').map(({ headers }) => headers.get('idempotency-key'))
    expect(keys).toHaveLength(2)
    expect(keys[0]).toBe(keys[1])
    expect(names(wrapper)).toEqual(['Kitchen', 'Bath'])
  })

  it('gives a room that is refused back to be put right', async () => {
    const { api, wrapper } = await openRooms([kitchen], '?room=new')
    api.answers['POST /houses/h1/rooms'] = problemAnswer(422, 'invalid', 'The house has as many rooms as it can have.')
    const [name, , , , length, width] = wrapper.findAll('.new-room input')
    await name?.setValue('Bath')
    await length?.setValue('8')
    await width?.setValue('5')
    await wrapper.get('.new-room').trigger('submit')
    await flushPromises()

    await button(wrapper, 'Put it right').trigger('click')
    await flushPromises()

    expect((wrapper.get('.new-room input').element as HTMLInputElement).value).toBe('Bath')
  })

  it('removes a room with its lines, says how many, and brings all back', async () => {
    const { wrapper } = await openRooms([bedroom, kitchen], '?room=r2')

    await button(wrapper, 'Remove').trigger('click')
    await flushPromises()
    const { toasts, runUndo } = useUndoToast()
    const toast = toasts.value.at(-1)
    expect(names(wrapper)).toEqual(['Front bedroom'])
    expect(toast?.text).toBe('Kitchen and its 3 estimate lines removed.')
    if (toast) await runUndo(toast)
    await flushPromises()

    expect(names(wrapper)).toEqual(['Front bedroom', 'Kitchen'])
  })

  it('tells of a room that somebody else removed while it was open', async () => {
    const { api, wrapper } = await openRooms([bedroom, kitchen], '?room=r2')
    api.answers['GET /houses/h1/rooms'] = [bedroom]

    await queryClient.invalidateQueries({ queryKey: ['house', 'h1', 'rooms'] })
    await flushPromises()

    expect(useUndoToast().toasts.value.at(-1)?.text).toContain('Kitchen was removed by somebody else.')
    expect(wrapper.get('.room-pane h2').text()).toBe('Front bedroom')
  })

  it('takes in what somebody else keyed into the open room', async () => {
    const { api, wrapper } = await openRooms([bedroom, kitchen], '?room=r2')
    api.answers['GET /houses/h1/rooms'] = [bedroom, { ...kitchen, version: 2, name: 'Eat-in kitchen' }]

    await queryClient.invalidateQueries({ queryKey: ['house', 'h1', 'rooms'] })
    await flushPromises()

    expect((wrapper.get('.room-form input').element as HTMLInputElement).value).toBe('Eat-in kitchen')
  })

  it('duplicates a room below itself under the next free name', async () => {
    const { api, wrapper } = await openRooms([bedroom, kitchen], '?room=r2')

    await button(wrapper, 'Duplicate').trigger('click')
    await flushPromises()

    expect(api.callsTo('POST /houses/h1/rooms')[0]?.body).toMatchObject({
      name: 'Kitchen 2',
      afterRoomId: 'r2',
      openings: kitchen.openings,
    })
  })

  it('moves a room by the keyboard and says where it went', async () => {
    const { api, wrapper } = await openRooms([bedroom, kitchen])

    await wrapper.get('[data-room="r2"]').trigger('keydown', { key: 'ArrowUp', altKey: true })
    await flushPromises()

    expect(api.callsTo('PUT /houses/h1/rooms/order').map(({ body }) => body)).toEqual([{ ids: ['r2', 'r1'] }])
    expect(wrapper.get('.room-list [role="status"]').text()).toBe('Kitchen is now room 1 of 2.')
  })

  it('moves a room by the arrows beside it', async () => {
    const { api, wrapper } = await openRooms([bedroom, kitchen])

    await button(wrapper, 'Move Front bedroom down').trigger('click')
    await flushPromises()

    expect(api.callsTo('PUT /houses/h1/rooms/order').map(({ body }) => body)).toEqual([{ ids: ['r2', 'r1'] }])
  })
})
