import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { AxeResults } from 'axe-core'
import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Role } from '../../shared/schemas/account.ts'
import { asPerson, collectComplaints } from '../support/asPerson.ts'
import { launchBrowser } from '../support/launchBrowser.ts'
import { startApp, type RunningApp } from '../support/startApp.ts'

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')

const SCREENS = [
  { name: 'a desk, light', width: 1440, height: 900, dark: false },
  { name: 'a phone, dark', width: 390, height: 844, dark: true },
]

/** Every page by who reads it, and the heading that says it is there. */
const PAGES: { role: Role | null; path: string; heading: string }[] = [
  { role: null, path: '/sign-in', heading: 'Sign in' },
  { role: null, path: '/forgotten-password', heading: 'Forgotten password' },
  { role: null, path: '/reset-password?token=x', heading: 'New password' },
  { role: null, path: '/accept-invitation?token=x', heading: 'Accept the invitation' },
  { role: 'admin', path: '/', heading: 'Houses' },
  { role: 'admin', path: '/people', heading: 'People' },
  { role: 'admin', path: '/outbox', heading: 'Outbox' },
  { role: 'admin', path: '/account', heading: 'Your account' },
  { role: 'admin', path: '/price-book', heading: 'Price book' },
  { role: 'admin', path: '/nothing/here', heading: 'No such page' },
  { role: 'estimator', path: '/houses/lantern-street/details', heading: 'Details' },
  { role: 'estimator', path: '/houses/lantern-street/rooms', heading: 'Rooms' },
  { role: 'estimator', path: '/houses/lantern-street/estimate', heading: 'Estimate' },
  { role: 'owner', path: '/houses/lantern-street/summary', heading: 'Summary' },
]

describe.each(SCREENS)('On $name', (screen) => {
  let app: RunningApp
  let browser: Browser
  const pages = new Map<Role | null, { page: Page; complaints: string[] }>()

  beforeAll(async () => {
    app = await startApp()
    browser = await launchBrowser()
  })
  afterAll(async () => {
    await browser?.close()
    await app?.stop()
  })

  async function pageOf(role: Role | null): Promise<{ page: Page; complaints: string[] }> {
    const known = pages.get(role)
    if (known) return known
    const opened = role ? await asPerson(browser, app.url, role, screen) : await asNobody()
    pages.set(role, opened)
    return opened
  }

  async function asNobody(): Promise<{ page: Page; complaints: string[] }> {
    const { width, height, dark } = screen
    const context = await browser.newContext({ viewport: { width, height }, colorScheme: dark ? 'dark' : 'light', reducedMotion: 'reduce' })
    const page = await context.newPage()
    return { page, complaints: collectComplaints(page) }
  }

  it.each(PAGES)('$path is whole, fits its width and can be used by everyone', async ({ role, path, heading }) => {
    const { page, complaints } = await pageOf(role)
    await page.goto(app.url + path)
    await page.getByRole('heading', { name: heading, level: 1 }).waitFor()
    await page.waitForLoadState('load')
    await page.locator('[aria-busy="true"]').first().waitFor({ state: 'detached' })

    expect(await seriousFaults(page)).toEqual([])
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)
    expect(overflow, 'pixels that stick out sideways').toBe(0)
    expect(complaints.splice(0)).toEqual([])
  })
})

/** What axe finds serious or critical by WCAG 2.2 A and AA: the rule, and where. */
async function seriousFaults(page: Page): Promise<string[]> {
  // Through the debugger's door, because the content security policy lets no foreign script in by the front one.
  await page.evaluate(axeSource)
  const { violations } = (await page.evaluate(
    `axe.run({ runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'] })`,
  )) as AxeResults
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id}: ${target.join(' ')}`))
}
