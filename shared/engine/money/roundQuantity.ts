/** Snaps away what a binary fraction adds or takes: 1e-9 of a unit, or a few units of the last place where those are more. */
const NOISE = 5e-10
const RELATIVE_NOISE = 9e-16

/**
 * A quantity in hundredths, half up (quantities are never below zero), so that 1.005 → 101 although its binary form is a hair less.
 * Noise of a billionth of a unit is taken for the decimal that was meant.
 */
export function hundredthsOf(quantity: number): number {
  return Math.floor(quantity * 100 + 0.5 + noiseOf(quantity) * 100)
}

/** Whole packages that hold a quantity: 225.00000000000003 in boxes of 22.5 → 10, 225.1 → 11. */
export function wholePackages(quantity: number, packageSize: number): number {
  const packages = quantity / packageSize
  return Math.ceil(packages - Math.max(noiseOf(packages), NOISE / packageSize))
}

/** A measure as it is reported: to a billionth. */
export function toBillionth(value: number): number {
  const rounded = Math.round(value * 1e9) / 1e9
  return Number.isFinite(rounded) ? rounded : value
}

function noiseOf(value: number): number {
  return Math.max(NOISE, value * RELATIVE_NOISE)
}
