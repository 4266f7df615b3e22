import { HOUSE_SYSTEMS } from '../../../shared/catalogue/houseSystems.ts'
import { TRADES } from '../../../shared/catalogue/trades.ts'
import type { PriceItem } from '../../../shared/schemas/priceItem.ts'

export interface ItemFilter {
  search: string
  /** `null`: every system. */
  system: string | null
}

const systemTitles = new Map<string, string>(HOUSE_SYSTEMS.map(({ key, title }) => [key, title]))
const tradeTitles = new Map<string, string>(TRADES.map(({ key, title }) => [key, title]))
/** The words of an item are taken apart once; an edit makes a new object and so new words. */
const wordsByItem = new WeakMap<PriceItem, string>()

/** Tells which items hold every word that was typed, each by its beginning, in any order. */
export function itemMatcher({ search, system }: ItemFilter): (item: PriceItem) => boolean {
  const wanted = wordsOf(search).map((word) => ` ${word}`)
  return (item) => (system === null || item.system === system) && wanted.every((word) => itemWords(item).includes(word))
}

function itemWords(item: PriceItem): string {
  const known = wordsByItem.get(item)
  if (known !== undefined) return known
  const { name, key, system, trade, note, uniformat, unit, packageName } = item
  const text = [name, key, systemTitles.get(system), tradeTitles.get(trade), note, uniformat, unit, packageName].join(' ')
  const words = ` ${wordsOf(text).join(' ')}`
  wordsByItem.set(item, words)
  return words
}

function wordsOf(text: string): string[] {
  return text
    .normalize('NFKD')
    .replace(/\p{Mark}/gu, '')
    .toLowerCase()
    .split(/[^\p{Letter}\p{Number}]+/u)
    .filter((word) => word !== '')
}
