import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { EstimateWhole } from '../../../shared/schemas/estimate.ts'
import { ProblemError } from '../../../src/api/ProblemError.ts'
import { createEstimateModel, type EstimateModel } from '../../../src/composables/estimateModel.ts'
import { ownLineFields } from '../../../src/composables/newLineFields.ts'
import { useEstimateEdits, type EstimateEdits } from '../../../src/composables/useEstimateEdits.ts'
import { buildEstimate, buildEstimateWhole, buildLine, buildLines } from '../../support/buildEstimateWhole.ts'
import { buildPriceItem } from '../../support/buildPriceItem.ts'
import { fakeEstimateServer } from '../../support/fakeEstimateServer.ts'

let server: ReturnType<typeof fakeEstimateServer>
let model: EstimateModel
let edits: EstimateEdits

function open(whole: EstimateWhole): void {
  server = fakeEstimateServer(whole)
  model = createEstimateModel(whole, { calls: server.calls, onBehind: () => model.take(server.whole()) })
  edits = useEstimateEdits({ model, findItem: () => buildPriceItem({ roomFormula: 'floor_area', houseFormula: 'living_area' }) })
}
const row = (key: string) => {
  const found = model.list.find(key)
  if (!found) throw new Error(`There is no line ${key}.`)
  return found
}
const likely = () => model.totals().totalCents.likely
const change = (key: string, after: object) => edits.edit([{ key, after }], 'change')

beforeEach(() => {
  vi.useFakeTimers()
  open(buildEstimateWhole({ lines: buildLines({ description: 'Floor' }, { description: 'Wall' }, { description: 'Roof' }) }))
})
afterEach(() => {
  model.saving.stop()
  vi.useRealTimers()
})

describe('editing a line', () => {
  it('shows the new figures at once and saves only what changed, against the version of the line', async () => {
    change('line-1', { quantity: '200' })
    expect(row('line-1').figures.amountCents).toEqual({ low: 40_000, likely: 60_000, high: 80_000 })
    expect(likely()).toBe(120_000)
    expect(model.saving.state.value).toBe('saving')
    await flushPromises()
    expect(server.log).toEqual(['update line-1 quantity'])
    expect(server.line('line-1')).toMatchObject({ quantity: '200', version: 2 })
    expect(row('line-1').version).toBe(2)
    expect(model.saving.state.value).toBe('saved')
  })

  it('sends what was changed while a save was under way after it', async () => {
    change('line-1', { quantity: '200' })
    change('line-1', { quantity: '300', note: 'twice' })
    await flushPromises()
    expect(server.line('line-1')).toMatchObject({ quantity: '300', note: 'twice' })
    expect(row('line-1').fields).toMatchObject({ quantity: '300', note: 'twice' })
  })

  it('leaves a line whose formula is wrong out of the totals, and keeps what was typed', async () => {
    change('line-1', { quantity: 'floor_aria' })
    await flushPromises()
    expect(row('line-1').figures.error).not.toBeNull()
    expect([...model.leftOut()]).toEqual(['line-1'])
    expect(likely()).toBe(60_000)
    expect(server.line('line-1')?.quantity).toBe('floor_aria')
    edits.history.undo()
    expect([...model.leftOut()]).toEqual([])
  })

  it('lets the item’s formula go along from the house to a room, but no formula that somebody changed', async () => {
    open(buildEstimateWhole({ lines: buildLines({ quantity: 'living_area' }, { quantity: '12' }) }))
    change('line-1', { roomId: 'room-1' })
    change('line-2', { roomId: 'room-1' })
    expect(row('line-1').fields.quantity).toBe('floor_area')
    expect(row('line-1').figures.measured).toBe(125)
    expect(row('line-2').fields.quantity).toBe('12')
    edits.history.undo()
    edits.history.undo()
    expect(row('line-1').fields).toMatchObject({ roomId: null, quantity: 'living_area' })
  })
})

describe('previewing while one types', () => {
  it('follows each keystroke and goes back when the entry is dropped, without saving', async () => {
    const seen: number[] = []
    model.onNews(() => seen.push(likely()))
    model.preview('line-1', { quantity: '2' })
    model.preview('line-1', { quantity: '25' })
    model.preview('line-1', null)
    expect(seen).toEqual([60_600, 67_500, 90_000])
    expect(row('line-1').fields.quantity).toBe('100')
    await flushPromises()
    expect(server.log).toEqual([])
  })
})

