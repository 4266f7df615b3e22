import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { openEstimate, type EstimateInput, type LineInput, type LiveEstimate, type RoomInput } from '../../shared/engine/index.ts'
import {
  buildEstimateInput,
  buildHouseInput,
  buildLineInput,
  buildOpening,
  buildRoomInput,
  buildSettings,
  samePrice,
} from '../support/buildEngineInput.ts'

const bedroom = buildRoomInput()
const floor = buildLineInput({ key: 'floor', roomKey: 'bedroom', quantity: 'floor_area' })
const walls = buildLineInput({
  key: 'walls',
  roomKey: 'bedroom',
  quantity: 'wall_area',
  system: 'walls',
  trade: 'painting',
  basis: 'hired',
})
const allFloors = buildLineInput({ key: 'all-floors', quantity: 'sum_floor_area' })

function open(own: Partial<EstimateInput> = {}): LiveEstimate {
  return openEstimate(buildEstimateInput({ rooms: [bedroom], lines: [floor, walls, allFloors], ...own }))
}

describe('a live estimate', () => {
  describe('when a line changes', () => {
    it('works that line out again, and the totals follow', () => {
      const live = open()
      live.setLine('floor', { ...floor, unitPriceE4: samePrice(40_000) })
      expect(live.line('floor').amountCents.likely).toBe(50_000)
      expect(live.line('walls').amountCents.likely).toBe(108_000)
      expect(live.totals().directCents.likely).toBe(50_000 + 108_000 + 37_500)
    })

    it('lets it change its room, its basis and its groups', () => {
      const live = open()
      live.setLine('floor', { ...floor, roomKey: null, quantity: '10', basis: 'hired', system: 'walls', trade: 'painting' })
      expect(live.subtotals('room').get('bedroom')?.lineCount).toBe(1)
      expect(live.subtotals('system').has('floors')).toBe(true)
      expect(live.subtotals('trade').get('painting')).toEqual({
        amountCents: { low: 74_000, likely: 111_000, high: 148_000 },
        hours: 0,
        lineCount: 2,
      })
    })

    it('takes it out of the totals while it has an error, and back in', () => {
      const live = open()
      const before = live.totals()
      live.setLine('floor', { ...floor, quantity: 'flor_area' })
      expect(live.errors()).toEqual([{ path: 'lines[0].quantity', code: 'unknown-name', message: expect.stringContaining('floor_area') }])
      expect(live.totals().directCents.likely).toBe(before.directCents.likely - 37_500)
      live.setLine('floor', floor)
      expect(live.errors()).toEqual([])
      expect(live.totals()).toEqual(before)
    })
  })

  describe('when lines come and go', () => {
    it('adds one below another, or at the end', () => {
      const live = open()
      live.addLine(buildLineInput({ key: 'second', unitPriceE4: null }), 'floor')
      live.addLine(buildLineInput({ key: 'last', unitPriceE4: null }))
      expect(live.errors().map(({ path }) => path)).toEqual(['lines[1].unitPrice', 'lines[4].unitPrice'])
      expect(live.results().lines.map(({ key }) => key)).toEqual(['floor', 'walls', 'all-floors'])
    })

    it('removes one, and a group with no line left', () => {
      const live = open()
      live.removeLine('walls')
      expect(live.totals().directCents.likely).toBe(75_000)
      expect([...live.subtotals('system').keys()]).toEqual(['floors'])
      expect(() => live.line('walls')).toThrow(RangeError)
    })

    it('knows no line twice, and none that isn’t there', () => {
      const live = open()
      expect(() => live.addLine(floor)).toThrow(/already/)
      expect(() => live.setLine('ceiling', floor)).toThrow(/no line/)
      expect(() => live.removeLine('ceiling')).toThrow(/no line/)
    })
  })

  describe('when a room changes', () => {
    it('works out its lines, and those of the house that stand on it', () => {
      const live = open()
      live.setRoom('bedroom', { ...bedroom, shape: { kind: 'rectangle', lengthIn: 240, widthIn: 120 } })
      expect(live.line('floor').quantity).toBe(200)
      expect(live.line('walls').quantity).toBe(480)
      expect(live.line('all-floors').quantity).toBe(200)
    })

    it('leaves the lines of other rooms as they are', () => {
      const live = open({ rooms: [bedroom, buildRoomInput({ key: 'den' })], lines: [{ ...floor, roomKey: 'den' }] })
      live.setRoom('bedroom', { ...bedroom, ceiling: null })
      expect(live.line('floor').quantity).toBe(125)
    })

    it('follows one that is added', () => {
      const live = open()
      live.addRoom(buildRoomInput({ key: 'den' }))
      expect(live.line('all-floors').quantity).toBe(250)
    })

    it('gives a line whose room is taken away an error, until the room is back', () => {
      const live = open()
      live.removeRoom('bedroom')
      expect(live.line('floor').error).toMatchObject({ code: 'unknown-room' })
      expect(live.line('all-floors').error).toMatchObject({ code: 'no-measure', message: 'No rooms are keyed yet.' })
      expect(live.totals().directCents.likely).toBe(0)
      live.addRoom(bedroom)
      expect(live.line('floor').quantity).toBe(125)
      expect(live.errors()).toEqual([])
    })

    it('knows no room twice, and none that isn’t there', () => {
      const live = open()
      expect(() => live.addRoom(bedroom)).toThrow(/already/)
      expect(() => live.setRoom('den', bedroom)).toThrow(/no room/)
      expect(() => live.removeRoom('den')).toThrow(/no room/)
    })
  })

  it('follows the house', () => {
    const live = open({ lines: [buildLineInput({ quantity: 'footprint_area' })] })
    live.setHouse(buildHouseInput({ footprint: { kind: 'rectangle', lengthIn: 120, widthIn: 120 } }))
    expect(live.line('line').quantity).toBe(100)
    live.setHouse(buildHouseInput({ footprint: null }))
    expect(live.line('line').error).toMatchObject({ code: 'no-measure' })
  })

  it('follows the settings, and leaves the lines', () => {
    const live = open()
    live.setSettings(buildSettings({ permitsCents: 10_000 }))
    expect(live.totals()).toMatchObject({ permitsCents: samePrice(10_000), directCents: { likely: 183_000 } })
  })

  it('gives subtotals by room, system and trade that sum to the direct total', () => {
    const live = open()
    for (const by of ['room', 'system', 'trade'] as const) {
      const sum = [...live.subtotals(by).values()].reduce((cents, { amountCents }) => cents + amountCents.likely, 0)
      expect(sum).toBe(live.totals().directCents.likely)
    }
    expect(live.subtotals('room').get(null)?.amountCents.likely).toBe(37_500)
  })

  it('adds up own-hands hours', () => {
    const live = open({
      lines: [
        { ...floor, hoursPerUnit: 0.045 },
        { ...walls, hoursPerUnit: 1 },
      ],
    })
    expect(live.hours()).toBe(5.63)
  })

  it('holds thousands of lines and rooms', () => {
    const rooms = Array.from({ length: 300 }, (_, index) => buildRoomInput({ key: `room-${index}` }))
    const lines = Array.from({ length: 3000 }, (_, index) => ({ ...floor, key: `line-${index}`, roomKey: `room-${index % 300}` }))
    expect(open({ rooms, lines }).totals().directCents.likely).toBe(3000 * 37_500)
  })
})

