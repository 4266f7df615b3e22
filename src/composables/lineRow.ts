import { toLineInput, type LineFigures, type LineInput } from '../../shared/engine/index.ts'
import { lineFieldsSchema, type Line, type LineFields } from '../../shared/schemas/estimate.ts'
import { isSame, type FieldConflict } from './mergeFields.ts'

export type LineField = keyof LineFields

/**
 * How far a line's changes have got: `waiting` for a connection, `refused` by the server with words, `at-odds` with somebody else's change of the same
 * field, `gone` because somebody removed the line that was changed here.
 */
export type LineState = 'saved' | 'saving' | 'waiting' | 'refused' | 'at-odds' | 'gone'

/** What was keyed and can't be taken: it stays in the cell, and the value before it still counts. */
export interface WrongEntry {
  text: string
  words: string
}

/** A line as the page holds it. One object a line, changed in place: the grid finds it by `key`. */
export interface LineRow {
  kind: 'line'
  /** The line's id, or for one added on this page a key of its own that stays when the server gives it an id. */
  readonly key: string
  id: string | null
  version: number
  /** As shown: what is saved with what isn't yet. */
  fields: LineFields
  /** As the server has it; `null` until it is there. */
  saved: LineFields | null
  book: Line['book']
  /** Fields that are being typed and aren't kept: the figures are those of the line with them. */
  previewed: Partial<LineFields> | null
  figures: LineFigures
  /** Taken out here, and whether the server has taken it out; both may be put back. */
  isRemoved: boolean
  isRemovedAtServer: boolean
  state: LineState
  /** Why it isn't saved, in words. */
  problem: string
  conflicts: readonly FieldConflict[]
  wrong: Partial<Record<LineField, WrongEntry>>
}

const FIELD_NAMES = Object.keys(lineFieldsSchema.shape) as LineField[]

/** The part of a line that a person keys. */
export function fieldsOfLine(line: LineFields): LineFields {
  return Object.fromEntries(FIELD_NAMES.map((name) => [name, line[name]])) as LineFields
}

/** The fields of `to` that differ from `from`. */
export function changedFields(from: LineFields, to: LineFields): Partial<LineFields> {
  return Object.fromEntries(FIELD_NAMES.filter((name) => !isSame(from[name], to[name])).map((name) => [name, to[name]]))
}

/** A row for a line that the server has; the model computes its figures. */
export function rowOfLine(line: Line, figures: LineFigures): LineRow {
  const fields = fieldsOfLine(line)
  return { ...rowStart(line.id, fields, line.book, figures), id: line.id, version: line.version, saved: fields }
}

/** A row for a line that is being added on this page. */
export function newRow(key: string, fields: LineFields, book: Line['book'], figures: LineFigures): LineRow {
  return { ...rowStart(key, fields, book, figures), state: 'saving' }
}

function rowStart(key: string, fields: LineFields, book: Line['book'], figures: LineFigures): LineRow {
  return {
    kind: 'line',
    key,
    id: null,
    version: 0,
    fields,
    saved: null,
    book,
    previewed: null,
    figures,
    isRemoved: false,
    isRemovedAtServer: false,
    state: 'saved',
    problem: '',
    conflicts: [],
    wrong: {},
  }
}

/** What the engine computes a line from. */
export function lineInputOf(key: string, fields: LineFields, book: Line['book']): LineInput {
  return toLineInput({ ...fields, book, id: key })
}