describe('adding, removing, moving', () => {
  const own = (description: string) => ({
    fields: { ...ownLineFields({ roomId: null, system: 'floors', trade: 'flooring' }), description },
    book: { materials: null, installed: { low: 10_000, likely: 10_000, high: 10_000 } },
  })

  it('adds lines below another, one after the other', async () => {
    const keys = edits.add([own('First'), own('Second')], 'line-1', 'paste')
    expect(model.list.keys()).toEqual(['line-1', ...keys, 'line-2', 'line-3'])
    expect(likely()).toBe(90_200)
    await flushPromises()
    expect(server.whole().lines.map(({ description }) => description)).toEqual(['Floor', 'First', 'Second', 'Wall', 'Roof'])
    expect(row(keys[0] ?? '').id).toBe('added-1')
  })

  it('undoes a paste of edits, additions and marked cells as one step, and does it again with the same lines', async () => {
    const lines = edits.place([own('First'), own('Second')], 'line-3')
    const wrong = { text: 'Nowhere', words: '`Nowhere` is no room of this house.' }
    edits.run({
      words: 'paste of 3 lines',
      changes: [
        { kind: 'edit', edits: [{ key: 'line-1', before: { quantity: '100' }, after: { quantity: '5' } }] },
        { kind: 'add', lines },
        { kind: 'mark', marks: [{ key: 'line-2', field: 'roomId', before: null, after: wrong }] },
      ],
    })
    expect(row('line-2').wrong.roomId).toEqual(wrong)
    await flushPromises()
    edits.history.undo()
    await flushPromises()
    expect(row('line-2').wrong.roomId).toBeUndefined()
    expect(server.whole().lines.map(({ description, quantity }) => `${description} ${quantity}`)).toEqual([
      'Floor 100',
      'Wall 100',
      'Roof 100',
    ])
    edits.history.redo()
    await flushPromises()
    expect(server.whole().lines.map(({ id }) => id)).toEqual(['line-1', 'line-2', 'line-3', 'added-1', 'added-2'])
    expect(server.line('line-1')?.quantity).toBe('5')
    expect(row('line-2').wrong.roomId).toEqual(wrong)
  })

  it('never sends a line that was added and removed again before the server heard of it', async () => {
    server.setDown(true)
    const [key = ''] = edits.add([own('First')], 'line-1', 'addition')
    await flushPromises()
    edits.remove([key], 'removal')
    server.setDown(false)
    model.saving.retry()
    await flushPromises()
    expect(server.log).toEqual([])
    expect(model.saving.state.value).toBe('saved')
  })

  it('removes lines and brings them back where they stood', async () => {
    edits.remove(['line-1', 'line-2'], 'removal')
    expect(model.list.keys()).toEqual(['line-3'])
    expect(likely()).toBe(30_000)
    await flushPromises()
    edits.history.undo()
    expect(model.list.keys()).toEqual(['line-1', 'line-2', 'line-3'])
    await flushPromises()
    expect(server.log).toEqual(['remove line-1', 'remove line-2', 'restore line-1', 'restore line-2'])
    change('line-1', { note: 'goes on' })
    await flushPromises()
    expect(server.line('line-1')?.note).toBe('goes on')
  })

  it('moves a line and saves the order', async () => {
    expect(edits.move(['line-3'], -1, ['line-1', 'line-2', 'line-3'])).toBe(true)
    await flushPromises()
    expect(server.log).toEqual(['order line-1 line-3 line-2'])
    edits.history.undo()
    await flushPromises()
    expect(server.log.at(-1)).toBe('order line-1 line-2 line-3')
  })
})

