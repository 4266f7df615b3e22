import type { Line, LineFields } from '../../shared/schemas/estimate.ts'
import { changedFields, fieldsOfLine, type LineField, type LineRow } from './lineRow.ts'
import { isSame, mergeFields, type FieldConflict } from './mergeFields.ts'

/** A price with its reason is one value: half of one and half of another would be nobody's. */
interface Mergeable extends Omit<LineFields, 'override'> {
  override: [LineFields['override']]
}

function mergeable(fields: LineFields): Mergeable {
  return { ...fields, override: [fields.override] }
}

/**
 * Takes a line as somebody else left it into the row: fields that only they changed are theirs, fields that only we changed stay ours and are
 * sent again, fields that both changed keep our value on the screen and are named in `conflicts` until a person chooses.
 * Answers with the fields that now show something else.
 */
export function mergeLine(row: LineRow, line: Line): Partial<LineFields> {
  const theirs = fieldsOfLine(line)
  const shown = row.fields
  const { merged, conflicts } = mergeFields(mergeable(row.saved ?? shown), mergeable(shown), mergeable(theirs))
  row.fields = { ...merged, override: merged.override[0] }
  for (const { path } of conflicts) keepMine(row, shown, path as LineField)
  row.conflicts = [
    ...unsettled(row, theirs),
    ...conflicts.map((conflict) => (conflict.path === 'override' ? unwrapped(conflict) : conflict)),
  ]
  takeSaved(row, line, theirs)
  row.book = line.book
  return changedFields(shown, row.fields)
}

/** Takes the server's answer to our own write: what was changed here since it was sent (`sent`) stays. */
export function adoptAnswer(row: LineRow, sent: LineFields, line: Line): Partial<LineFields> {
  const theirs = fieldsOfLine(line)
  const shown = row.fields
  row.fields = { ...theirs, ...changedFields(sent, shown) }
  takeSaved(row, line, theirs)
  row.book = line.book
  return changedFields(shown, row.fields)
}

/** Settles a field that two people changed. */
export function settleConflict(row: LineRow, field: LineField, choice: 'mine' | 'theirs'): void {
  const conflict = row.conflicts.find(({ path }) => path === field)
  if (!conflict) return
  row.conflicts = row.conflicts.filter(({ path }) => path !== field)
  if (choice === 'theirs') row.fields = { ...row.fields, [field]: conflict.theirs }
}

/** Conflicts from before that the line, as it stands now, has not made go away. */
function unsettled(row: LineRow, theirs: LineFields): FieldConflict[] {
  return row.conflicts
    .map((conflict) => ({ ...conflict, theirs: theirs[conflict.path as LineField] }))
    .filter(({ path, mine, theirs: other }) => isSame(row.saved?.[path as LineField], other) && !isSame(mine, other))
}

function keepMine(row: LineRow, shown: LineFields, field: LineField): void {
  row.fields = { ...row.fields, [field]: shown[field] }
}

function takeSaved(row: LineRow, line: Line, fields: LineFields): void {
  row.id = line.id
  row.version = line.version
  row.saved = fields
}

function unwrapped<T extends { mine: unknown; theirs: unknown }>(conflict: T): T {
  return { ...conflict, mine: (conflict.mine as unknown[])[0], theirs: (conflict.theirs as unknown[])[0] }
}
