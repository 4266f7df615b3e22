import type { Browser, BrowserContext } from 'playwright-core'
import type { BenchPage } from './browser.ts'
import { benchFigure, type BenchFigure } from './figure.ts'
import { median } from './median.ts'
import { watchPaint } from './pageWatch.ts'
import { serveEstimateTable } from './plainTable.ts'

const ROUNDS = 7
const WARM_UPS = 1
/** What has to be there and to show a figure. */
const APP = ['.ag-row [col-id="amount"]', '.totals .total']
const TABLE = ['td.amount', '.total']

/** From the start of the navigation until a line with its amount and the total are painted, nothing cached; the floor is a plain table of the same lines. */
export async function* paintFigures(browser: Browser, page: BenchPage): AsyncGenerator<BenchFigure> {
  const table = await await serveEstimateTable(page.lineCount)
  try {
    const ours: number[] = []
    const plain: number[] = []
    for (let round = -WARM_UPS; round < ROUNDS; round += 1) {
      const [paint, floor] = [
        await paintMs(await page.newContext(), page.url, APP),
        await paintMs(await browser.newContext(), table.url, TABLE),
      ]
      if (round < 0) continue
      ours.push(paint)
      plain.push(floor)
    }
    yield benchFigure({
      name: `browser: first usable paint of the estimate page with ${page.lineCount.toLocaleString('en-US')} lines`,
      value: median(ours),
      unit: 'ms',
      floor: median(plain),
      note: 'Nothing is cached, and the floor was made beforehand. Script and layout are about a fifth of it; the rest is fetching and compiling the scripts of the page and of its grid, and painting.',
    })
  } finally {
    await table.stop()
  }
}

async function paintMs(context: BrowserContext, url: string, selectors: readonly string[]): Promise<number> {
  const page = await context.newPage()
  await watchPaint(page, selectors)
  await page.goto(url, { waitUntil: 'commit' })
  const ms = await page.evaluate(() => window.benchPaint)
  await context.close()
  return ms
}
