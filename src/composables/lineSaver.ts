import { ProblemError } from '../api/ProblemError.ts'
import type { Line, LineFields, LinePatch, NewLine, SavedLine } from '../../shared/schemas/estimate.ts'
import { changedFields, type LineRow } from './lineRow.ts'
import { adoptAnswer, mergeLine } from './mergeLine.ts'
import { isSame } from './mergeFields.ts'

/** The calls that lines are saved with (`api/estimates.ts`). */
export interface LineCalls {
  addLine(estimateId: string, line: NewLine, idempotencyKey: string): Promise<SavedLine>
  updateLine(line: Pick<Line, 'id' | 'estimateId' | 'version'>, patch: LinePatch): Promise<SavedLine>
  removeLine(line: Pick<Line, 'id' | 'estimateId' | 'version'>): Promise<SavedLine>
  restoreLine(line: Pick<Line, 'id' | 'estimateId'>): Promise<SavedLine>
}

interface LineSaverOptions {
  estimateId: string
  calls: LineCalls
  /** Id of the nearest line above that the server has; `null` when there is none. */
  savedIdAbove(row: LineRow): string | null
  newKey(): string
  /** The row heard from the server: `adopted` are the fields that now show something else, `estimateVersion` what our own write made of the whole. */
  onAnswer(row: LineRow, adopted: Partial<LineFields>, estimateVersion: number | null): void
}

export type SaveStep = 'add' | 'restore' | 'remove' | 'update'
/** `later`: the connection or the server failed, try again after a while. */
export type StepOutcome = 'done' | 'later'

/**
 * Brings one line at a time from where the server has it to where the page has it. What is to be sent is read off the row at the moment of sending,
 * so undoing, redoing and typing on while a write is under way or the connection is gone all end in the same place.
 */
export function createLineSaver({ estimateId, calls, savedIdAbove, newKey, onAnswer }: LineSaverOptions) {
  const firstTries = new Map<string, { idempotencyKey: string; fields: LineFields; afterLineId: string | null }>()
  /** What the server refused; it is not sent again until something in it changes. */
  const refused = new Map<string, unknown>()

  function nextStep(row: LineRow): SaveStep | null {
    if (row.state === 'gone') return null
    if (row.isRemoved) return row.id !== null && !row.isRemovedAtServer ? 'remove' : null
    const intent = row.id === null ? 'add' : row.isRemovedAtServer ? 'restore' : hasPatch(row) ? 'update' : null
    const isRefused = intent !== null && refused.has(row.key) && isSame(refused.get(row.key), row.fields)
    return isRefused ? null : intent
  }

  async function take(row: LineRow, step: SaveStep): Promise<StepOutcome> {
    try {
      const { answer, sent } = await send(row, step)
      refused.delete(row.key)
      row.problem = ''
      row.isRemovedAtServer = step === 'remove'
      const adopted = adoptAnswer(row, sent, answer.line)
      row.state = restingState(row)
      onAnswer(row, adopted, answer.estimateVersion)
      return 'done'
    } catch (error) {
      return explain(row, step, error)
    }
  }

  /** The answer, and the fields that the server knew of when it gave it. */
  async function send(row: LineRow, step: SaveStep): Promise<{ answer: SavedLine; sent: LineFields }> {
    const ref = { estimateId, id: row.id ?? '', version: row.version }
    const before = row.saved ?? row.fields
    switch (step) {
      case 'add':
        return sendNew(row)
      case 'restore':
        return { answer: await calls.restoreLine(ref), sent: before }
      case 'remove':
        return { answer: await calls.removeLine(ref), sent: before }
      case 'update': {
        const patch = patchOf(row)
        return { answer: await calls.updateLine(ref, patch), sent: { ...before, ...patch } }
      }
    }
  }

  /** A repeat sends the very body of the first try under its key: what changed since goes after it as a patch. */
  async function sendNew(row: LineRow): Promise<{ answer: SavedLine; sent: LineFields }> {
    const first = firstTries.get(row.key) ?? { idempotencyKey: newKey(), fields: row.fields, afterLineId: savedIdAbove(row) }
    firstTries.set(row.key, first)
    const answer = await calls.addLine(estimateId, { ...first.fields, afterLineId: first.afterLineId }, first.idempotencyKey)
    firstTries.delete(row.key)
    return { answer, sent: first.fields }
  }

  function explain(row: LineRow, step: SaveStep, error: unknown): StepOutcome {
    if (!(error instanceof ProblemError)) throw error
    row.problem = error.message
    const isPassing =
      error.isUnreachable || error.status >= 500 || error.status === 429 || error.status === 401 || error.code === 'in-progress'
    if (isPassing) {
      row.state = 'waiting'
      return 'later'
    }
    if (error.isStale && isLine(error.current)) return followStale(row, step, error.current)
    if (error.status === 404 && row.id !== null) return followGone(row)
    firstTries.delete(row.key)
    refused.set(row.key, row.fields)
    row.state = 'refused'
    return 'done'
  }

  function followStale(row: LineRow, step: SaveStep, current: Line): StepOutcome {
    row.problem = ''
    const adopted = mergeLine(row, current)
    // Nobody has to choose between two values of a line that is on its way out.
    if (step === 'remove') row.conflicts = []
    row.state = restingState(row)
    onAnswer(row, adopted, null)
    return 'done'
  }

  function followGone(row: LineRow): StepOutcome {
    row.isRemovedAtServer = true
    row.state = row.isRemoved ? 'saved' : 'gone'
    row.problem = row.isRemoved ? '' : 'Somebody removed this line while you changed it.'
    return 'done'
  }

  function restingState(row: LineRow): LineRow['state'] {
    if (row.conflicts.length > 0) return 'at-odds'
    return nextStep(row) === null ? 'saved' : 'saving'
  }

  function hasPatch(row: LineRow): boolean {
    return Object.keys(patchOf(row)).length > 0
  }

  /** What was changed here and isn't at odds with somebody. */
  function patchOf(row: LineRow): LinePatch {
    if (row.saved === null) return {}
    const atOdds = new Set(row.conflicts.map(({ path }) => path))
    return Object.fromEntries(Object.entries(changedFields(row.saved, row.fields)).filter(([name]) => !atOdds.has(name)))
  }

  return { nextStep, take, restingState }
}

function isLine(value: unknown): value is Line {
  return typeof value === 'object' && value !== null && 'quantity' in value && 'version' in value
}
