import { flushPromises } from '@vue/test-utils'
import fc from 'fast-check'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { wholePercents } from '../../src/components/summary/wholePercents.ts'
import SummaryView from '../../src/views/SummaryView.vue'
import { buildSummaryAnswer } from '../support/buildSummaryAnswer.ts'
import { mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, stubApi } from '../support/stubApi.ts'

async function openSummary(summary: unknown, role: 'owner' | 'estimator' = 'owner') {
  const api = stubApi({ 'GET /houses': [{ id: 'h1', estimateId: 'e1' }], 'GET /estimates/e1/summary': summary })
  const { wrapper } = await mountInApp(SummaryView, { role, at: '/houses/h1/summary' })
  await flushPromises()
  return { api, wrapper }
}

beforeEach(() => {
  vi.stubGlobal(
    'CSSStyleSheet',
    class {
      replaceSync() {}
    },
  )
})
afterEach(() => vi.unstubAllGlobals())

describe('SummaryView', () => {
  it('tells the total as a range, in figures and in words that promise no odds', async () => {
    const { wrapper } = await openSummary(buildSummaryAnswer())
    const total = wrapper.get('section[aria-labelledby="summary-total"]')

    expect(total.get('[role="img"]').attributes('aria-label')).toBe('$51,300 to $83,900, likely $64,200')
    expect(total.get('dl').text()).toMatch(/Low\s*\$51,300\s*Likely\s*\$64,200\s*High\s*\$83,900/)
    expect(total.text()).toContain('the real cost lies between the two much more often than at either end')
    expect(total.text()).not.toMatch(/one in ten/)
  })

  it('foots the table with the total, in dollars without cents', async () => {
    const { wrapper } = await openSummary(buildSummaryAnswer())
    const table = wrapper.get('table[aria-label="Totals"]')

    expect(table.findAll('tbody tr').map((row) => row.get('th').text().split(' ')[0])).toEqual([
      'The',
      'Overhead',
      'Sales',
      'Permits',
      'Contingency',
    ])
    expect(table.findAll('tfoot td').map((cell) => cell.text())).toEqual(['$51,300', '$64,200', '$83,900'])
  })

  it('cuts the work by house system, by room and by trade', async () => {
    const { wrapper } = await openSummary(buildSummaryAnswer())

    expect(wrapper.findAll('.parts table').map((table) => table.attributes('aria-label'))).toEqual([
      'By house system',
      'By room',
      'By trade',
    ])
    expect(wrapper.findAll('.cut.unchosen')).toHaveLength(2)
    await wrapper.get('input[value="room"]').setValue(true)
    expect(wrapper.get('.cut:not(.unchosen)').text()).toContain('Kitchen')
  })

  it('tells who does it, how it’s known, what isn’t known, what to beware of and what the page is', async () => {
    const { wrapper } = await openSummary(buildSummaryAnswer())
    const text = wrapper.text()

    expect(text).toContain('about 191 h of your own work')
    expect(text).toMatch(/measured\s*58 %/)
    expect(text).toContain('Rot under the tub')
    expect(text).toContain('Lead paint is presumed here')
    expect(text).toContain('This is a working estimate. It has not been issued.')
    expect(text).toContain('not an inspection, an appraisal or an offer of credit')
    expect(text).toContain('version 2 of the price book of 2026-01-15, Merrow Harbor')
  })

  it('says whom the house comes from, and how many lines are left out', async () => {
    const { wrapper } = await openSummary(
      buildSummaryAnswer({ errorCount: 2, sharedBy: { name: 'Tobias Finch', email: 't@alderfinch.example' } }),
    )

    expect(wrapper.text()).toContain('Shared with you by Tobias Finch, t@alderfinch.example.')
    expect(wrapper.text()).toContain('2 lines hold an error and are left out of every figure here.')
  })

  it('shows no figures and no workbook while there is no line', async () => {
    const { wrapper } = await openSummary(buildSummaryAnswer({ lineCount: 0 }), 'estimator')

    expect(wrapper.text()).toContain('Nothing to sum yet')
    expect(wrapper.text()).not.toContain('Download workbook')
    expect(wrapper.get('a').attributes('href')).toBe('/houses/h1/estimate')
  })

  it('says why there is no workbook', async () => {
    const { api, wrapper } = await openSummary(buildSummaryAnswer())
    api.answers['GET /estimates/e1/workbook'] = problemAnswer(
      503,
      'busy',
      'The workbook could not be made just now. Try again in a minute.',
    )

    await wrapper
      .findAll('button')
      .find((button) => button.text() === 'Download workbook')
      ?.trigger('click')
    await flushPromises()

    expect(wrapper.get('[role="alert"]').text()).toContain('The workbook could not be made just now.')
  })

  it('says what went wrong where the summary can’t be read, and reads it again', async () => {
    const { api, wrapper } = await openSummary(problemAnswer(403, 'forbidden', 'This is not yours to read.'))
    expect(wrapper.text()).toContain('This is not yours to read.')

    api.answers['GET /estimates/e1/summary'] = buildSummaryAnswer()
    await wrapper
      .findAll('button')
      .find((button) => button.text() === 'Try again')
      ?.trigger('click')
    await flushPromises()

    expect(wrapper.text()).toContain('What the work comes to')
  })
})

describe('wholePercents', () => {
  it('gives the point left over to the greatest remainder', () => {
    expect(wholePercents([15.5, 84.5])).toEqual([16, 84])
    expect(wholePercents([33.3, 33.3, 33.4])).toEqual([33, 33, 34])
    expect(wholePercents([0, 0, 0, 0])).toEqual([0, 0, 0, 0])
  })

  it('always sums to 100 where the shares do', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 1, max: 1000 }), { minLength: 1, maxLength: 6 }), (parts) => {
        const sum = parts.reduce((total, part) => total + part, 0)
        const percents = wholePercents(parts.map((part) => (part / sum) * 100))
        expect(percents.reduce((total, part) => total + part, 0)).toBe(100)
      }),
    )
  })
})
