/**
 * Shares as whole percents that sum to 100 wherever the shares do: each is rounded down, and the points left over go to the greatest remainders.
 * [15.5, 84.5] → [16, 84], not 16 and 85.
 */
export function wholePercents(shares: readonly number[]): number[] {
  const whole = shares.map(Math.floor)
  const left = Math.round(shares.reduce((sum, share) => sum + share, 0)) - whole.reduce((sum, share) => sum + share, 0)
  const byRemainder = shares.map((share, index) => ({ index, remainder: share % 1 })).sort((one, other) => other.remainder - one.remainder)
  for (const { index } of byRemainder.slice(0, left)) whole[index] = (whole[index] ?? 0) + 1
  return whole
}
