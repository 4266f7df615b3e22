import fc from 'fast-check'
import { HyperFormula } from 'hyperformula'
import { afterAll, describe, expect, it } from 'vitest'
import { houseMeasures, roomMeasures } from '../../shared/engine/index.ts'
import { compileFormula } from '../../shared/engine/formula/compileFormula.ts'
import { mathjsParse } from '../../shared/engine/formula/mathjsParse.ts'
import { parseFormula } from '../../shared/engine/formula/parseFormula.ts'
import { HOUSE_MEASURES } from '../../shared/engine/takeoff/houseMeasureList.ts'
import { measureRoom } from '../../shared/engine/takeoff/measureRoom.ts'
import { ROOM_MEASURE_COUNT, ROOM_MEASURES } from '../../shared/engine/takeoff/roomMeasureList.ts'
import { houseMeasureName, roomMeasureName } from '../../shared/engine/workbook/measureNames.ts'
import { spreadsheetFormula } from '../../shared/engine/workbook/spreadsheetFormula.ts'
import { buildHouse, buildRoom } from '../support/buildWorkbookEstimate.ts'

const rooms = [
  buildRoom({ id: 'bed-1' }),
  buildRoom({
    id: 'kitchen',
    name: 'Kitchen',
    use: 'kitchen',
    shape: { kind: 'ell', lengthIn: 171.25, widthIn: 143.5, cutLengthIn: 48, cutWidthIn: 36.75 },
    ceiling: { kind: 'sloped', lowIn: 84, highIn: 121.5 },
  }),
].map(({ id, ...room }) => ({ ...room, key: id }))
const KITCHEN = 2

function parsed(text: string) {
  return parseFormula(text, 'room', mathjsParse)
}
/** The formula of a line in the kitchen. */
function translated(text: string): string {
  const namesOf = (number: number) => (measure: string) => roomMeasureName(number, measure)
  return spreadsheetFormula(parsed(text), { ofRoom: namesOf(KITCHEN), ofHouse: houseMeasureName, rooms: [namesOf(1), namesOf(KITCHEN)] })
}

describe('spreadsheetFormula', () => {
  it.each([
    ['floor_area', 'room_2_floor_area'],
    ['wall_area * 2 + 4', '((room_2_wall_area*2)+4)'],
    ['footprint_area / 100', '(house_footprint_area/100)'],
    ['ceil(wall_area / 32)', 'ROUNDUP(ROUND((room_2_wall_area/32),9),0)'],
    ['floor(perimeter / 8)', 'ROUNDDOWN(ROUND((room_2_perimeter/8),9),0)'],
    ['round(volume / 27, 1)', 'ROUND(ROUND((room_2_volume/27),10),1)'],
    ['max(floor_area, 40)', 'MAX(room_2_floor_area,40)'],
    ['windows > 2 ? 3 : windows', 'IF(room_2_windows>=2+0.000000001,3,room_2_windows)'],
    ['sum_rooms(floor_area)', 'house_sum_floor_area'],
    ['sum_rooms(wall_area * 2)', '((room_1_wall_area*2)+(room_2_wall_area*2))'],
    ['0.0000001 * floor_area', '((1*10^(-7))*room_2_floor_area)'],
  ])('writes %s as %s', (text, formula) => {
    expect(translated(text)).toBe(formula)
  })

  it('brackets what spreadsheets read in another order', () => {
    expect(translated('-2^2 + floor_area')).toBe('((-(2^2))+room_2_floor_area)')
    expect(translated('2^3^2')).toBe('(2^(3^2))')
  })

  it('rounds a difference up by its sign', () => {
    expect(translated('ceil(perimeter - 60)')).toBe(
      'IF((room_2_perimeter-60)<0,ROUNDDOWN(ROUND((room_2_perimeter-60),9),0),ROUNDUP(ROUND((room_2_perimeter-60),9),0))',
    )
  })
})

