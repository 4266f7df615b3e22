import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { primeTheme } from '../../src/assets/primeTheme.ts'

/** Parts of PrimeVue that bring no look of their own. */
const PLAIN = ['config', 'menuitem']

function usedPrimeComponents(): string[] {
  const files = readdirSync('src', { recursive: true, encoding: 'utf8' }).filter((name) => /\.(vue|ts)$/.test(name))
  const imports = files.flatMap((name) => [...readFileSync(join('src', name), 'utf8').matchAll(/['"]primevue\/([a-z]+)['"]/g)])
  return [...new Set(imports.map((match) => match[1]!))].filter((name) => !PLAIN.includes(name))
}

describe('primeTheme', () => {
  it('themes each component of PrimeVue that the app uses, and no other', () => {
    const themed = Object.keys((primeTheme as { components: object }).components)
    expect(usedPrimeComponents().sort()).toEqual(themed.sort())
  })

  it('names colours by the tokens alone, so that it follows a change of theme', () => {
    const { colorScheme } = (primeTheme as { semantic: { colorScheme: { light: { surface: object; primary: object } } } }).semantic
    for (const colour of Object.values({ ...colorScheme.light.surface, ...colorScheme.light.primary })) expect(colour).toMatch(/^var\(--/)
  })
})
