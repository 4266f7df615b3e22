/** Whole dollars as a summary shows them, `$1,235`, half away from zero; with `cents` as a line does, `$1,234.50`. */
export function formatCents(cents: number, options: { cents?: boolean } = {}): string {
  const size = Math.abs(cents)
  if (options.cents) return `${sign(cents)}$${grouped(Math.floor(size / 100))}.${String(size % 100).padStart(2, '0')}`
  const dollars = Math.floor((size + 50) / 100)
  return `${dollars === 0 ? '' : sign(cents)}$${grouped(dollars)}`
}

/** A unit price with the decimals that it has, two at least: 24,000 → `$2.40`, 1,525 → `$0.1525`. */
export function formatUnitPrice(e4: number): string {
  const size = Math.abs(e4)
  const decimals = String(size % 10_000)
    .padStart(4, '0')
    .replace(/0{1,2}$/, '')
  return `${sign(e4)}$${grouped(Math.floor(size / 10_000))}.${decimals}`
}

function sign(amount: number): string {
  return amount < 0 ? '-' : ''
}

function grouped(whole: number): string {
  return String(whole).replace(/\B(?=(\d{3})+$)/g, ',')
}
