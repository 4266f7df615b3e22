import { describe, expect, it } from 'vitest'
import { cellAddress, columnLetters, quotedSheet, sheetAddress, sheetColumnRange } from '../../shared/engine/workbook/cellAddress.ts'
import { CELL_LINE_FEEDS_MAX, CELL_TEXT_MAX, cellText, looksLikeFormula } from '../../shared/engine/workbook/cellText.ts'
import { definedNameProblem, sheetNameProblem } from '../../shared/engine/workbook/workbookNames.ts'

describe('columnLetters', () => {
  it('counts A to Z, then AA, to the last column of a sheet', () => {
    expect([1, 26, 27, 52, 53, 702, 703, 16_384].map(columnLetters)).toEqual(['A', 'Z', 'AA', 'AZ', 'BA', 'ZZ', 'AAA', 'XFD'])
  })
})

describe('cell addresses', () => {
  it('are relative on their own sheet and fixed from another', () => {
    expect(cellAddress(5, 2)).toBe('B5')
    expect(sheetAddress('Prices used', 7, 6)).toBe("'Prices used'!$F$7")
    expect(sheetColumnRange('Estimate', 18, 6, 80)).toBe("'Estimate'!$R$6:$R$80")
  })

  it('double an apostrophe in the name of a sheet', () => {
    expect(quotedSheet("Owner's")).toBe("'Owner''s'")
  })
})

describe('sheetNameProblem', () => {
  it.each(['Summary', 'Prices used', 'Assumptions and cautions', "Owner's", 'x'.repeat(31)])('takes %s', (name) => {
    expect(sheetNameProblem(name)).toBeNull()
  })

  it.each(['Roof/Gutters', 'Cost [2]', 'a?b', 'x'.repeat(32), '', '  ', 'History', 'HISTORY', "'x", "x'", 'a:b', 'a*b', 'a\\b'])(
    'refuses "%s" in words',
    (name) => {
      expect(sheetNameProblem(name)).toMatch(/^(is|holds|begins)/)
    },
  )
})

describe('definedNameProblem', () => {
  it.each(['total_likely', 'room_1_floor_area', 'tax_rule', 'house_roof_squares', 'LongerThanAColumn1'])('takes %s', (name) => {
    expect(definedNameProblem(name)).toBeNull()
  })

  it.each(['R1', 'C', 'r', 'R1C1', 'ABC1', 'xfd1048576', 'A1', 'two words', '1st', 'TRUE', 'a-b', '', 'x'.repeat(256)])(
    'refuses "%s"',
    (name) => {
      expect(definedNameProblem(name)).not.toBeNull()
    },
  )
})

describe('cellText', () => {
  it('leaves plain text as it is, line feeds, tabs and letters of any script too', () => {
    const text = 'Küche\n12\' 6"\tfenêtre 窓 🏚'
    expect(cellText(text)).toBe(text)
  })

  it('takes out what XML can’t hold and turns carriage returns into line feeds', () => {
    expect(cellText('a\u0000b\u0008c\u001fd\u007fe\ufffef')).toBe('abcdef')
    expect(cellText('one\r\ntwo\rthree')).toBe('one\ntwo\nthree')
    expect(cellText('half \ud83c of a pair')).toBe('half  of a pair')
  })

  it('cuts at the limit of a cell, between two characters and never inside a pair', () => {
    expect(cellText('x'.repeat(40_000))).toHaveLength(CELL_TEXT_MAX)
    const cut = cellText(`${'x'.repeat(CELL_TEXT_MAX - 1)}🏚`)
    expect(cut).toBe('x'.repeat(CELL_TEXT_MAX - 1))
  })

  it('keeps as many lines as a cell can show and runs the rest on', () => {
    const lines = Array.from({ length: 300 }, (_, index) => `line ${index}`)
    const text = cellText(lines.join('\n'))
    expect(text.split('\n')).toHaveLength(CELL_LINE_FEEDS_MAX + 1)
    expect(text.endsWith('line 298 line 299')).toBe(true)
  })
})

describe('looksLikeFormula', () => {
  it.each(['=1+1', '+1', '-1 door', '@x', '\t=1'])('sees "%s"', (text) => {
    expect(looksLikeFormula(text)).toBe(true)
  })

  it.each(['1+1', 'a=b', ' =1', '', "'=1"])('leaves "%s"', (text) => {
    expect(looksLikeFormula(text)).toBe(false)
  })
})
