import { checkShape } from '../geometry/checkShape.ts'
import { planFigures } from '../geometry/planFigures.ts'
import type { HouseInput } from '../estimateInput.ts'
import { OWN_HOUSE_MEASURES, type OwnHouseMeasureName } from './houseMeasureList.ts'
import { had, notHad, type MeasureValue } from './measure.ts'
import { roofMeasures } from './roofMeasures.ts'

type OwnMeasures = Record<OwnHouseMeasureName, MeasureValue>

const NOT_KEYED = {
  attic_area: notHad('The attic area is not keyed with the house. Write the quantity as a number of square feet.'),
  crawl_area: notHad('The crawl space area is not keyed with the house. Write the quantity as a number of square feet.'),
  fixtures: notHad('Plumbing fixtures are not counted with the house. Write the quantity as a number.'),
  drainage_fixture_units: notHad('Drainage fixture units are not counted with the house. Write the quantity as a number.'),
}

/** The measures that come from the house's own fields. Outside walls are the outside perimeter × wall height × storeys, with the gables. */
export function ownHouseMeasures(house: HouseInput): OwnMeasures {
  const { footprint } = house
  const [fault] = footprint === null ? [] : checkShape(footprint)
  if (fault) return allNotHad(`The footprint of the house is no plan: ${fault.message}`)
  const plan = footprint && planFigures(footprint)
  const noFootprint = notHad('No footprint is keyed for the house.')
  const roof = roofMeasures(house)
  return {
    footprint_area: plan ? had(plan.areaSqIn / 144) : noFootprint,
    outside_perimeter: plan ? had(plan.perimeterIn / 12) : noFootprint,
    ...roof,
    outside_wall_area: plan ? outsideWalls(house, plan.perimeterIn, roof.gable_area) : noFootprint,
    ...NOT_KEYED,
  }
}

function outsideWalls({ wallHeightIn, storeys }: HouseInput, perimeterIn: number, gables: MeasureValue): MeasureValue {
  if (wallHeightIn === null) return notHad('No outside wall height is keyed for the house.')
  return gables.ok ? had((perimeterIn * wallHeightIn * storeys) / 144 + gables.value) : gables
}

function allNotHad(message: string): OwnMeasures {
  const measures = Object.fromEntries(OWN_HOUSE_MEASURES.map(({ name }) => [name, notHad(message)])) as OwnMeasures
  return { ...measures, ...NOT_KEYED }
}
