import { formatLength } from '../../../shared/engine/units/formatLength.ts'

/** A length as drawings give it: to the nearest sixteenth of an inch, because a wall at an angle has no end to its fraction. */
export function drawnLength(inches: number): string {
  return formatLength(Math.round(inches * 16) / 16)
}
