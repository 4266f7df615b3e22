import { describe, expect, it } from 'vitest'
import { formatHtmlTable, formatTabbedText, guardText, parseTabbedText, unguardText } from '../../../src/composables/tabbedText.ts'

describe('parseTabbedText', () => {
  it('reads rows and cells', () => {
    expect(parseTabbedText('a\tb\r\nc\td\r\n')).toEqual([
      ['a', 'b'],
      ['c', 'd'],
    ])
  })

  it('reads a quoted cell that holds tabs, line ends and quotes', () => {
    expect(parseTabbedText('"two\nlines"\t"says ""yes"""\tc')).toEqual([['two\nlines', 'says "yes"', 'c']])
  })

  it('leaves a quote that closes nothing as it is: an inch mark is text', () => {
    expect(parseTabbedText('"A" frame\t12\' 6"')).toEqual([['"A" frame', '12\' 6"']])
  })

  it('keeps empty cells, and rows of empty cells', () => {
    expect(parseTabbedText('a\t\tb\n\t\t\n')).toEqual([
      ['a', '', 'b'],
      ['', '', ''],
    ])
  })

  it('reads nothing from nothing', () => {
    expect(parseTabbedText('')).toEqual([])
    expect(parseTabbedText('\n')).toEqual([])
  })
})

describe('formatTabbedText', () => {
  it('is read back as the same cells', () => {
    const cells = [
      ['plain', 'with\ttab', 'two\nlines'],
      ['"quoted"', '12\' 6"', ''],
    ]
    expect(parseTabbedText(formatTabbedText(cells))).toEqual(cells)
  })
})

describe('formatHtmlTable', () => {
  it('lets no text be markup', () => {
    expect(formatHtmlTable([['<b>&']])).toBe('<table><tr><td>&lt;b&gt;&amp;</td></tr></table>')
  })
})

describe('guardText', () => {
  it.each(['=1+1', '+1', '-1', '@sum', '\tx'])('keeps a spreadsheet from running %j', (text) => {
    expect(guardText(text)).toBe(`'${text}`)
    expect(unguardText(guardText(text))).toBe(text)
  })

  it('leaves other text alone', () => {
    expect(guardText('Oak floor')).toBe('Oak floor')
    expect(unguardText("'tis worn")).toBe("'tis worn")
  })
})
