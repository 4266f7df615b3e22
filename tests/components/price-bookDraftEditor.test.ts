import { describe, expect, it, vi } from 'vitest'
import { ProblemError } from '../../src/api/ProblemError.ts'
import { createDraftEditor, fieldsOf, type DraftCalls } from '../../src/components/price-book/draftEditor.ts'
import type { PriceItem, PriceItemPatch } from '../../shared/schemas/priceItem.ts'
import { buildPriceItem } from '../support/buildPriceItem.ts'

const plank = buildPriceItem()
const paint = buildPriceItem({ key: 'walls/paint', name: 'Wall paint' })
const BASE = { key: plank.key, regionKey: null }
const HARBOR = { key: plank.key, regionKey: 'merrow-harbor' }

/** A server that holds rows and checks their versions, as the real one does. */
function fakeDraft(rows: PriceItem[]) {
  const held = new Map(rows.map((row) => [row.key, row]))
  const refusals: unknown[] = []
  const calls = {
    update: vi.fn(async ({ key, rowVersion }: { key: string; rowVersion: number }, patch: PriceItemPatch) => {
      const refusal = refusals.shift()
      if (refusal) throw refusal
      const row = held.get(key)
      if (!row || row.rowVersion !== rowVersion)
        throw new ProblemError({ status: 412, code: 'stale', detail: 'Somebody was quicker.', current: row })
      const saved = { ...row, ...patch, rowVersion: rowVersion + 1 }
      held.set(key, saved)
      return saved
    }),
    add: vi.fn(async (fields: Parameters<DraftCalls['add']>[0]) => ({ ...fields, rowVersion: 1 })),
    drop: vi.fn(async () => {}),
  } satisfies DraftCalls
  const sayProblem = vi.fn()
  const editor = createDraftEditor(calls, sayProblem)
  editor.take(null, rows)
  return { editor, calls, held, refusals, sayProblem }
}

