import type { EstimateSettings, Line, LineFields } from '../../shared/schemas/estimate.ts'
import type { LineField, WrongEntry } from './lineRow.ts'

/** What one line was and becomes, field by field. Lines go by the key that they have on this page (`LineRow.key`). */
export interface LineEdit {
  key: string
  before: Partial<LineFields>
  after: Partial<LineFields>
}

/** A line with its place: below `afterKey`, or first. */
export interface PlacedLine {
  key: string
  afterKey: string | null
  fields: LineFields
  book: Line['book']
}

/** What was keyed into a cell and couldn't be taken, before and after a step. */
export interface CellMark {
  key: string
  field: LineField
  before: WrongEntry | null
  after: WrongEntry | null
}

/** Everything that a person can do to an estimate, as data that can be turned round. */
export type EstimateChange =
  | { kind: 'edit'; edits: readonly LineEdit[] }
  | { kind: 'mark'; marks: readonly CellMark[] }
  | { kind: 'add'; lines: readonly PlacedLine[] }
  | { kind: 'remove'; lines: readonly PlacedLine[] }
  | { kind: 'order'; before: readonly string[]; after: readonly string[] }
  | { kind: 'settings'; before: Partial<EstimateSettings>; after: Partial<EstimateSettings> }

/** What a person would call one step, however many changes it took. */
export interface EstimateCommand {
  /** Ends the sentence "Undone: …": "paste of 12 lines". */
  words: string
  changes: readonly EstimateChange[]
}

/** The change that takes a change back. */
export function invertChange(change: EstimateChange): EstimateChange {
  switch (change.kind) {
    case 'edit':
      return { kind: 'edit', edits: change.edits.map(({ key, before, after }) => ({ key, before: after, after: before })).reverse() }
    case 'mark':
      return { kind: 'mark', marks: change.marks.map(({ key, field, before, after }) => ({ key, field, before: after, after: before })) }
    case 'add':
      return { kind: 'remove', lines: change.lines }
    case 'remove':
      return { kind: 'add', lines: change.lines }
    case 'order':
      return { kind: 'order', before: change.after, after: change.before }
    case 'settings':
      return { kind: 'settings', before: change.after, after: change.before }
  }
}

/** The command that takes a command back: its changes turned round, last first. */
export function invertCommand(command: EstimateCommand): EstimateCommand {
  return { words: command.words, changes: command.changes.map(invertChange).reverse() }
}
