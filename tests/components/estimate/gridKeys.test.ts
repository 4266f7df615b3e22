import { describe, expect, it } from 'vitest'
import { gridIntent } from '../../../src/composables/gridKeys.ts'
import type { CellColumn } from '../../../src/composables/lineCells.ts'

/** `Ctrl+Shift+z` as the event that a browser sends. */
function press(keys: string, column: CellColumn = 'description') {
  const parts = keys.split('+')
  const key = parts.at(-1) ?? ''
  const held = (name: string) => parts.slice(0, -1).includes(name)
  return gridIntent({ key, ctrlKey: held('Ctrl'), metaKey: held('Cmd'), shiftKey: held('Shift'), altKey: held('Alt') }, column)
}

describe('gridIntent', () => {
  it.each([
    ['Ctrl+z', { kind: 'undo' }],
    ['Cmd+z', { kind: 'undo' }],
    ['Ctrl+Shift+Z', { kind: 'redo' }],
    ['Ctrl+y', { kind: 'redo' }],
    ['Ctrl+d', { kind: 'fill-down' }],
    ['Ctrl+f', { kind: 'find' }],
    ['Ctrl+s', { kind: 'saved' }],
    ['Ctrl+a', { kind: 'select-all' }],
    ['Ctrl+Enter', { kind: 'add-line' }],
    ['Ctrl+Delete', { kind: 'remove-lines' }],
    ['Ctrl+Home', { kind: 'go', to: 'first' }],
    ['End', { kind: 'go', to: 'row-end' }],
    ['Alt+ArrowUp', { kind: 'move', step: -1 }],
    ['Alt+ArrowDown', { kind: 'move', step: 1 }],
    ['Shift+ArrowDown', { kind: 'extend', rows: 1, across: 0 }],
    ['Shift+ArrowLeft', { kind: 'extend', rows: 0, across: -1 }],
    ['Shift+ ', { kind: 'select-row' }],
    ['Delete', { kind: 'clear' }],
    ['Escape', { kind: 'escape' }],
    ['Shift+Tab', { kind: 'tab', isBack: true }],
    ['?', { kind: 'help' }],
  ])('%s in any cell', (keys, intent) => {
    expect(press(keys)).toEqual(intent)
  })

  it.each(['ArrowDown', 'Enter', 'F2', 'a', '7', '=', 'Ctrl+c', 'Ctrl+v'])('leaves %s to the grid and the browser', (keys) => {
    expect(press(keys)).toBeNull()
  })

  it('marks evidence by its first letter, in its own column alone', () => {
    expect(press('t', 'evidence')).toEqual({ kind: 'mark', mark: 'tested' })
    expect(press('t', 'note')).toBeNull()
  })

  it('turns own hands and hired round', () => {
    expect(press('o', 'basis')).toEqual({ kind: 'basis', basis: 'own-hands' })
    expect(press('h', 'basis')).toEqual({ kind: 'basis', basis: 'hired' })
    expect(press('Enter', 'basis')).toEqual({ kind: 'basis', basis: 'other' })
  })

  it('opens the price with the digit that was typed', () => {
    expect(press('7', 'price')).toEqual({ kind: 'price', typed: '7' })
    expect(press('F2', 'price')).toEqual({ kind: 'price', typed: '' })
  })
})
