import { formatLength } from './formatLength.ts'
import { plainNotation } from './lengthNotation.ts'

const FORMS = '`12\' 6"` or `12.5`'
const QUOTED_MAX = 24

/** What was typed, between back-ticks, cut short where it is long. */
export function quoted(text: string): string {
  const shown = text.trim()
  return `\`${shown.length > QUOTED_MAX ? `${shown.slice(0, QUOTED_MAX)}…` : shown}\``
}

/** A sentence on why a text is no length, and what would be taken instead. Only for text that `parseLength` refuses. */
export function explainLength(text: string): string {
  const plain = plainNotation(text)
  const said = quoted(text)
  if (plain === '') return `Nothing is keyed. Write ${FORMS}.`
  if (/^-/.test(plain)) return `${said} is below zero. A length is more than zero: write ${withoutSign(text)}.`
  if (/\de[+-]?\d/.test(plain)) return `${said} has an exponent. Write the digits out, as ${FORMS}.`
  if (/\d,\d{3}(?!\d)/.test(plain))
    return `${said} could be read with a decimal comma or with thousands. Write it with a point and without commas.`
  if (hasTwoInchMarks(plain)) return `${said} has two inch marks. Write ${suggestion(plain)}.`
  if ((plain.match(/'/g) ?? []).length > 1) return `${said} has two foot marks. Write ${suggestion(plain)}.`
  if (/\//.test(plain)) return explainFraction(plain, said)
  const tooManyInches = /^(\d+)[^\d.]+(\d+(?:\.\d+)?)[^\d]*$/.exec(plain)
  if (tooManyInches && Number(tooManyInches[2]) >= 12 && !/^\d+ \d/.test(plain)) return explainInches(said, tooManyInches)
  if (/^\d+[.]\d+[^\d.]+\d/.test(plain)) return `${said} has a part of a foot and inches as well. Write ${FORMS}.`
  if (/^\d+ \d+"?$/.test(plain)) return `${said} does not say what is feet. Write ${suggestion(plain)}.`
  return `${said} is not a length. Write ${FORMS}.`
}

function withoutSign(text: string): string {
  return quoted(text.trim().replace(/^[-‐‑‒–—−]\s*/, ''))
}

function hasTwoInchMarks(plain: string): boolean {
  return plain.includes("''") || (plain.match(/"/g) ?? []).length > 1
}

/** The same two numbers as feet and inches, where they can be; the general forms otherwise. */
function suggestion(plain: string): string {
  const numbers = /^(\d+)\D+(\d+)\D*$/.exec(plain)
  const feet = Number(numbers?.[1])
  const inches = Number(numbers?.[2])
  const canBeFeetAndInches = numbers !== null && inches < 12 && feet <= 2640
  if (!canBeFeetAndInches) return FORMS
  const decimal = feet + inches / 12
  const isShort = Number.isInteger(decimal * 4)
  return isShort ? `\`${feet}' ${inches}"\` or \`${decimal}\`` : `\`${feet}' ${inches}"\``
}

function explainInches(said: string, [, feet, inches]: RegExpExecArray): string {
  const whole = Number(feet) * 12 + Number(inches)
  return `${said} has ${inches} inches after the feet; a foot has 12. Write \`${formatLength(whole)}\`, or all of it in inches.`
}

function explainFraction(plain: string, said: string): string {
  if (/\/ ?0+(?!\d)/.test(plain)) return `${said} has a fraction over zero. Write \`6 1/2"\`.`
  if (/^\d+( |-)?\d* ?\/ ?\d+$/.test(plain))
    return `${said} does not say what is feet and what is inches. Write \`6 1/2"\` or \`12' 6 1/2"\`.`
  return `${said} has a fraction that can't be read. Write one that is less than an inch, as \`12' 6 1/2"\`.`
}
