import { printFigure, type BenchFigure } from './figure.ts'

type Bench = () => AsyncIterable<BenchFigure> | Iterable<BenchFigure> | Promise<Iterable<BenchFigure>>

/** The benches, a file each. They run one after the other, so that none is in another's way. */
const BENCHES: Record<string, () => Promise<Bench>> = {
  browser: async () => (await import('./browser.ts')).browserBench,
  engine: async () => (await import('./engine.ts')).engineBench,
  password: async () => (await import('./password.ts')).passwordBench,
  search: async () => (await import('./search.ts')).searchBench,
  server: async () => (await import('./server.ts')).serverBench,
  start: async () => (await import('./start.ts')).startBench,
  workbook: async () => (await import('./workbook.ts')).workbookBench,
}

/** `npm run bench` prints all figures, one JSON line each; `npm run bench -- engine` those of the benches that are named. */
const named = process.argv.slice(2)
const unknown = named.filter((name) => !Object.hasOwn(BENCHES, name))
if (unknown.length > 0) {
  console.error(`There is no bench called ${unknown.join(', ')}. There are ${Object.keys(BENCHES).join(', ')}.`)
  process.exitCode = 2
} else {
  for (const [name, load] of Object.entries(BENCHES)) {
    const isWanted = named.length === 0 || named.includes(name)
    if (isWanted) await printAll(await load())
  }
}

async function printAll(bench: Bench): Promise<void> {
  for await (const figure of await bench()) printFigure(figure)
}
