import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { asPerson, type PersonAtScreen } from '../support/asPerson.ts'
import { launchBrowser } from '../support/launchBrowser.ts'
import { startApp, type RunningApp } from '../support/startApp.ts'

/** The estimate grid under the hands of somebody who lives in spreadsheets: keyboard alone wherever the keyboard is what they use. */
describe('The estimate grid', () => {
  let app: RunningApp
  let browser: Browser
  let estimator: PersonAtScreen
  let page: Page

  beforeAll(async () => {
    app = await startApp()
    browser = await launchBrowser()
    estimator = await asPerson(browser, app.url, 'estimator')
    page = estimator.page
    await openEstimate(page)
  })
  afterAll(async () => {
    await browser?.close()
    await app?.stop()
  })

  it('follows each keystroke with the total, goes back with Escape, keeps with Enter, and undoes', async () => {
    const before = await total(page)
    await focusCell(page, 'Lock and dead bolt', 'quantity')
    await page.keyboard.press('9')
    const nine = await total(page)
    await page.keyboard.press('9')
    expect(new Set([before, nine, await total(page)]).size).toBe(3)
    await page.keyboard.press('Escape')
    expect(await total(page)).toBe(before)
    await page.keyboard.type('9')
    await page.keyboard.press('Enter')
    expect(await total(page)).toBe(nine)
    await saved(page)
    await page.keyboard.press('Control+z')
    expect(await total(page)).toBe(before)
  })

  it('completes the name of a measure, marks a formula that is wrong and leaves its line out', async () => {
    const before = await total(page)
    await focusCell(page, 'Brick repointed', 'quantity')
    await page.keyboard.type('=outside_w')
    await page.getByRole('option', { name: /outside_wall_area/ }).waitFor()
    await page.keyboard.press('Tab')
    await page.keyboard.type(' / bogus')
    await page.locator('mark', { hasText: 'bogus' }).waitFor()
    await page.keyboard.press('Enter')
    await focusCell(page, 'Transition strip', 'quantity')
    await page.getByRole('button', { name: /1 line is left out of the total/ }).click()
    expect(await focused(page)).toEqual({ line: 'Brick repointed', column: 'quantity' })
    await page.keyboard.press('Control+z')
    expect(await total(page)).toBe(before)
  })

  it('adds a line by the beginnings of two words and goes on in its quantity', async () => {
    await focusCell(page, 'Transition strip', 'quantity')
    await page.keyboard.press('Control+Enter')
    await page.getByRole('combobox', { name: 'Find an item of the price book' }).pressSequentially('gut alum')
    await page.getByRole('option', { name: /Aluminum gutter/ }).waitFor()
    await page.keyboard.press('Enter')
    expect(await focused(page)).toEqual({ line: 'Aluminum gutter', column: 'quantity' })
    await saved(page)
    await page.keyboard.press('Control+Delete')
    await page.getByText('“Aluminum gutter” removed').waitFor()
  })

  it('marks evidence and turns own hands and hired round with one letter', async () => {
    await focusCell(page, 'Transition strip', 'evidence')
    await page.keyboard.press('t')
    await cell(page, 'Transition strip', 'evidence').getByRole('img', { name: 'tested' }).waitFor()
    await focusCell(page, 'Transition strip', 'basis')
    await page.keyboard.press('h')
    expect(await cell(page, 'Transition strip', 'basis').innerText()).toBe('hired')
    await page.keyboard.press('Control+z')
    await page.keyboard.press('Control+z')
    expect(await cell(page, 'Transition strip', 'basis').innerText()).toBe('own hands')
  })

  it('sets a price of one’s own with the reason, the book’s beside it, and goes back to the book’s', async () => {
    const before = await total(page)
    await focusCell(page, 'Transition strip', 'price')
    await page.keyboard.type('9')
    const dialog = page.getByRole('dialog', { name: /Price of/ })
    await dialog.getByRole('textbox', { name: 'Likely' }).fill('25')
    await dialog.getByRole('textbox', { name: 'High' }).fill('99')
    await dialog.getByRole('button', { name: 'Keep this price' }).click()
    await dialog.getByText('Reason say why.').waitFor()
    await dialog.getByRole('textbox', { name: 'Reason' }).fill('The yard named it')
    await dialog.getByRole('button', { name: 'Keep this price' }).click()
    await cell(page, 'Transition strip', 'price').getByText('$25.00').waitFor()
    expect(await cell(page, 'Transition strip', 'price').innerText()).toContain('$23.32 →')
    await page.keyboard.press('Enter')
    await dialog.getByRole('button', { name: 'Back to the book’s price' }).click()
    expect(await total(page)).toBe(before)
  })

  it('takes a block from a spreadsheet, grows lines at the end, marks what it can’t take, and undoes all of it as one step', async () => {
    const before = await total(page)
    const lineCount = () => page.evaluate(() => document.querySelector('.group-head .count')?.textContent)
    const countBefore = await lineCount()
    await focusCell(page, 'Brick repointed', 'description')
    await paste(page, 'Brick renewed\tNo such room\t$1,200.50')
    await cell(page, 'Brick renewed', 'room').and(page.locator('.is-wrong')).waitFor()
    expect(await cell(page, 'Brick renewed', 'quantity').innerText()).toContain('1,200.5')
    await page.keyboard.press('Control+z')
    await cell(page, 'Brick repointed', 'room').and(page.locator(':not(.is-wrong)')).waitFor()
    expect(await total(page)).toBe(before)
    expect(await lineCount()).toBe(countBefore)
  })

  it('copies cells as tab-separated text with bare figures, and fills down', async () => {
    await focusCell(page, 'Lock and dead bolt', 'quantity')
    await page.keyboard.press('Shift+ArrowDown')
    await page.keyboard.press('Shift+ArrowRight')
    expect(await copied(page)).toBe('2\town hands\n1\town hands')
    await page.keyboard.press('Shift+ArrowLeft')
    await page.keyboard.press('Control+d')
    await cell(page, 'Dehumidifier with drain', 'quantity').getByText('2', { exact: true }).waitFor()
    await page.keyboard.press('Control+z')
    await cell(page, 'Dehumidifier with drain', 'quantity').getByText('1', { exact: true }).waitFor()
  })

  it('finds a line by its words and goes there', async () => {
    await page.keyboard.press('Control+f')
    await page.getByRole('searchbox', { name: 'Find in the estimate' }).pressSequentially('smoke alarm')
    await page.keyboard.press('Enter')
    await page.keyboard.press('Escape')
    expect(await focused(page)).toEqual({ line: 'Smoke alarm, ten-year battery', column: 'description' })
  })

  it('folds a group up from its head and leaves the grid with Escape and Tab', async () => {
    await page.keyboard.press('Control+Home')
    await page.keyboard.press('Enter')
    await page.locator('.group-head.is-collapsed').first().waitFor()
    await page.keyboard.press('Enter')
    await focusCell(page, 'Brick repointed', 'quantity')
    await page.keyboard.press('Escape')
    await page.keyboard.press('Tab')
    expect(await page.evaluate(() => document.activeElement?.closest('.estimate-grid'))).toBeNull()
  })

  it('keeps what was keyed without a connection and sends it when there is one again', async () => {
    await focusCell(page, 'Lock and dead bolt', 'note')
    await estimator.context.setOffline(true)
    await page.keyboard.type('keyed in the cellar')
    await page.keyboard.press('Enter')
    await page.getByText('Not saved', { exact: true }).waitFor()
    await estimator.context.setOffline(false)
    await saved(page)
    await page.reload()
    await page.getByRole('gridcell', { name: 'keyed in the cellar' }).waitFor()
    estimator.complaints.splice(
      0,
      estimator.complaints.length,
      ...estimator.complaints.filter((words) => !words.includes('ERR_INTERNET_DISCONNECTED')),
    )
  })

  it('lets two people work at once: what one saves comes in at the other, and of one field with two values neither is lost', async () => {
    const other = await asPerson(browser, app.url, 'admin')
    await openEstimate(other.page)
    await focusCell(other.page, 'Brick repointed', 'note')
    await other.page.keyboard.type('from the other')
    await other.page.keyboard.press('Enter')
    await cell(page, 'Brick repointed', 'note').getByText('from the other').waitFor()

    await focusCell(page, 'Brick repointed', 'quantity')
    await page.keyboard.type('77')
    await focusCell(other.page, 'Brick repointed', 'quantity')
    await other.page.keyboard.type('66')
    await other.page.keyboard.press('Enter')
    await saved(other.page)
    await page.waitForTimeout(500)
    await page.keyboard.press('Enter')
    await page.getByRole('button', { name: '1 change needs you' }).click()
    const values = page.getByRole('group', { name: 'Quantity' })
    expect(await values.innerText()).toMatch(/77[\s\S]*66/)
    await values.getByRole('button', { name: 'Keep mine' }).click()
    await cell(other.page, 'Brick repointed', 'quantity').getByText('77').waitFor()
    expect([...estimator.complaints, ...other.complaints]).toEqual([])
  })
})

