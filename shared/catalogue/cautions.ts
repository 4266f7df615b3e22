import { HAZARD_CAUTIONS } from './hazardCautions.ts'
import { WORK_CAUTIONS } from './workCautions.ts'
import type { Caution } from './caution.ts'

export type { Caution } from './caution.ts'

export const CAUTIONS: readonly Caution[] = [...HAZARD_CAUTIONS, ...WORK_CAUTIONS]

/** Said on every document that leaves the firm. */
export const documentNotices: readonly string[] = [
  'An estimate is not an inspection, an appraisal or an offer of credit. It is an opinion of cost from what could be seen on the day, at the prices of the price book it names.',
  'What is behind walls, under floors and below ground was not seen. Where something could not be seen, the estimate says so, and an inspection or a test by a licensed person comes before the work.',
  'Leave suspect materials undisturbed until a laboratory has tested them. Removal is the work of a licensed firm.',
  'Where a code is named, it is the model code, for comparison alone. The local code and the building official decide. Permits, licensed trades and utility marking are the owner’s duty and the contractor’s.',
  'Unless it says otherwise, a price’s low and high are what one in ten pays less than and one in ten pays more than. A total’s low and high add all of them up, so most jobs end well inside. A contractor’s bid on the same scope replaces the figures here.',
]

export interface CautionQuestion {
  /** `null`: not known. */
  yearBuilt: number | null
  /** House systems that the estimate has lines for. */
  systems: readonly string[]
}

/**
 * The cautions that a house and its lines bring up, in the order of the catalogue.
 * Where a caution hangs on the year built and the year is not known, it applies and says that the year is not known.
 */
export function cautionsFor({ yearBuilt, systems }: CautionQuestion): Caution[] {
  const systemsOfLines = new Set<string>(systems)
  return CAUTIONS.filter((caution) => {
    const isBroughtUp = caution.always === true || caution.systems.some((system) => systemsOfLines.has(system))
    return isBroughtUp && isOfAge(caution, yearBuilt)
  }).map((caution) => (yearBuilt === null && caution.appliesBeforeYear !== undefined ? withYearUnknown(caution) : caution))
}

function isOfAge({ appliesBeforeYear, appliesFromYear }: Caution, yearBuilt: number | null): boolean {
  if (yearBuilt === null) return appliesFromYear === undefined
  const isOldEnough = appliesBeforeYear === undefined || yearBuilt < appliesBeforeYear
  const isNewEnough = appliesFromYear === undefined || yearBuilt >= appliesFromYear
  return isOldEnough && isNewEnough
}

function withYearUnknown(caution: Caution): Caution {
  return { ...caution, text: `The year built is not known, so this is taken to apply. ${caution.text}` }
}
