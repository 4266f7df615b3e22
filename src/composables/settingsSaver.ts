import { shallowRef } from 'vue'
import { ProblemError } from '../api/ProblemError.ts'
import type { Estimate, EstimatePatch, EstimateSettings } from '../../shared/schemas/estimate.ts'
import type { StepOutcome } from './lineSaver.ts'
import { isSame, mergeFields, type FieldConflict } from './mergeFields.ts'

interface SettingsSaverOptions {
  initial: Estimate
  updateEstimate(estimate: Pick<Estimate, 'id' | 'version'>, patch: EstimatePatch): Promise<Estimate>
  /** Settings came from the server that aren't those on the screen. */
  onSettings(settings: EstimateSettings): void
  onVersion(version: number): void
}

/** Keeps the estimate's settings: what is shown, what the server has, and what is still to be sent. */
export function createSettingsSaver({ initial, updateEstimate, onSettings, onVersion }: SettingsSaverOptions) {
  const estimate = shallowRef(initial)
  const conflicts = shallowRef<readonly FieldConflict[]>([])
  const problem = shallowRef('')
  let saved = initial
  let refused: EstimateSettings | null = null

  function change(patch: Partial<EstimateSettings>): void {
    estimate.value = { ...estimate.value, settings: { ...estimate.value.settings, ...patch } }
    problem.value = ''
  }

  function patch(): Partial<EstimateSettings> {
    const names = Object.keys(estimate.value.settings) as (keyof EstimateSettings)[]
    const atOdds = new Set(conflicts.value.map(({ path }) => path))
    const changed = names.filter((name) => !atOdds.has(name) && !isSame(saved.settings[name], estimate.value.settings[name]))
    return Object.fromEntries(changed.map((name) => [name, estimate.value.settings[name]]))
  }

  function hasUnsent(): boolean {
    return refused !== estimate.value.settings && Object.keys(patch()).length > 0
  }

  async function send(): Promise<StepOutcome> {
    try {
      const answer = await updateEstimate({ id: saved.id, version: saved.version }, { settings: patch() })
      take(answer)
      onVersion(answer.version)
      return 'done'
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error
      if (error.isUnreachable || error.status >= 500 || error.status === 429 || error.status === 401) return 'later'
      if (error.isStale && isEstimate(error.current)) {
        take(error.current)
        return 'done'
      }
      refused = estimate.value.settings
      problem.value = error.message
      return 'done'
    }
  }

  /** Takes the estimate as it stands at the server; what was changed here since is kept, what both changed is asked about. */
  function take(fresh: Estimate): void {
    const shown = estimate.value.settings
    const merge = mergeFields(asValues(saved.settings), asValues(shown), asValues(fresh.settings))
    const settings = asSettings(merge.merged)
    const atOdds = merge.conflicts.map(({ path, mine, theirs }) => ({ path, mine: unwrap(mine), theirs: unwrap(theirs) }))
    const mine = Object.fromEntries(atOdds.map(({ path }) => [path, shown[path as keyof EstimateSettings]]))
    conflicts.value = [...conflicts.value.filter(({ path }) => !atOdds.some((fresher) => fresher.path === path)), ...atOdds]
    saved = fresh
    estimate.value = { ...fresh, settings: { ...settings, ...mine } }
    if (!isSame(shown, estimate.value.settings)) onSettings(estimate.value.settings)
  }

  function settle(path: string, choice: 'mine' | 'theirs'): void {
    const conflict = conflicts.value.find((other) => other.path === path)
    conflicts.value = conflicts.value.filter((other) => other !== conflict)
    if (conflict && choice === 'theirs') change({ [path]: conflict.theirs })
  }

  return { estimate, conflicts, problem, change, hasUnsent, send, take, settle }
}

/** Each setting is one value: a rule of one person with a percentage of another would be nobody's. */
function asValues(settings: EstimateSettings): Record<string, unknown> {
  return Object.fromEntries(Object.entries(settings).map(([name, value]) => [name, [value]]))
}

function asSettings(values: Record<string, unknown>): EstimateSettings {
  return Object.fromEntries(Object.entries(values).map(([name, value]) => [name, unwrap(value)])) as EstimateSettings
}

function unwrap(value: unknown): unknown {
  return Array.isArray(value) ? value[0] : value
}

function isEstimate(value: unknown): value is Estimate {
  return typeof value === 'object' && value !== null && 'settings' in value && 'version' in value
}