describe('without a connection', () => {
  it('keeps what was keyed and sends it when the server answers again', async () => {
    server.setDown(true)
    change('line-1', { quantity: '200' })
    await flushPromises()
    expect(model.saving.state.value).toBe('unsaved')
    expect(row('line-1').state).toBe('waiting')
    change('line-2', { note: 'meanwhile' })
    server.setDown(false)
    await vi.advanceTimersByTimeAsync(2_000)
    expect(server.line('line-1')?.quantity).toBe('200')
    expect(server.line('line-2')?.note).toBe('meanwhile')
    expect(model.saving.state.value).toBe('saved')
  })

  it('adds a line once, however often it had to be sent, and what was keyed since after it', async () => {
    const answer = server.calls.addLine
    const bodies: unknown[] = []
    server.calls.addLine = async (...args) => {
      bodies.push(structuredClone(args))
      const done = await answer(...args)
      // The line was added, but the answer got lost on its way.
      if (bodies.length === 1) throw new ProblemError({ status: 0, code: 'unreachable', detail: 'lost' })
      return done
    }
    const fields = ownLineFields({ roomId: null, system: 'floors', trade: 'flooring' })
    const [key = ''] = edits.add([{ fields, book: { materials: null, installed: null } }], 'line-3', 'addition')
    await flushPromises()
    change(key, { note: 'keyed since' })
    await vi.advanceTimersByTimeAsync(2_000)
    expect(bodies[1]).toEqual(bodies[0])
    expect(server.whole().lines).toHaveLength(4)
    expect(server.line('added-1')?.note).toBe('keyed since')
  })
})

describe('what the server refuses', () => {
  it('stays on the page with the reason, and is sent again once it is changed', async () => {
    server.refuseNext(new ProblemError({ status: 422, code: 'invalid', detail: 'roomId: is not a room of this house.' }))
    change('line-1', { roomId: 'room-9' })
    await flushPromises()
    expect(row('line-1')).toMatchObject({ state: 'refused', problem: 'roomId: is not a room of this house.' })
    expect(model.saving.troubled.value.map(({ key }) => key)).toEqual(['line-1'])
    change('line-1', { roomId: 'room-1' })
    await flushPromises()
    expect(server.line('line-1')?.roomId).toBe('room-1')
    expect(model.saving.troubled.value).toEqual([])
  })
})

