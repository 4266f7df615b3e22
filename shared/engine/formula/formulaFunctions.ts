/** Functions of a formula with how many arguments they take. `sum_rooms` stands apart: its argument is worked out in each room. */
export const FUNCTIONS = {
  min: { least: 1, most: 20 },
  max: { least: 1, most: 20 },
  abs: { least: 1, most: 1 },
  ceil: { least: 1, most: 1 },
  floor: { least: 1, most: 1 },
  round: { least: 1, most: 2 },
  sqrt: { least: 1, most: 1 },
} as const

export type FunctionName = keyof typeof FUNCTIONS

export const SUM_ROOMS = 'sum_rooms'
export const FUNCTION_NAMES: readonly string[] = [...Object.keys(FUNCTIONS), SUM_ROOMS]

export function isFunctionName(name: string): name is FunctionName {
  return Object.hasOwn(FUNCTIONS, name)
}
