import type { Browser, BrowserContext, Page } from 'playwright-core'
import { demoAccounts } from '../../seed/demoAccounts.ts'
import type { Role } from '../../shared/schemas/account.ts'

export interface PersonAtScreen {
  page: Page
  context: BrowserContext
  /** What went wrong in the page while it was driven: errors of scripts, and what the browser reported. */
  complaints: string[]
}

/** Not a fault: the page asks who is signed in before anybody is. */
const EXPECTED = /401 \(Unauthorized\)/

/** Opens the sign-in page in a window of its own and signs in by hand as a person of the demo. */
export async function asPerson(
  browser: Browser,
  url: string,
  role: Role,
  { width = 1440, height = 900, dark = false }: { width?: number; height?: number; dark?: boolean } = {},
): Promise<PersonAtScreen> {
  const isPhone = width < 600
  const context = await browser.newContext({
    viewport: { width, height },
    colorScheme: dark ? 'dark' : 'light',
    isMobile: isPhone,
    hasTouch: isPhone,
    reducedMotion: 'reduce',
    acceptDownloads: true,
  })
  const page = await context.newPage()
  page.setDefaultTimeout(15_000)
  const complaints = collectComplaints(page)
  const { email, password } = demoAccounts.find((account) => account.role === role)!
  await page.goto(url)
  await page.getByRole('textbox', { name: 'E-mail' }).fill(email)
  await page.getByRole('textbox', { name: 'Password' }).fill(password)
  await page.getByRole('button', { name: 'Sign in', exact: true }).click()
  await page.getByRole('heading', { name: 'Houses', level: 1 }).waitFor()
  return { page, context, complaints }
}

/** Gathers what the browser complains of while a page is open. */
export function collectComplaints(page: Page): string[] {
  const complaints: string[] = []
  page.on('pageerror', (error) => complaints.push(error.message))
  page.on('console', (message) => {
    const isComplaint = message.type() === 'error' || message.type() === 'warning'
    if (isComplaint && !EXPECTED.test(message.text())) complaints.push(message.text())
  })
  return complaints
}