describe('createDraftEditor', () => {
  it('shows what was keyed at once and saves it against the row’s version', async () => {
    const { editor, calls } = fakeDraft([plank])
    const saving = editor.key(BASE, 'wastePercent', '12')
    expect(editor.rowOf(BASE)?.wastePercent).toBe(12)
    await saving
    expect(calls.update).toHaveBeenCalledWith(expect.objectContaining({ ...BASE, rowVersion: 1 }), { wastePercent: 12 })
    expect(editor.rowOf(BASE)).toMatchObject({ wastePercent: 12, rowVersion: 2 })
  })

  it('saves edits of one row one after the other, each on top of the one before', async () => {
    const { editor, held } = fakeDraft([plank])
    await Promise.all([editor.key(BASE, 'wastePercent', '12'), editor.key(BASE, 'note', 'Two at once')])
    expect(held.get(plank.key)).toMatchObject({ wastePercent: 12, note: 'Two at once', rowVersion: 3 })
  })

  it('holds a wrong entry in its cell and leaves the row as it was', async () => {
    const { editor, calls } = fakeDraft([plank])
    await editor.key(BASE, 'installed.low', '-1')
    expect(calls.update).not.toHaveBeenCalled()
    expect(editor.heldCells(null)).toEqual([expect.objectContaining({ field: 'installed.low', text: '-1' })])
    editor.discard(BASE, 'installed.low')
    expect(editor.heldCells(null)).toEqual([])
  })

  describe('when somebody else saved the row meanwhile', () => {
    it('saves over it where they changed other fields', async () => {
      const { editor, held } = fakeDraft([plank])
      held.set(plank.key, { ...plank, note: 'Theirs', rowVersion: 2 })
      await editor.key(BASE, 'wastePercent', '12')
      expect(editor.rowOf(BASE)).toMatchObject({ note: 'Theirs', wastePercent: 12, rowVersion: 3 })
      expect(editor.heldCells(null)).toEqual([])
    })

    it('keeps both values where they changed the same', async () => {
      const { editor, held } = fakeDraft([plank])
      held.set(plank.key, { ...plank, wastePercent: 15, rowVersion: 2 })
      await editor.key(BASE, 'wastePercent', '12')
      expect(editor.rowOf(BASE)?.wastePercent).toBe(15)
      expect(editor.heldCells(null)).toEqual([expect.objectContaining({ text: '12', problem: expect.stringContaining('15 %') })])
      await editor.key(BASE, 'wastePercent', '12')
      expect(held.get(plank.key)?.wastePercent).toBe(12)
      expect(editor.heldCells(null)).toEqual([])
    })
  })

  it('keeps what was keyed when the server can’t be reached, and says so', async () => {
    const { editor, refusals, sayProblem } = fakeDraft([plank])
    refusals.push(new ProblemError({ status: 0, code: 'unreachable', detail: 'Can’t be reached.' }))
    await editor.key(BASE, 'wastePercent', '12')
    expect(editor.rowOf(BASE)?.wastePercent).toBe(10)
    expect(editor.heldCells(null)).toEqual([expect.objectContaining({ text: '12', problem: 'Can’t be reached.' })])
    expect(sayProblem).toHaveBeenCalledOnce()
  })

  it('undoes the last edits, one by one', async () => {
    const { editor, held } = fakeDraft([plank, paint])
    await editor.key(BASE, 'wastePercent', '12')
    await editor.key({ key: paint.key, regionKey: null }, 'note', 'Flat')
    await editor.undo()
    expect(held.get(paint.key)?.note).toBe(paint.note)
    expect(held.get(plank.key)?.wastePercent).toBe(12)
    await editor.undo()
    expect(held.get(plank.key)?.wastePercent).toBe(10)
    expect(editor.canUndo.value).toBe(false)
    expect(await editor.undo()).toBeNull()
  })

  it('adds an item, and takes it out again with an undo', async () => {
    const { editor, calls } = fakeDraft([plank])
    const oak = fieldsOf(buildPriceItem({ key: 'floor/oak', name: 'Oak strip' }))
    await editor.add(oak)
    expect(editor.rowOf({ key: oak.key, regionKey: null })?.name).toBe('Oak strip')
    await editor.undo()
    expect(calls.drop).toHaveBeenCalledWith(expect.objectContaining({ key: oak.key, rowVersion: 1 }))
    expect(editor.rowOf({ key: oak.key, regionKey: null })).toBeUndefined()
  })

  it('brings a dropped item back with what regions had of their own', async () => {
    const { editor, calls } = fakeDraft([plank])
    const own = buildPriceItem({ isRegionsOwn: true, rowVersion: 4 })
    await editor.drop(plank.key, [{ regionKey: 'merrow-harbor', item: own }])
    expect(editor.rowOf(BASE)).toBeUndefined()
    await editor.undo()
    expect(calls.add).toHaveBeenNthCalledWith(1, fieldsOf(plank), null)
    expect(calls.add).toHaveBeenNthCalledWith(2, fieldsOf(own), 'merrow-harbor')
    expect(editor.rowOf(BASE)?.name).toBe(plank.name)
  })

  it('gives a region prices of its own when they are keyed in its view, and takes them back', async () => {
    const { editor, calls } = fakeDraft([plank])
    editor.take('merrow-harbor', [plank])
    await editor.key(HARBOR, 'installed.likely', '6.10')
    expect(calls.update).not.toHaveBeenCalled()
    expect(calls.add).toHaveBeenCalledWith(
      { ...fieldsOf(plank), installed: { low: 48_000, likely: 61_000, high: 72_500 } },
      'merrow-harbor',
    )
    expect(editor.rowOf(HARBOR)?.isRegionsOwn).toBe(true)
    expect(editor.rowOf(BASE)?.installed?.likely).toBe(58_000)
    await editor.undo()
    expect(calls.drop).toHaveBeenCalledWith(expect.objectContaining(HARBOR))
    expect(editor.rowOf(HARBOR)?.isRegionsOwn).toBeUndefined()
  })

  it('takes a list from the server without losing a row that was saved after it', () => {
    const { editor } = fakeDraft([{ ...plank, wastePercent: 12, rowVersion: 3 }])
    editor.take(null, [{ ...plank, rowVersion: 2 }, paint])
    expect(editor.rows(null).map(({ key, wastePercent }) => [key, wastePercent])).toEqual([
      [plank.key, 12],
      [paint.key, 10],
    ])
  })
})
