import { gzipSync } from 'node:zlib'
import type { Browser, BrowserContext } from 'playwright-core'
import type { BenchPage } from './browser.ts'
import { benchFigure, type BenchFigure } from './figure.ts'

const SIGN_IN_AIM_KB = 120
const ESTIMATE_AIM_KB = 450
const BYTES_PER_KB = 1000
const QUIET_MS = 1_500

/** Words of each heavy library that no minifier takes out. */
const HEAVY_LIBRARIES = {
  'the grid': 'ag-root-wrapper',
  'the parser of formulas': 'Parenthesis ) expected',
}

/** The JavaScript that a page really loads, each script gzipped, until none has come for a while. */
export async function* scriptFigures(browser: Browser, url: string, estimate: BenchPage): AsyncGenerator<BenchFigure> {
  const signIn = await scriptsOf(await browser.newContext(), `${url}/sign-in`, 'input[type="password"]')
  const sheet = await scriptsOf(await estimate.newContext(), estimate.url, '.ag-row [col-id="amount"]')
  yield weightFigure('browser: JavaScript of the sign-in page, gzipped', signIn, SIGN_IN_AIM_KB)
  yield weightFigure('browser: JavaScript of the estimate page, gzipped', sheet, ESTIMATE_AIM_KB)
  // Words that are found nowhere would prove nothing.
  const unknown = Object.entries(HEAVY_LIBRARIES).filter(([, words]) => !sheet.some((text) => text.includes(words)))
  if (unknown.length > 0) throw new Error(`The estimate page doesn't show the words by which ${unknown[0]![0]} is known.`)
  const loaded = Object.entries(HEAVY_LIBRARIES).filter(([, words]) => signIn.some((text) => text.includes(words)))
  yield benchFigure({
    name: 'browser: grid and formula parser loaded on the sign-in page',
    value: loaded.length,
    unit: 'libraries',
    ...(loaded.length > 0 && { note: `The sign-in page loads ${loaded.map(([name]) => name).join(' and ')}.` }),
  })
}

function weightFigure(name: string, scripts: readonly string[], aimKb: number): BenchFigure {
  const sizes = scripts.map((text) => gzipSync(text).length / BYTES_PER_KB).sort((a, b) => b - a)
  const value = sizes.reduce((sum, size) => sum + size, 0)
  return benchFigure({
    name,
    value,
    unit: 'kB',
    ...(value > aimKb && { note: `Over ${aimKb} kB: the heaviest of its ${sizes.length} scripts has ${Math.round(sizes[0] ?? 0)} kB.` }),
  })
}

async function scriptsOf(context: BrowserContext, url: string, readySelector: string): Promise<string[]> {
  const page = await context.newPage()
  const bodies: Promise<string>[] = []
  page.on('response', (response) => {
    if (response.request().resourceType() === 'script') bodies.push(response.text())
  })
  await page.goto(url)
  await page.locator(readySelector).first().waitFor()
  // The stream of events stays open, so the page is never without a request: quiet is no new script for a while.
  for (let known = -1; known !== bodies.length;) {
    known = bodies.length
    await page.waitForTimeout(QUIET_MS)
  }
  const texts = await Promise.all(bodies)
  await context.close()
  return texts
}