async function openEstimate(page: Page): Promise<void> {
  await page.getByRole('link', { name: '88 Ropewalk' }).click()
  await page
    .getByRole('navigation', { name: 'Parts of this house' })
    .getByRole('link', { name: /Estimate/ })
    .click()
  await page.getByRole('gridcell', { name: 'Brick repointed' }).waitFor()
}

function cell(page: Page, line: string, column: string) {
  const row = page.getByRole('row').filter({ has: page.locator('[col-id="description"]').getByText(line, { exact: true }) })
  return row.locator(`[col-id="${column}"]`)
}

async function focusCell(page: Page, line: string, column: string): Promise<void> {
  await cell(page, line, column).click()
}

/** The likely total, as it stands in view. */
function total(page: Page): Promise<string> {
  return page.getByRole('region', { name: 'Totals' }).locator('.total .likely dd').innerText()
}

async function saved(page: Page): Promise<void> {
  await page.locator('.status-line').getByText('Saved', { exact: true }).waitFor()
}

function focused(page: Page): Promise<{ line: string; column: string }> {
  return page.evaluate(() => {
    const cell = document.activeElement
    const line = cell?.closest('.ag-row')?.querySelector('[col-id="description"] .words')?.textContent ?? ''
    return { line, column: cell?.getAttribute('col-id') ?? '' }
  })
}

async function paste(page: Page, text: string): Promise<void> {
  await page.evaluate((pasted) => {
    const data = new DataTransfer()
    data.setData('text/plain', pasted)
    document.activeElement?.dispatchEvent(new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true }))
  }, text)
}

function copied(page: Page): Promise<string> {
  return page.evaluate(() => {
    const data = new DataTransfer()
    document.activeElement?.dispatchEvent(new ClipboardEvent('copy', { clipboardData: data, bubbles: true, cancelable: true }))
    return data.getData('text/plain')
  })
}
