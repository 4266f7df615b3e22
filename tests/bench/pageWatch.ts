import type { Page } from 'playwright-core'

declare global {
  interface Window {
    /** Milliseconds from the start of the navigation to the paint that was waited for. */
    benchPaint: Promise<number>
    benchKeys: KeySample[]
  }
}

/** What one key took: until the watched part of the page had changed, and until the frame that shows it was made. */
export interface KeySample {
  scriptMs: number
  paintedMs: number
}

/** The loader that runs the benches wraps functions in a call of this name, which no page knows. */
const KNOW_LOADER = 'globalThis.__name = (named) => named'

/** Has every page that is opened from here on tell when each of the selectors shows a figure and the frame with it was made. */
export async function watchPaint(page: Page, selectors: readonly string[]): Promise<void> {
  await page.addInitScript(KNOW_LOADER)
  await page.addInitScript((wanted: readonly string[]) => {
    window.benchPaint = new Promise((resolve) => {
      function look(): void {
        const isThere = wanted.every((selector) => /\d/.test(document.querySelector(selector)?.textContent ?? ''))
        if (!isThere) requestAnimationFrame(look)
        else requestAnimationFrame(() => setTimeout(() => resolve(performance.now())))
      }
      requestAnimationFrame(look)
    })
  }, selectors)
}

/** Has the open page take the time of each key until a part of it changes. Keys that change nothing leave no sample. */
export async function watchKeys(page: Page, selector: string): Promise<void> {
  await page.evaluate((watched) => {
    let key: { at: number; sentAt: number } | null = null
    window.benchKeys = []
    window.addEventListener('keydown', (event) => (key = { at: performance.now(), sentAt: event.timeStamp }), { capture: true })
    new MutationObserver(() => {
      if (!key) return
      const { at, sentAt } = key
      key = null
      const scriptMs = performance.now() - at
      requestAnimationFrame(() => setTimeout(() => window.benchKeys.push({ scriptMs, paintedMs: performance.now() - sentAt })))
    }).observe(document.querySelector(watched)!, { subtree: true, childList: true, characterData: true })
  }, selector)
}
