import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import EvidenceMark from '../../src/components/base/EvidenceMark.vue'
import RangeRibbon from '../../src/components/base/RangeRibbon.vue'
import { EVIDENCE_MARKS } from '../../shared/schemas/estimate.ts'

const COST = { low: 6_000_000, likely: 7_500_000, high: 10_000_000 }

function mountRibbon(props: Record<string, unknown> = {}) {
  return mount(RangeRibbon, { props: { ...COST, ...props } })
}
function styleOf(wrapper: ReturnType<typeof mountRibbon>, part: string): CSSStyleDeclaration {
  return wrapper.get<HTMLElement>(part).element.style
}

describe('RangeRibbon', () => {
  it('says in words what it shows', () => {
    expect(mountRibbon().get('[role=img]').attributes('aria-label')).toBe('$60,000 to $100,000, likely $75,000')
  })

  it('names the other figures of a total, too', () => {
    const words = mountRibbon({ even: 7_800_000, careful: 8_600_000, ceiling: 9_000_000 }).get('[role=img]').attributes('aria-label')
    expect(words).toBe('$60,000 to $100,000, likely $75,000, even odds $78,000, careful $86,000, ceiling $90,000')
  })

  it('begins its scale at zero, so that lengths can be compared', () => {
    const wrapper = mountRibbon()
    expect(styleOf(wrapper, '.to-likely')).toMatchObject({ left: '60%', width: '15%' })
    expect(styleOf(wrapper, '.to-high')).toMatchObject({ left: '75%', width: '25%' })
    expect(styleOf(wrapper, '.band > .likely').left).toBe('75%')
  })

  it('shares a scale with the others of its column', () => {
    expect(styleOf(mountRibbon({ scaleTo: 20_000_000 }), '.band > .likely').left).toBe('37.5%')
  })

  it('marks what stands above the ceiling', () => {
    expect(styleOf(mountRibbon({ ceiling: 8_000_000 }), '.over')).toMatchObject({ left: '80%', width: '20%' })
    expect(mountRibbon({ ceiling: 12_000_000 }).find('.over').exists()).toBe(false)
  })

  it('prints its figures in the head of a page', () => {
    const wrapper = mountRibbon({ size: 'header', careful: 8_600_000 })
    expect(wrapper.findAll('dt').map((title) => title.text())).toEqual(['Low', 'Likely', 'Careful', 'High'])
    expect(wrapper.findAll('dd').map((figure) => figure.text())).toEqual(['$60,000', '$75,000', '$86,000', '$100,000'])
  })

  it.each([
    ['nothing', { low: 0, likely: 0, high: 0 }],
    ['a price that is certain', { low: 500, likely: 500, high: 500 }],
  ])('can be drawn for %s', (_situation, cost) => {
    for (const size of ['cell', 'row', 'header']) expect(mountRibbon({ ...cost, size }).html()).not.toContain('NaN')
  })
})

describe('EvidenceMark', () => {
  it('has a shape of its own for each kind of evidence', () => {
    const shapes = EVIDENCE_MARKS.map((mark) => mount(EvidenceMark, { props: { mark } }).get('svg').element.innerHTML)
    expect(new Set(shapes).size).toBe(EVIDENCE_MARKS.length)
  })

  it('is read out by its name', () => {
    expect(
      mount(EvidenceMark, { props: { mark: 'tested' } })
        .get('svg')
        .attributes('aria-label'),
    ).toBe('tested')
  })
})
