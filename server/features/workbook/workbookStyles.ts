import type { Borders, Fill, Font, Style } from 'exceljs'
import { textLook } from '../../../shared/engine/workbook/rowHeight.ts'
import type { StyleName } from '../../../shared/engine/workbook/workbookModel.ts'

/** The palette of the app, on white: a workbook is printed. */
const COLOUR = {
  ink: 'FF22303A',
  muted: 'FF5C6B73',
  mortar: 'FFD9D2C3',
  limestone: 'FFF6F3EC',
  ochreWash: 'FFFBF3E2',
  brick: 'FF9C3D26',
  ochre: 'FF835200',
  oxblood: 'FF8C1C2B',
}

/** The room of a bracket to the right of each figure, so that it doesn't touch what stands in the next column. */
const ROOM = '_)'
const MONEY = `"$"#,##0.00${ROOM}`
const UNIT_PRICE = `"$"#,##0.00##${ROOM}`
const TWO_DECIMALS = `#,##0.00${ROOM}`
/** None is no figure worth reading. */
const HOURS = `#,##0.00${ROOM};-#,##0.00${ROOM};`
const FEET = `#,##0.00##${ROOM}`
const WHOLE = `0${ROOM}`
const AS_IT_IS = `General${ROOM}`
const WORDS_RIGHT = `@${ROOM}`

/** Faces that every spreadsheet program has or has a twin of. */
const WORDS = 'Arial'
const FIXED_WIDTH = 'Courier New'

interface Look {
  bold?: boolean
  colour?: string
  face?: string
  format?: string
  fill?: string
  side?: 'left' | 'right' | 'center'
  /** Rules above and below. */
  above?: 'hair' | 'thin' | 'medium'
  below?: 'hair' | 'thin' | 'medium'
  ruleColour?: string
}

const BODY = { below: 'hair' } as const
const INPUT = { ...BODY, fill: COLOUR.ochreWash, side: 'right' } as const
const RIGHT = { ...BODY, side: 'right' } as const
const HEAD = { bold: true, fill: COLOUR.limestone, above: 'thin', below: 'thin', ruleColour: COLOUR.ink } as const
const FOOT = { bold: true, above: 'thin', below: 'thin', ruleColour: COLOUR.ink } as const
const TOTAL = { bold: true, above: 'medium', below: 'medium', ruleColour: COLOUR.ink } as const

const LOOKS: Record<StyleName, Look> = {
  firm: { colour: COLOUR.muted },
  title: { bold: true },
  subtitle: { colour: COLOUR.muted },
  heading: { bold: true, colour: COLOUR.brick, below: 'thin', ruleColour: COLOUR.brick },
  'heading-right': { bold: true, colour: COLOUR.brick, below: 'thin', ruleColour: COLOUR.brick, side: 'right' },
  group: { ...HEAD, side: 'center' },
  head: HEAD,
  'head-right': { ...HEAD, side: 'right' },
  label: { ...BODY },
  text: { ...BODY },
  fact: { ...BODY, bold: true },
  'fact-right': { ...RIGHT, bold: true },
  'fact-count': { ...RIGHT, bold: true, format: WHOLE },
  'fact-hours': { ...RIGHT, bold: true, format: TWO_DECIMALS },
  small: { colour: COLOUR.muted },
  notice: { ...BODY },
  'caution-label': { ...BODY, bold: true, colour: COLOUR.ochre },
  problem: { ...BODY, colour: COLOUR.oxblood },
  'range-label': { bold: true },
  'range-money': { bold: true, format: MONEY, side: 'right' },
  ribbon: { face: FIXED_WIDTH },
  'ribbon-small': { ...BODY, face: FIXED_WIDTH },
  count: { ...RIGHT, format: WHOLE },
  number: { ...RIGHT, format: TWO_DECIMALS },
  hours: { ...RIGHT, format: HOURS },
  feet: { ...RIGHT, format: FEET },
  percent: { ...RIGHT, format: AS_IT_IS },
  money: { ...RIGHT, format: MONEY },
  'unit-price': { ...RIGHT, format: UNIT_PRICE },
  'input-quantity': { ...INPUT, format: TWO_DECIMALS },
  'input-number': { ...INPUT, format: AS_IT_IS },
  'input-feet': { ...INPUT, format: FEET },
  'input-percent': { ...INPUT, format: AS_IT_IS },
  'input-money': { ...INPUT, format: MONEY },
  'input-unit-price': { ...INPUT, format: UNIT_PRICE },
  'input-text': { ...INPUT, side: 'left' },
  'foot-label': FOOT,
  'foot-money': { ...FOOT, format: MONEY, side: 'right' },
  'foot-hours': { ...FOOT, format: TWO_DECIMALS, side: 'right' },
  'foot-count': { ...FOOT, format: WHOLE, side: 'right' },
  'total-label': TOTAL,
  'total-money': { ...TOTAL, format: MONEY, side: 'right' },
}

/** The format of a cell whose content stays text, even when somebody edits it. */
const STAYS_TEXT = '@'

function styleOf(name: StyleName, look: Look): Partial<Style> {
  const { points, wraps } = textLook(name)
  return {
    numFmt: look.format ?? (look.side === 'right' ? WORDS_RIGHT : 'General'),
    font: fontOf(look, points),
    ...(look.fill ? { fill: fillOf(look.fill) } : {}),
    ...(look.above || look.below ? { border: bordersOf(look) } : {}),
    alignment: { vertical: 'top', horizontal: look.side ?? 'left', wrapText: wraps },
  }
}

function fontOf({ face = WORDS, bold = false, colour = COLOUR.ink }: Look, size: number): Partial<Font> {
  return { name: face, size, bold, color: { argb: colour } }
}

function fillOf(colour: string): Fill {
  return { type: 'pattern', pattern: 'solid', fgColor: { argb: colour } }
}

function bordersOf({ above, below, ruleColour = COLOUR.mortar }: Look): Partial<Borders> {
  const rule = (style: 'hair' | 'thin' | 'medium') => ({ style, color: { argb: ruleColour } })
  return { ...(above ? { top: rule(above) } : {}), ...(below ? { bottom: rule(below) } : {}) }
}

const LOOKED = Object.entries(LOOKS) as [StyleName, Look][]
/** One object a name: the writer finds a style it has seen by identity. */
const STYLES = new Map(LOOKED.map(([name, look]) => [name, styleOf(name, look)]))
const TEXT_STYLES = new Map(LOOKED.map(([name, look]) => [name, { ...styleOf(name, look), numFmt: STAYS_TEXT }]))

/** Fonts, fills, rules and number format of a style name; `staysText` for content that a spreadsheet would take for a formula. */
export function workbookStyle(name: StyleName, staysText: boolean): Partial<Style> {
  const style = (staysText ? TEXT_STYLES : STYLES).get(name)
  if (!style) throw new RangeError(`There is no style ${name}`)
  return style
}