describe('a translated formula', () => {
  const roomValues = new Float64Array(rooms.length * ROOM_MEASURE_COUNT)
  const roomRows = rooms.map((_, index) => index * ROOM_MEASURE_COUNT)
  rooms.forEach((room, index) => measureRoom(room, roomValues, roomRows[index]))
  const ofHouse = houseMeasures(buildHouse(), rooms)
  const houseValues = Float64Array.from(HOUSE_MEASURES, ({ name }) => (ofHouse[name]?.ok ? ofHouse[name].value : NaN))
  const columns = { roomValues, roomRows, houseValues, roomsStamp: 0 }
  const names = [
    ...rooms.flatMap((room, index) =>
      Object.entries(roomMeasures(room)).map(([name, value]) => [roomMeasureName(index + 1, name), value] as const),
    ),
    ...Object.entries(ofHouse).map(([name, value]) => [houseMeasureName(name), value] as const),
  ]
  const sheet = HyperFormula.buildFromArray(
    [[null]],
    { licenseKey: 'gpl-v3', smartRounding: false },
    names.flatMap(([name, measure]) => (measure.ok ? [{ name, expression: measure.value }] : [])),
  )
  afterAll(() => sheet.destroy())

  function inSpreadsheet(text: string): unknown {
    sheet.setCellContents({ sheet: 0, row: 0, col: 0 }, `=${translated(text)}`)
    return sheet.getCellValue({ sheet: 0, row: 0, col: 0 })
  }
  function inEngine(text: string): number {
    return compileFormula(parsed(text), columns)(roomRows[KITCHEN - 1] ?? 0)
  }

  const leaf = fc.oneof(
    fc.constantFrom(...ROOM_MEASURES.map(({ name }) => name), 'footprint_area', 'roof_squares', 'living_area', 'sum_wall_area'),
    fc.integer({ min: 0, max: 40 }).map(String),
    fc.integer({ min: 1, max: 99 }).map((digits) => (digits / 10).toFixed(1)),
  )
  const formula = fc.letrec<{ node: string }>((tie) => ({
    node: fc.oneof(
      { depthSize: 'small', withCrossShrink: true },
      leaf,
      fc
        .tuple(tie('node'), fc.constantFrom('+', '-', '*', '/'), tie('node'))
        .map(([left, operator, right]) => `(${left} ${operator} ${right})`),
      tie('node').map((argument) => `(-${argument})`),
      fc.tuple(tie('node'), fc.constantFrom('2', '-1', '3')).map(([base, exponent]) => `(${base}^${exponent})`),
      fc.tuple(fc.constantFrom('ceil', 'floor', 'round', 'abs'), tie('node')).map(([name, argument]) => `${name}(${argument})`),
      tie('node').map((argument) => `round(${argument}, 2)`),
      tie('node').map((argument) => `sqrt(abs(${argument}))`),
      fc.tuple(fc.constantFrom('min', 'max'), tie('node'), tie('node')).map(([name, left, right]) => `${name}(${left}, ${right})`),
      fc
        .tuple(tie('node'), fc.constantFrom('<', '<=', '>', '>=', '==', '!='), tie('node'), tie('node'))
        .map(([left, operator, right, other]) => `(${left} ${operator} ${right} ? ${other} : ${left})`),
      fc.constantFrom('floor_area', 'wall_area / 32', 'ceil(perimeter / 8)', 'windows').map((argument) => `sum_rooms(${argument})`),
    ),
  })).node

  it('always comes to the engine’s figure', { timeout: 60_000 }, () => {
    let compared = 0
    fc.assert(
      fc.property(formula, (text) => {
        if (text.length > 400) return
        const expected = inEngine(text)
        // Where the engine has no answer the line is left out of the workbook's sums.
        if (!Number.isFinite(expected) || Math.abs(expected) > 1e9) return
        const value = inSpreadsheet(text)
        compared += 1
        expect(typeof value, translated(text)).toBe('number')
        expect(Math.abs(Number(value) - expected), `${text} → ${translated(text)}`).toBeLessThan(1e-6 * Math.max(1, Math.abs(expected)))
      }),
      { numRuns: 1500, seed: 20261201 },
    )
    expect(compared).toBeGreaterThan(700)
  })
})
