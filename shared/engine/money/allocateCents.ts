/**
 * Splits whole cents over parts by weight so that the parts sum to the whole: each gets its share rounded down, and what is left goes, a cent each, to the largest
 * fractions (largest remainder). 100.00 over three equal parts → 33.34, 33.33, 33.33. Weights are whole, not negative, and not all zero.
 */
export function allocateCents(cents: number, weights: readonly number[]): number[] {
  const weightSum = weights.reduce((sum, weight) => sum + BigInt(weight), 0n)
  if (weightSum === 0n) throw new RangeError('Cents are split by weights of which at least one is more than zero.')
  const shares = weights.map((weight, index) => {
    const product = BigInt(cents) * BigInt(weight)
    return { index, share: product / weightSum, remainder: product % weightSum }
  })
  const left = cents - shares.reduce((sum, { share }) => sum + Number(share), 0)
  const byRemainder = [...shares].sort((a, b) => Number(b.remainder - a.remainder) || a.index - b.index)
  const getsOneMore = new Set(byRemainder.slice(0, left).map(({ index }) => index))
  return shares.map(({ index, share }) => Number(share) + (getsOneMore.has(index) ? 1 : 0))
}
