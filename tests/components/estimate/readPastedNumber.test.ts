import { describe, expect, it } from 'vitest'
import { readPastedNumber } from '../../../src/composables/readPastedNumber.ts'

describe('readPastedNumber', () => {
  it.each([
    ['12', 12],
    ['12.5', 12.5],
    ['.5', 0.5],
    ['$1,234.50', 1234.5],
    ['$ 12', 12],
    ['1 234,50', 1234.5],
    ['1\u00a0234,5', 1234.5],
    ['1.234,50', 1234.5],
    ['1,234', 1234],
    ['1,234,567', 1234567],
    ['1.234.567', 1234567],
    ['12,5', 12.5],
    ['0,125', 0.125],
    ['-3', -3],
    ['12\' 6"', 12.5],
    ['6"', 0.5],
  ])('reads %j as %d', (text, value) => {
    expect(readPastedNumber(text)).toBe(value)
  })

  it.each(['', 'abc', 'floor_area', '(40)', '1,2,3.4.5', '12 6', "12'' 6", '1e9'])('finds no number in %j', (text) => {
    expect(readPastedNumber(text)).toBeNull()
  })
})
