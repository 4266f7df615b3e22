import BetterSqlite3 from 'better-sqlite3'
import { priceItems } from '../../seed/priceBook/priceItems.ts'
import { searchWords } from '../../server/features/price-book/searchWords.ts'
import { createItemSearch } from '../../src/composables/itemSearch.ts'
import { benchFigure, type BenchFigure } from './figure.ts'
import { mediansInTurn } from './median.ts'

const BEST = 30
const TYPED = ['vinyl plank', 'paint wall', 'drain line', 'window double', 'outlet kitchen']
/** The questions as one types them, letter by letter. */
const QUESTIONS = TYPED.flatMap((text) => Array.from({ length: text.length }, (_, index) => text.slice(0, index + 1)))
const MICROSECONDS_PER_MS = 1000

/** The price book searched as one types: the page's own search, SQLite's full-text index over the same items, and a bare look through their texts. */
export function* searchBench(): Iterable<BenchFigure> {
  const search = createItemSearch(priceItems)
  const texts = priceItems.map(({ name, key, trade, system }) => `${name} ${key} ${trade} ${system}`.toLowerCase())
  const match = fullTextSearch(texts)
  const times = mediansInTurn(
    {
      ours: () => QUESTIONS.map((question) => search(question, { limit: BEST })),
      fullText: () => QUESTIONS.map(match),
      bare: () => QUESTIONS.map((question) => look(texts, question)),
    },
    { rounds: 101, warmUps: 20 },
  )
  const perQuestion = (ms: number) => (ms * MICROSECONDS_PER_MS) / QUESTIONS.length
  yield benchFigure({
    name: `search: the ${priceItems.length} items of the price book, one letter more`,
    value: perQuestion(times.ours),
    unit: 'µs',
    peer: { name: 'FTS5, ranked', value: perQuestion(times.fullText) },
    floor: perQuestion(times.bare),
  })
}

function fullTextSearch(texts: readonly string[]): (question: string) => unknown[] {
  const db = new BetterSqlite3(':memory:')
  db.exec("create virtual table items using fts5(words, prefix = '1 2 3')")
  const insert = db.prepare('insert into items (words) values (?)')
  for (const text of texts) insert.run(text)
  const query = db.prepare('select rowid from items where items match ? order by rank limit ?')
  return (question) =>
    query.all(
      searchWords(question)
        .map((word) => `"${word}"*`)
        .join(' '),
      BEST,
    )
}

function look(texts: readonly string[], question: string): string[] {
  const words = searchWords(question)
  return texts.filter((text) => words.every((word) => text.includes(word))).slice(0, BEST)
}
