import type { SystemKey } from './houseSystems.ts'

/** A danger that the work can bring, said where the choice is made and on every document. */
export interface Caution {
  key: string
  title: string
  text: string
  /** House systems whose work brings it up. */
  systems: readonly SystemKey[]
  /** Applies to houses built before this year; an unknown year counts as before. */
  appliesBeforeYear?: number
  /** Applies to houses built in this year or later; an unknown year does not count. */
  appliesFromYear?: number
  /** The standard or regulation that the caution rests on. */
  source: string
  /** Said on every estimate, whatever its lines. */
  always?: boolean
}
