import type { Basis } from '../../schemas/estimate.ts'

const WORDS: Record<Basis, string> = { 'own-hands': 'own hands', hired: 'hired' }

/** How the sheets write a basis; the sums by basis look for these words. */
export function basisWords(basis: Basis): string {
  return WORDS[basis]
}
