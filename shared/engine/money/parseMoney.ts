import { LINE_MAX_CENTS, UNIT_PRICE_MAX_E4 } from '../../schemas/common.ts'

export type ParsedCents = { ok: true; cents: number } | { ok: false; message: string }
export type ParsedUnitPrice = { ok: true; e4: number } | { ok: false; message: string }

const QUOTED_MAX = 24

/** An amount as it is keyed, to whole cents: `1250`, `$1,250.5`, `1 250.50`. At most 2 decimals, not below zero, under a billion dollars. */
export function parseCents(text: string): ParsedCents {
  const read = readDollars(text, 2, '`1250` or `1250.50`')
  if ('message' in read) return { ok: false, message: read.message }
  if (read.scaled > LINE_MAX_CENTS) return { ok: false, message: `${quoted(text)} is over one billion dollars.` }
  return { ok: true, cents: read.scaled }
}

/** A unit price as it is keyed, to ten-thousandths of a dollar: `2.4`, `$0.1525`. At most 4 decimals, not below zero, at most a million dollars. */
export function parseUnitPriceE4(text: string): ParsedUnitPrice {
  const read = readDollars(text, 4, '`2.40` or `0.1525`')
  if ('message' in read) return { ok: false, message: read.message }
  if (read.scaled > UNIT_PRICE_MAX_E4) return { ok: false, message: `${quoted(text)} is over one million dollars for one unit.` }
  return { ok: true, e4: read.scaled }
}

function readDollars(text: string, decimals: number, forms: string): { scaled: number } | { message: string } {
  const bare = text.trim().replace(/^\$ ?/, '')
  if (bare === '') return { message: `Nothing is keyed. Write ${forms}.` }
  if (/^[-−–(]/.test(bare) || /^-/.test(text.trim())) return { message: `${quoted(text)} is below zero. Write an amount of zero or more.` }
  const plain = withoutGroups(bare)
  if (plain === null) return { message: `${quoted(text)} is not an amount of dollars. Write ${forms}.` }
  const [whole = '', fraction = ''] = plain.split('.')
  if (fraction.length > decimals) return { message: `${quoted(text)} has ${fraction.length} decimals; at most ${decimals} are kept here.` }
  return { scaled: Number(`${whole}${fraction.padEnd(decimals, '0')}`) }
}

/** `1,250.50`, `1 250.50`, `1250.5` → plain digits with a point; `null` for anything else. A comma parts thousands only. */
function withoutGroups(bare: string): string | null {
  const isGrouped = /^\d{1,3}(?:[, \u00a0\u202f]\d{3})+(?:\.\d*)?$/.test(bare)
  const plain = isGrouped ? bare.replace(/[, \u00a0\u202f]/g, '') : bare
  return /^(?:\d+(?:\.\d*)?|\.\d+)$/.test(plain) ? plain : null
}

function quoted(text: string): string {
  const shown = text.trim()
  return `\`${shown.length > QUOTED_MAX ? `${shown.slice(0, QUOTED_MAX)}…` : shown}\``
}
