import type { Browser, Page } from 'playwright-core'
import type { BenchPage } from './browser.ts'
import { benchFigure, type BenchFigure } from './figure.ts'
import { median } from './median.ts'
import { watchKeys, type KeySample } from './pageWatch.ts'

const FRAME_MS = 16
const WARM_UPS = 16
const KEYS = 80
/** A quantity grows to five digits and shrinks again: every key makes another total. */
const CYCLE = ['2', '3', '4', '5', 'Backspace', 'Backspace', 'Backspace', 'Backspace']

/** A digit keyed into a quantity until the totals on the page have followed, and until the frame that shows them; the floor is a field that writes a sum beside itself. */
export async function* keystrokeFigures(browser: Browser, { lineCount, url, newContext }: BenchPage): AsyncGenerator<BenchFigure> {
  const context = await newContext()
  const page = await context.newPage()
  await page.goto(url)
  await page.locator('.ag-row [col-id="quantity"]').first().dblclick()
  await page.keyboard.press('ControlOrMeta+A')
  const ours = await keySamples(page, '.totals')
  await context.close()

  const bare = await browser.newPage()
  await bare.setContent('<input autofocus><p class="totals"></p>')
  await bare.evaluate(() => {
    const total = document.querySelector('.totals')!
    document.querySelector('input')!.addEventListener('input', (event) => {
      total.textContent = `$${(Number((event.target as HTMLInputElement).value) * 3.25).toLocaleString('en-US')}`
    })
  })
  await bare.locator('input').focus()
  const floor = await keySamples(bare, '.totals')
  await bare.close()

  const lines = `${lineCount.toLocaleString('en-US')} lines`
  const script = median(ours.map(({ scriptMs }) => scriptMs))
  yield benchFigure({
    name: `browser: a key in a quantity to the changed total, script, ${lines}`,
    value: script,
    unit: 'ms',
    floor: median(floor.map(({ scriptMs }) => scriptMs)),
    ...(script > FRAME_MS && {
      note: `Over one frame of ${FRAME_MS} ms: the cells of the line and the totals are drawn anew with each key.`,
    }),
  })
  yield benchFigure({
    name: `browser: a key in a quantity to the painted total, ${lines}`,
    value: median(ours.map(({ paintedMs }) => paintedMs)),
    unit: 'ms',
    floor: median(floor.map(({ paintedMs }) => paintedMs)),
    note: `From the key's own time; waiting for the next of 60 frames a second is in it.`,
  })
}

async function keySamples(page: Page, watched: string): Promise<KeySample[]> {
  await page.keyboard.press('1')
  await watchKeys(page, watched)
  for (let count = 0; count < WARM_UPS + KEYS; count += 1) await page.keyboard.press(CYCLE[count % CYCLE.length]!, { delay: 20 })
  const samples = await page.evaluate(() => window.benchKeys)
  if (samples.length < KEYS) throw new Error(`The total followed ${samples.length} of ${WARM_UPS + KEYS} keys.`)
  return samples.slice(WARM_UPS)
}
