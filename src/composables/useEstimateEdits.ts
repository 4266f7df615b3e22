import { newIdempotencyKey } from '../api/http.ts'
import type { EstimateSettings, Line, LineFields } from '../../shared/schemas/estimate.ts'
import type { PriceItem } from '../../shared/schemas/priceItem.ts'
import type { EstimateCommand, LineEdit, PlacedLine } from './estimateChange.ts'
import type { EstimateModel } from './estimateModel.ts'
import type { LineField, WrongEntry } from './lineRow.ts'
import { isSame } from './mergeFields.ts'
import { moveLines } from './moveLines.ts'
import { useLineHistory } from './useLineHistory.ts'

interface EditsOptions {
  model: EstimateModel
  /** The price item of a line, once the price book has been read. */
  findItem(itemKey: string): PriceItem | undefined
}

/** A line that is to be added. */
export interface LineToAdd {
  fields: LineFields
  book: Line['book']
}

/** Everything that a person does to the lines, each as one step of the history. */
export function useEstimateEdits({ model, findItem }: EditsOptions) {
  const history = useLineHistory(model.apply)

  /** Changes fields of lines, all as one step. Answers with the step, or `null` when nothing differs. */
  function edit(changes: readonly { key: string; after: Partial<LineFields> }[], words: string): EstimateCommand | null {
    const edits = changes.flatMap(({ key, after }) => asEdit(key, after))
    if (edits.length === 0) return null
    return run({ words, changes: [{ kind: 'edit', edits }] })
  }

  function asEdit(key: string, after: Partial<LineFields>): LineEdit[] {
    const row = model.list.find(key)
    if (!row) return []
    const full = withItsQuantity(row.fields, after)
    const names = (Object.keys(full) as LineField[]).filter(
      (name) => row.wrong[name] !== undefined || !isSame(full[name], row.fields[name]),
    )
    if (names.length === 0) return []
    const pick = (fields: Partial<LineFields>) => Object.fromEntries(names.map((name) => [name, fields[name]]))
    return [{ key, before: pick(row.fields), after: pick(full) }]
  }

  /** Between a room and the house the item's formula goes along while nobody has changed it, as the server does it. */
  function withItsQuantity(fields: LineFields, after: Partial<LineFields>): Partial<LineFields> {
    const isMove = after.roomId !== undefined && (after.roomId === null) !== (fields.roomId === null)
    const item = isMove && after.quantity === undefined && fields.itemKey !== null ? findItem(fields.itemKey) : undefined
    if (!item) return after
    const suggested = (roomId: string | null) => (roomId === null ? item.houseFormula : item.roomFormula) ?? '1'
    return fields.quantity === suggested(fields.roomId) ? { ...after, quantity: suggested(after.roomId ?? null) } : after
  }

  /** Lines with keys and places of their own, one below the other, below `afterKey` (`null`: at the end). */
  function place(lines: readonly LineToAdd[], afterKey: string | null): PlacedLine[] {
    let above = afterKey ?? model.list.rows().at(-1)?.key ?? null
    return lines.map(({ fields, book }) => {
      const line = { key: `new-${newIdempotencyKey()}`, afterKey: above, fields, book }
      above = line.key
      return line
    })
  }

  /** Adds lines below another. Answers with their keys. */
  function add(lines: readonly LineToAdd[], afterKey: string | null, words: string): string[] {
    const placed = place(lines, afterKey)
    run({ words, changes: [{ kind: 'add', lines: placed }] })
    return placed.map(({ key }) => key)
  }

  /** Marks what was keyed into a cell and can't be taken. */
  function mark(key: string, field: LineField, after: WrongEntry): void {
    const before = model.list.find(key)?.wrong[field] ?? null
    run({ words: 'entry that couldn’t be taken', changes: [{ kind: 'mark', marks: [{ key, field, before, after }] }] })
  }

  function remove(keys: readonly string[], words: string): EstimateCommand | null {
    const wanted = new Set(keys)
    const lines = model.list
      .rows()
      .filter(({ key }) => wanted.has(key))
      .map(({ key, fields, book }) => ({ key, fields, book, afterKey: model.list.keyBefore(key) }))
    return lines.length === 0 ? null : run({ words, changes: [{ kind: 'remove', lines }] })
  }

  /** Moves lines one place up (-1) or down (1) among `shown`, the lines of their group; answers whether there was a place. */
  function move(keys: readonly string[], step: -1 | 1, shown: readonly string[]): boolean {
    const before = model.list.keys()
    const after = moveLines(before, keys, step, shown)
    if (after === null) return false
    run({ words: keys.length === 1 ? 'move of a line' : `move of ${keys.length} lines`, changes: [{ kind: 'order', before, after }] })
    return true
  }

  function changeSettings(after: Partial<EstimateSettings>): void {
    const settings = model.estimate.value.settings
    const before = Object.fromEntries((Object.keys(after) as (keyof EstimateSettings)[]).map((name) => [name, settings[name]]))
    run({ words: 'change of the settings', changes: [{ kind: 'settings', before, after }] })
  }

  function run(command: EstimateCommand): EstimateCommand {
    history.run(command)
    return command
  }

  return { edit, place, add, mark, remove, move, changeSettings, run, history }
}

export type EstimateEdits = ReturnType<typeof useEstimateEdits>
