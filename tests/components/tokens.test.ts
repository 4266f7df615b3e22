import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { contrastRatio, mixed, type Rgb } from '../support/contrastRatio.ts'

const css = readFileSync('src/assets/tokens.css', 'utf8')

const WORDS = 4.5
const GRAPHICS = 3

/** What stands on what, as the components use the tokens. */
const WORD_PAIRS: [words: string, ground: string][] = [
  ...['paper', 'surface', 'sunk'].flatMap((ground): [string, string][] => [
    ['ink', ground],
    ['muted', ground],
    ['brick', ground],
    ['lichen', ground],
    ['ochre-words', ground],
    ['oxblood', ground],
  ]),
  ['on-brick', 'brick'],
  ['on-brick', 'brick-deep'],
  ['on-oxblood', 'oxblood'],
  ['surface', 'ink'],
  ...['brick-wash', 'lichen-wash', 'ochre-wash', 'oxblood-wash'].flatMap((wash): [string, string][] => [
    ['ink', wash],
    ['muted', wash],
  ]),
  ['brick', 'brick-wash'],
  ['lichen', 'lichen-wash'],
  ['ochre-words', 'ochre-wash'],
  ['oxblood', 'oxblood-wash'],
]
const GRAPHIC_PAIRS: [mark: string, ground: string][] = [
  ...['paper', 'surface', 'sunk'].flatMap((ground): [string, string][] => [
    ['edge', ground],
    ['focus', ground],
    ['ochre', ground],
    ['lichen', ground],
    ['brick', ground],
  ]),
  ['ochre', 'ochre-wash'],
  ['lichen', 'lichen-wash'],
  ['oxblood', 'oxblood-wash'],
]

function colourOf(name: string, theme: 'light' | 'dark'): Rgb {
  const pair = new RegExp(`--${name}: light-dark\\((#[0-9a-f]{6}), (#[0-9a-f]{6})\\)`).exec(css)
  if (!pair) throw new Error(`tokens.css has no pair of colours called --${name}`)
  const hex = theme === 'light' ? pair[1]! : pair[2]!
  return [1, 3, 5].map((at) => parseInt(hex.slice(at, at + 2), 16)) as Rgb
}

describe('contrastRatio', () => {
  it('is 21 between black and white, and 1 between a colour and itself', () => {
    expect(contrastRatio([0, 0, 0], [255, 255, 255])).toBeCloseTo(21, 5)
    expect(contrastRatio([120, 30, 60], [120, 30, 60])).toBe(1)
  })

  it('is 4.54 between #767676 and white, the well-known edge of what may be read', () => {
    expect(contrastRatio([0x76, 0x76, 0x76], [255, 255, 255])).toBeCloseTo(4.54, 2)
  })
})

describe.each(['light', 'dark'] as const)('the %s theme', (theme) => {
  it.each(WORD_PAIRS)('can be read where %s stands on %s', (words, ground) => {
    expect(contrastRatio(colourOf(words, theme), colourOf(ground, theme))).toBeGreaterThanOrEqual(WORDS)
  })

  it.each(GRAPHIC_PAIRS)('shows %s on %s', (mark, ground) => {
    expect(contrastRatio(colourOf(mark, theme), colourOf(ground, theme))).toBeGreaterThanOrEqual(GRAPHICS)
  })

  it('can be read in a selected row of the grid', () => {
    const selected = mixed(colourOf('brick', theme), colourOf('surface', theme), 0.1)
    expect(contrastRatio(colourOf('ink', theme), selected)).toBeGreaterThanOrEqual(WORDS)
  })
})

describe('tokens.css', () => {
  it('gives each colour for both themes', () => {
    const colours = [...css.matchAll(/^ {2}--[a-z-]+: (?:#|rgb|hsl)/gm)]
    expect(colours).toHaveLength(0)
  })
})