describe('always', () => {
  const roomKeys = ['a', 'b', 'c', 'd']
  const lineKeys = ['1', '2', '3', '4', '5', '6']
  const formulas = [
    'floor_area',
    'wall_area * 1.1',
    'ceil(wall_area / 32) * 32',
    'sum_floor_area',
    'sum_rooms(wall_area)',
    'living_area',
    'roof_area',
    '50',
    'perimeter',
    'floor_area / doors',
    'nothing',
  ]

  const room: fc.Arbitrary<RoomInput> = fc
    .record({
      key: fc.constantFrom(...roomKeys),
      lengthIn: fc.integer({ min: 60, max: 400 }),
      widthIn: fc.integer({ min: 60, max: 400 }),
      hasCeiling: fc.boolean(),
      doors: fc.nat(3),
      use: fc.constantFrom('living', 'cellar'),
    })
    .map(({ key, lengthIn, widthIn, hasCeiling, doors, use }) =>
      buildRoomInput({
        key,
        use,
        shape: { kind: 'rectangle', lengthIn, widthIn },
        ceiling: hasCeiling ? { kind: 'flat', heightIn: 96 } : null,
        openings: doors === 0 ? [] : [buildOpening({ widthIn: 1, heightIn: 1, count: doors })],
      }),
    )
  const line: fc.Arbitrary<LineInput> = fc
    .record({
      key: fc.constantFrom(...lineKeys),
      roomKey: fc.option(fc.constantFrom(...roomKeys)),
      quantity: fc.constantFrom(...formulas),
      system: fc.constantFrom('floors', 'walls'),
      trade: fc.constantFrom('flooring', 'painting', 'tile'),
      basis: fc.constantFrom('own-hands' as const, 'hired' as const),
      wastePercent: fc.nat(20),
      packageSize: fc.option(fc.integer({ min: 1, max: 40 })),
      minimumChargeCents: fc.nat(100_000),
      hoursPerUnit: fc.nat(100).map((hundredths) => hundredths / 100),
      unitPriceE4: fc.option(fc.nat(200_000).map(samePrice), { freq: 9 }),
    })
    .map((own) => buildLineInput(own))
  const change = fc.oneof(
    fc.record({ kind: fc.constant('line' as const), line, after: fc.option(fc.constantFrom(...lineKeys)) }),
    fc.record({ kind: fc.constant('no-line' as const), key: fc.constantFrom(...lineKeys) }),
    fc.record({ kind: fc.constant('room' as const), room }),
    fc.record({ kind: fc.constant('no-room' as const), key: fc.constantFrom(...roomKeys) }),
    fc.record({ kind: fc.constant('house' as const), lengthIn: fc.integer({ min: 200, max: 700 }) }),
    fc.record({ kind: fc.constant('settings' as const), percent: fc.nat(40) }),
  )

  /** The estimate as plain data, changed as the live one is. */
  class PlainEstimate {
    input = buildEstimateInput()

    apply(step: typeof change extends fc.Arbitrary<infer T> ? T : never, live: LiveEstimate): void {
      const { rooms, lines } = this.input
      switch (step.kind) {
        case 'line': {
          const isThere = lines.some(({ key }) => key === step.line.key)
          const after = lines.some(({ key }) => key === step.after) ? step.after : null
          if (isThere) live.setLine(step.line.key, step.line)
          else live.addLine(step.line, after)
          const index = after === null ? lines.length : lines.findIndex(({ key }) => key === after) + 1
          const added = [...lines.slice(0, index), step.line, ...lines.slice(index)]
          this.input = { ...this.input, lines: isThere ? lines.map((old) => (old.key === step.line.key ? step.line : old)) : added }
          break
        }
        case 'no-line':
          if (!lines.some(({ key }) => key === step.key)) break
          live.removeLine(step.key)
          this.input = { ...this.input, lines: lines.filter(({ key }) => key !== step.key) }
          break
        case 'room': {
          const isThere = rooms.some(({ key }) => key === step.room.key)
          if (isThere) live.setRoom(step.room.key, step.room)
          else live.addRoom(step.room)
          this.input = {
            ...this.input,
            rooms: isThere ? rooms.map((old) => (old.key === step.room.key ? step.room : old)) : [...rooms, step.room],
          }
          break
        }
        case 'no-room':
          if (!rooms.some(({ key }) => key === step.key)) break
          live.removeRoom(step.key)
          this.input = { ...this.input, rooms: rooms.filter(({ key }) => key !== step.key) }
          break
        case 'house':
          this.input = {
            ...this.input,
            house: buildHouseInput({ footprint: { kind: 'rectangle', lengthIn: step.lengthIn, widthIn: 300 } }),
          }
          live.setHouse(this.input.house)
          break
        case 'settings':
          this.input = {
            ...this.input,
            settings: buildSettings({ overheadAndProfitPercent: step.percent, salesTax: { rule: 'materials', percent: step.percent / 4 } }),
          }
          live.setSettings(this.input.settings)
      }
    }
  }

  it('whatever was changed on the way, the figures are those of computing it afresh', () => {
    fc.assert(
      fc.property(fc.array(change, { maxLength: 60 }), (steps) => {
        const plain = new PlainEstimate()
        const live = openEstimate(plain.input)
        for (const step of steps) plain.apply(step, live)
        const afresh = openEstimate(plain.input)
        expect(live.results()).toEqual(afresh.results())
        expect(live.hours()).toBe(afresh.hours())
        for (const by of ['room', 'system', 'trade'] as const) {
          expect(new Map([...live.subtotals(by)].sort())).toEqual(new Map([...afresh.subtotals(by)].sort()))
        }
      }),
      { numRuns: 300 },
    )
  })

  it('working everything out again changes nothing', () => {
    fc.assert(
      fc.property(fc.array(change, { maxLength: 40 }), (steps) => {
        const plain = new PlainEstimate()
        const live = openEstimate(plain.input)
        for (const step of steps) plain.apply(step, live)
        const before = live.results()
        live.recalculate()
        expect(live.results()).toEqual(before)
      }),
    )
  })
})
