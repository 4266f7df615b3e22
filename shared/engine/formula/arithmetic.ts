import { STEP_MAX } from './formulaLimits.ts'

/*
 * The steps of a formula. Each gives NaN where it has no answer, and NaN runs through every step after it, so that nothing is lost on the way to the end,
 * where it is explained. That is why a comparison of NaN is NaN here, and NaN to the power of 0 as well.
 */

/** A binary fraction's noise: two figures this near are taken for one. */
const NEAR = 1e-9
const ZERO = 1e-12
const RELATIVE_NOISE = 9e-16

export function bounded(value: number): number {
  return value <= STEP_MAX && value >= -STEP_MAX ? value : NaN
}

export function divide(dividend: number, divisor: number): number {
  return isZero(divisor) ? NaN : bounded(dividend / divisor)
}

export function isZero(value: number): boolean {
  return value < ZERO && value > -ZERO
}

export function power(base: number, exponent: number): number {
  if (Number.isNaN(base) || (exponent < 0 && isZero(base))) return NaN
  return bounded(base ** exponent)
}

export function squareRoot(value: number): number {
  return value < 0 && value > -NEAR ? 0 : Math.sqrt(value)
}

/** The next whole number, 12.000000000001 → 12. */
export function roundUp(value: number): number {
  return Math.ceil(value - noiseOf(value))
}

/** The whole number before, 11.999999999999 → 12. */
export function roundDown(value: number): number {
  return Math.floor(value + noiseOf(value))
}

/** Half away from zero, to so many decimals. */
export function roundTo(value: number, decimals: number): number {
  const scale = 10 ** decimals
  const scaled = Math.abs(value) * scale
  const rounded = Math.floor(scaled + 0.5 + noiseOf(scaled)) / scale
  return value < 0 ? -rounded : rounded
}

/** 1 yes, 0 no. */
export function isBelow(left: number, right: number): number {
  return left <= right - NEAR ? 1 : unlessNaN(left, right, 0)
}

export function isEqual(left: number, right: number): number {
  return Math.abs(left - right) < NEAR ? 1 : unlessNaN(left, right, 0)
}

function unlessNaN(left: number, right: number, answer: number): number {
  return left === left && right === right ? answer : NaN
}

function noiseOf(value: number): number {
  return Math.max(5e-10, Math.abs(value) * RELATIVE_NOISE)
}