describe('two people at once', () => {
  it('merges changes of different fields and sends ours again', async () => {
    server.elsewhere.change('line-1', { note: 'theirs' })
    change('line-1', { quantity: '200' })
    await flushPromises()
    expect(server.line('line-1')).toMatchObject({ quantity: '200', note: 'theirs' })
    expect(row('line-1').fields).toMatchObject({ quantity: '200', note: 'theirs' })
    expect(row('line-1').state).toBe('saved')
  })

  it('keeps both values of a field that both changed until a person chooses', async () => {
    server.elsewhere.change('line-1', { quantity: '50' })
    change('line-1', { quantity: '200', note: 'mine' })
    await flushPromises()
    expect(row('line-1').conflicts).toEqual([{ path: 'quantity', mine: '200', theirs: '50' }])
    expect(server.line('line-1')).toMatchObject({ quantity: '50', note: 'mine' })
    expect(model.saving.state.value).toBe('unsaved')

    model.settle(row('line-1'), 'quantity', 'mine')
    await flushPromises()
    expect(server.line('line-1')?.quantity).toBe('200')
    expect(model.saving.state.value).toBe('saved')
  })

  it('takes theirs when that is chosen', async () => {
    server.elsewhere.change('line-1', { quantity: '50' })
    change('line-1', { quantity: '200' })
    await flushPromises()
    model.settle(row('line-1'), 'quantity', 'theirs')
    await flushPromises()
    expect(row('line-1').figures.quantity).toBe(50)
    expect(server.line('line-1')?.quantity).toBe('50')
  })

  it('treats an own price as one value: no half of one person’s and half of another’s', async () => {
    const price = (likely: number) => ({ price: { low: 1, likely, high: 90_000 }, reason: `at ${likely}` })
    open(buildEstimateWhole({ lines: [buildLine({ override: price(10_000) })] }))
    server.elsewhere.change('line-1', { override: price(20_000) })
    change('line-1', { override: { ...price(10_000), reason: 'mine' } })
    await flushPromises()
    expect(row('line-1').conflicts).toEqual([{ path: 'override', mine: { ...price(10_000), reason: 'mine' }, theirs: price(20_000) }])
  })

  it('brings others’ lines in and takes removed ones out when it hears of them, leaving the rest alone', async () => {
    const untouched = row('line-3')
    server.elsewhere.add(buildLine({ id: 'line-9', position: 9000, description: 'Theirs' }))
    server.elsewhere.remove('line-2')
    model.heard(server.whole().estimate.version)
    expect(model.list.keys()).toEqual(['line-1', 'line-3', 'line-9'])
    expect(row('line-3')).toBe(untouched)
    expect(likely()).toBe(90_000)
  })

  it('keeps a line that was changed here and removed elsewhere until a person chooses', async () => {
    server.elsewhere.remove('line-1')
    change('line-1', { quantity: '200' })
    await flushPromises()
    expect(row('line-1').state).toBe('gone')
    model.settleGone(row('line-1'), 'put-back')
    await flushPromises()
    expect(server.line('line-1')?.quantity).toBe('200')
  })

  it('lets such a line go', async () => {
    server.elsewhere.remove('line-1')
    change('line-1', { quantity: '200' })
    await flushPromises()
    model.settleGone(row('line-1'), 'let-go')
    expect(model.list.keys()).toEqual(['line-2', 'line-3'])
    expect(model.saving.state.value).toBe('saved')
  })

  it('does not take a line away that somebody is typing in', () => {
    model.setEdited('line-1')
    server.elsewhere.remove('line-1')
    model.heard(server.whole().estimate.version)
    expect(row('line-1').state).toBe('gone')
  })

  it('holds what was keyed over a value that came in meanwhile against it', async () => {
    server.elsewhere.change('line-1', { quantity: '50' })
    model.heard(server.whole().estimate.version)
    model.keepBoth('line-1', 'quantity', '200')
    await flushPromises()
    expect(server.line('line-1')?.quantity).toBe('50')
    expect(row('line-1').conflicts).toEqual([{ path: 'quantity', mine: '200', theirs: '50' }])
  })

  it('does not read the estimate again for its own writes', async () => {
    const onBehind = vi.fn()
    model = createEstimateModel(server.whole(), { calls: server.calls, onBehind })
    edits = useEstimateEdits({ model, findItem: () => undefined })
    change('line-1', { note: 'one' })
    change('line-2', { note: 'two' })
    await flushPromises()
    model.heard(server.whole().estimate.version)
    expect(onBehind).not.toHaveBeenCalled()
    server.elsewhere.change('line-3', { note: 'theirs' })
    model.heard(server.whole().estimate.version)
    expect(onBehind).toHaveBeenCalledOnce()
  })
})

describe('settings', () => {
  it('change the totals at once and are saved, merged with what somebody else changed', async () => {
    server.elsewhere.changeSettings({ overheadAndProfitPercent: 20 })
    edits.changeSettings({ permitsCents: 45_000 })
    expect(likely()).toBe(135_000)
    await flushPromises()
    expect(server.whole().estimate.settings).toMatchObject({ permitsCents: 45_000, overheadAndProfitPercent: 20 })
    expect(likely()).toBe(153_000)
    edits.history.undo()
    await flushPromises()
    expect(server.whole().estimate.settings.permitsCents).toBe(0)
  })

  it('ask when both changed the same', async () => {
    server.elsewhere.changeSettings({ permitsCents: 10_000 })
    edits.changeSettings({ permitsCents: 45_000 })
    await flushPromises()
    expect(model.settingsConflicts.value).toEqual([{ path: 'permitsCents', mine: 45_000, theirs: 10_000 }])
    model.settleSettings('permitsCents', 'theirs')
    await flushPromises()
    expect(likely()).toBe(100_000)
    expect(server.whole().estimate.settings.permitsCents).toBe(10_000)
  })
})

describe('rooms that somebody changes', () => {
  it('change the figures of the lines that are measured in them', () => {
    open(buildEstimateWhole({ estimate: buildEstimate(), lines: [buildLine({ roomId: 'room-1', quantity: 'floor_area' })] }))
    expect(likely()).toBe(37_500)
    const fresh = server.whole()
    fresh.estimate.version += 1
    fresh.rooms = fresh.rooms.map((room) => ({ ...room, version: 2, shape: { kind: 'rectangle', lengthIn: 120, widthIn: 120 } }))
    model.take(fresh)
    expect(likely()).toBe(30_000)
  })
})
