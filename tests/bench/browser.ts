import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { Browser, BrowserContext } from 'playwright-core'
import { build } from 'vite'
import { launchBrowser } from '../support/launchBrowser.ts'
import { startApp } from '../support/startApp.ts'
import { importHouse, openBenchSession, UNLIMITED, type BenchSession } from './benchSession.ts'
import { keystrokeFigures } from './browserKeystroke.ts'
import { paintFigures } from './browserPaint.ts'
import { scriptFigures } from './browserScripts.ts'
import type { BenchFigure } from './figure.ts'

const SIZES = [300, 5_000]

/** An imported estimate, and how a browser gets to it. */
export interface BenchPage {
  lineCount: number
  url: string
  /** A window of its own, signed in, with nothing in its cache. */
  newContext(): Promise<BrowserContext>
}

/** What a person at the screen waits for, in Chromium over the pages as they ship: scripts, first paint, and the total after a key. */
export async function* browserBench(): AsyncGenerator<BenchFigure> {
  await build({ logLevel: 'error' })
  const dataDir = await mkdtemp(join(tmpdir(), 'quoinbook-bench-'))
  const app = await startApp({ ...UNLIMITED, DATA_DIR: dataDir })
  const browser = await launchBrowser()
  try {
    const session = await openBenchSession(app.url)
    const pages: BenchPage[] = []
    for (const lineCount of SIZES) pages.push(await makePage(browser, session, lineCount))
    yield* scriptFigures(browser, app.url, pages[0]!)
    for (const page of pages) yield* paintFigures(browser, page)
    for (const page of pages) yield* keystrokeFigures(browser, page)
  } finally {
    await browser.close()
    await app.stop()
    await rm(dataDir, { recursive: true, force: true })
  }
}

async function makePage(browser: Browser, session: BenchSession, lineCount: number): Promise<BenchPage> {
  const { houseId } = await importHouse(session, lineCount)
  const [name = '', value = ''] = session.cookie.split('=')
  return {
    lineCount,
    url: `${session.url}/houses/${houseId}/estimate`,
    async newContext() {
      const context = await browser.newContext({ viewport: { width: 1440, height: 900 } })
      await context.addCookies([{ name, value, url: session.url }])
      return context
    },
  }
}
