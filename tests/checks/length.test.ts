import { describe, expect, it } from 'vitest'
import { parseLength, roomMeasures } from '../../shared/engine/index.ts'
import { buildRoomInput } from '../support/buildEngineInput.ts'

function inches(text: string): number {
  const parsed = parseLength(text)
  if (!parsed.ok) throw new Error(parsed.message)
  return parsed.inches
}

// NIST Special Publication 811 (2008), appendix B: 1 in = 25.4 mm and 1 ft = 0.3048 m exactly; the areas and volumes follow.
describe('conversions of NIST SP 811', () => {
  it('1 in = 25.4 mm, 1 ft = 0.3048 m, both exactly', () => {
    expect(inches('25.4 mm')).toBe(1)
    expect(inches('0.3048 m')).toBe(12)
    expect(inches('30.48 cm')).toBe(12)
  })

  it('1 sq ft = 0.092 903 04 m²', () => {
    expect(squareFeet('3.048 m', '3.048 m') * 0.09290304).toBeCloseTo(3.048 * 3.048, 9)
  })

  it('1 roofing square = 100 sq ft = 9.290 304 m²', () => {
    expect(squareFeet('30.48 m', '0.3048 m')).toBe(100)
    expect(30.48 * 0.3048).toBeCloseTo(9.290304, 9)
  })

  it('1 cu yd = 0.764 554 857 984 m³', () => {
    const yard = buildRoomInput({
      shape: { kind: 'rectangle', lengthIn: inches('0.9144 m'), widthIn: inches('0.9144 m') },
      ceiling: { kind: 'flat', heightIn: inches('0.9144 m') },
    })
    const volume = roomMeasures(yard).volume
    expect(volume).toEqual({ ok: true, value: 27 })
    expect(0.9144 ** 3).toBeCloseTo(0.764554857984, 12)
  })
})

function squareFeet(length: string, width: string): number {
  const room = buildRoomInput({ shape: { kind: 'rectangle', lengthIn: inches(length), widthIn: inches(width) } })
  const area = roomMeasures(room).floor_area
  return area?.ok ? area.value : NaN
}
