import { describe, expect, it } from 'vitest'
import type { EstimateChange, EstimateCommand, PlacedLine } from '../../../src/composables/estimateChange.ts'
import { ownLineFields } from '../../../src/composables/newLineFields.ts'
import { useLineHistory } from '../../../src/composables/useLineHistory.ts'

const placed = (key: string, afterKey: string | null): PlacedLine => ({
  key,
  afterKey,
  fields: ownLineFields({ roomId: null, system: 'floors', trade: 'flooring' }),
  book: { materials: null, installed: null },
})
const edit = (before: string, after: string): EstimateChange => ({
  kind: 'edit',
  edits: [{ key: 'a', before: { quantity: before }, after: { quantity: after } }],
})

function history() {
  const applied: EstimateCommand[] = []
  return { applied, ...useLineHistory((command) => applied.push(command)) }
}

describe('useLineHistory', () => {
  it('undoes and redoes an edit', () => {
    const { run, undo, redo, applied } = history()
    run({ words: 'change of quantity', changes: [edit('1', '2')] })
    undo()
    redo()
    expect(applied.map(({ changes }) => changes[0])).toEqual([edit('1', '2'), edit('2', '1'), edit('1', '2')])
  })

  it('undoes a paste that changes lines and adds others as one step, last change first', () => {
    const { run, undo, applied, canUndo } = history()
    const added = [placed('new-1', 'a'), placed('new-2', 'new-1')]
    run({ words: 'paste of 3 lines', changes: [edit('1', '2'), { kind: 'add', lines: added }] })
    expect(undo()?.words).toBe('paste of 3 lines')
    expect(applied[1]?.changes).toEqual([{ kind: 'remove', lines: added }, edit('2', '1')])
    expect(canUndo.value).toBe(false)
  })

  it('turns a removal, a move and a change of settings round', () => {
    const { run, undo, applied } = history()
    const changes: EstimateChange[] = [
      { kind: 'remove', lines: [placed('a', null)] },
      { kind: 'order', before: ['a', 'b'], after: ['b', 'a'] },
      { kind: 'settings', before: { permitsCents: 0 }, after: { permitsCents: 100 } },
    ]
    run({ words: 'all of it', changes })
    undo()
    expect(applied[1]?.changes).toEqual([
      { kind: 'settings', before: { permitsCents: 100 }, after: { permitsCents: 0 } },
      { kind: 'order', before: ['b', 'a'], after: ['a', 'b'] },
      { kind: 'add', lines: [placed('a', null)] },
    ])
  })

  it('forgets what could be done again when something else is done', () => {
    const { run, undo, redo, canRedo } = history()
    run({ words: 'one', changes: [edit('1', '2')] })
    undo()
    run({ words: 'two', changes: [edit('1', '3')] })
    expect(canRedo.value).toBe(false)
    expect(redo()).toBeNull()
  })

  it('takes one step back wherever it stands, as the Undo of a toast does', () => {
    const { run, takeBack, undo, applied } = history()
    const removal: EstimateCommand = { words: 'removal', changes: [{ kind: 'remove', lines: [placed('a', null)] }] }
    run(removal)
    run({ words: 'later', changes: [edit('1', '2')] })
    takeBack(removal)
    expect(applied.at(-1)?.changes).toEqual([{ kind: 'add', lines: [placed('a', null)] }])
    expect(undo()?.words).toBe('later')
    expect(undo()).toBeNull()
  })

  it('keeps no step that changes nothing', () => {
    const { run, canUndo } = history()
    run({ words: 'nothing', changes: [] })
    expect(canUndo.value).toBe(false)
  })
})
