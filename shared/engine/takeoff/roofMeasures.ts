import { eaveOutline, type EaveOutline } from '../geometry/eaveOutline.ts'
import { slopeFactor } from '../geometry/slopeFactor.ts'
import type { RoofGroup } from '../../schemas/house.ts'
import type { Shape } from '../../schemas/room.ts'
import type { HouseInput } from '../estimateInput.ts'
import { had, notHad, type MeasureValue } from './measure.ts'
import { roofShares } from './roofShares.ts'

const SQ_IN_PER_SQ_FT = 144
const SQ_IN_PER_SQUARE = 14_400

export interface RoofMeasures {
  roof_area: MeasureValue
  roof_squares: MeasureValue
  ridge_length: MeasureValue
  eave_length: MeasureValue
  gable_area: MeasureValue
}

/**
 * Roof of a house: the footprint grown by the overhang all round, each group's share of it × √(1 + (rise/12)²).
 * 42' × 28' with 12" and 6 in 12 → 1,320 sq ft of plan, 1,475.80 sq ft of roof, 14.76 squares.
 *
 * Ridge, eaves and gables are those of one roof: a gable's ridge runs along the longer side, from rake to rake, with eaves along both of its sides; a hip's ridge is the longer side
 * less the shorter, with eaves all round; a shed rises across the shorter side, with one eave and no ridge; a flat roof has eaves all round. Gables are wall above the wall height.
 */
export function roofMeasures({ footprint, overhangIn, roof }: HouseInput): RoofMeasures {
  if (footprint === null) return allNotHad('No footprint is keyed for the house.')
  const [group] = roof
  if (group === undefined) return allNotHad('No roof is keyed for the house.')
  const gables = gableArea(footprint, group, roof.length)
  if (overhangIn === null)
    return { ...allNotHad('No roof overhang is keyed for the house. Key 0 where there is none.'), gable_area: gables }
  const eaves = eaveOutline(footprint, overhangIn)
  if (eaves === null) return { ...allNotHad(NOTCH_CLOSED), gable_area: gables }
  return { ...slopedArea(eaves.areaSqIn, roof), ...ridgeAndEaves(footprint, overhangIn, group, roof.length, eaves), gable_area: gables }
}

const NOTCH_CLOSED = 'The overhang closes a notch in the footprint. Key a smaller overhang, or a footprint without the notch.'

function allNotHad(message: string): RoofMeasures {
  const value = notHad(message)
  return { roof_area: value, roof_squares: value, ridge_length: value, eave_length: value, gable_area: value }
}

function slopedArea(planSqIn: number, roof: readonly RoofGroup[]): Pick<RoofMeasures, 'roof_area' | 'roof_squares'> {
  const shares = roofShares(roof)
  if (shares === null) {
    const words = notHad('The shares of the roof groups do not come to 100 percent.')
    return { roof_area: words, roof_squares: words }
  }
  const areaSqIn = roof.reduce((sum, { rise }, index) => sum + planSqIn * (shares[index] ?? 0) * slopeFactor(rise, 12), 0)
  return { roof_area: had(areaSqIn / SQ_IN_PER_SQ_FT), roof_squares: had(areaSqIn / SQ_IN_PER_SQUARE) }
}

function ridgeAndEaves(
  footprint: Shape,
  overhangIn: number,
  { kind }: RoofGroup,
  groupCount: number,
  eaves: EaveOutline,
): Pick<RoofMeasures, 'ridge_length' | 'eave_length'> {
  const allRound = had(eaves.perimeterIn / 12)
  if (groupCount > 1)
    return { ridge_length: ofSeveralGroups('Ridge length', 'lineal feet'), eave_length: ofSeveralGroups('Eave length', 'lineal feet') }
  if (kind === 'flat') return { ridge_length: had(0), eave_length: allRound }
  if (footprint.kind !== 'rectangle') {
    const eaveLength = kind === 'hip' ? allRound : overNoRectangle('Eave length', kind, 'lineal feet')
    return { ridge_length: kind === 'shed' ? had(0) : overNoRectangle('Ridge length', kind, 'lineal feet'), eave_length: eaveLength }
  }
  const { longIn, shortIn } = sides(footprint)
  const rakeToRakeIn = longIn + 2 * overhangIn
  if (kind === 'hip') return { ridge_length: had((longIn - shortIn) / 12), eave_length: allRound }
  if (kind === 'shed') return { ridge_length: had(0), eave_length: had(rakeToRakeIn / 12) }
  return { ridge_length: had(rakeToRakeIn / 12), eave_length: had((2 * rakeToRakeIn) / 12) }
}

function gableArea(footprint: Shape, { kind, rise }: RoofGroup, groupCount: number): MeasureValue {
  if (groupCount > 1) return ofSeveralGroups('Gable area', 'square feet')
  if (kind === 'flat' || kind === 'hip') return had(0)
  if (footprint.kind !== 'rectangle') return overNoRectangle('Gable area', kind, 'square feet')
  const { longIn, shortIn } = sides(footprint)
  const sqIn = kind === 'gable' ? gableSqIn(shortIn, rise) : shedSqIn(longIn, shortIn, rise)
  return had(sqIn / SQ_IN_PER_SQ_FT)
}

function sides({ lengthIn, widthIn }: { lengthIn: number; widthIn: number }): { longIn: number; shortIn: number } {
  return { longIn: Math.max(lengthIn, widthIn), shortIn: Math.min(lengthIn, widthIn) }
}

/** Two triangles, each half of span × rise. Span 28', 6 in 12: rise 7', 98 sq ft each, 196 both. */
function gableSqIn(spanIn: number, rise: number): number {
  return (spanIn * ((spanIn / 2) * rise)) / 12
}

/** Two triangles under the slope and the strip of wall along the high side. */
function shedSqIn(longIn: number, spanIn: number, rise: number): number {
  const riseIn = (spanIn * rise) / 12
  return spanIn * riseIn + longIn * riseIn
}

function ofSeveralGroups(title: string, unit: string): MeasureValue {
  return notHad(`${title} is not worked out for a roof of several groups. Write the quantity as a number of ${unit}.`)
}

function overNoRectangle(title: string, kind: string, unit: string): MeasureValue {
  return notHad(
    `${title} is not worked out for a ${kind} roof over a footprint that is no rectangle. Write the quantity as a number of ${unit}.`,
  )
}
