import type { CellColumn } from './lineCells.ts'

/** What a key means in the grid, beside what the grid itself makes of arrows, Enter and letters. */
export type GridIntent =
  | {
      kind:
        | 'undo'
        | 'redo'
        | 'find'
        | 'saved'
        | 'fill-down'
        | 'add-line'
        | 'remove-lines'
        | 'select-all'
        | 'select-row'
        | 'clear'
        | 'help'
        | 'escape'
    }
  | { kind: 'go'; to: 'row-start' | 'row-end' | 'first' | 'last' }
  | { kind: 'move'; step: -1 | 1 }
  | { kind: 'extend'; rows: number; across: number }
  | { kind: 'tab'; isBack: boolean }
  | { kind: 'mark'; mark: 'seen' | 'measured' | 'tested' | 'bid' }
  | { kind: 'basis'; basis: 'own-hands' | 'hired' | 'other' }
  | { kind: 'price'; typed: string }

type Key = Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'shiftKey' | 'altKey'>

const PAGE_ROWS = 20
const EXTENSIONS: Record<string, [rows: number, across: number]> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
  PageUp: [-PAGE_ROWS, 0],
  PageDown: [PAGE_ROWS, 0],
}
const MARKS = { s: 'seen', m: 'measured', t: 'tested', b: 'bid' } as const

/** The intent of a key that is pressed in a cell which isn't being edited; `null` leaves it to the grid. */
export function gridIntent(event: Key, column: CellColumn): GridIntent | null {
  const isCommand = event.ctrlKey || event.metaKey
  if (isCommand) return commandIntent(event)
  if (event.altKey) return moveIntent(event)
  const extension = event.shiftKey ? EXTENSIONS[event.key] : undefined
  if (extension) return { kind: 'extend', rows: extension[0], across: extension[1] }
  return plainIntent(event) ?? columnIntent(event, column)
}

/** Commands that hold wherever the focus is on the page, outside of fields. */
export function commandIntent({ key, shiftKey }: Key): GridIntent | null {
  switch (key.toLowerCase()) {
    case 'z':
      return { kind: shiftKey ? 'redo' : 'undo' }
    case 'y':
      return { kind: 'redo' }
    case 'f':
      return { kind: 'find' }
    case 's':
      return { kind: 'saved' }
    case 'd':
      return { kind: 'fill-down' }
    case 'a':
      return { kind: 'select-all' }
    case 'home':
      return { kind: 'go', to: 'first' }
    case 'end':
      return { kind: 'go', to: 'last' }
    case 'enter':
      return { kind: 'add-line' }
    case 'delete':
    case 'backspace':
      return { kind: 'remove-lines' }
    default:
      return null
  }
}

function moveIntent({ key }: Key): GridIntent | null {
  if (key === 'ArrowUp') return { kind: 'move', step: -1 }
  return key === 'ArrowDown' ? { kind: 'move', step: 1 } : null
}

function plainIntent({ key, shiftKey }: Key): GridIntent | null {
  switch (key) {
    case 'Delete':
    case 'Backspace':
      return { kind: 'clear' }
    case 'Home':
      return { kind: 'go', to: 'row-start' }
    case 'End':
      return { kind: 'go', to: 'row-end' }
    case 'Escape':
      return { kind: 'escape' }
    case 'Tab':
      return { kind: 'tab', isBack: shiftKey }
    case '?':
      return { kind: 'help' }
    case ' ':
      return shiftKey ? { kind: 'select-row' } : null
    default:
      return null
  }
}

function columnIntent({ key }: Key, column: CellColumn): GridIntent | null {
  const letter = key.toLowerCase()
  const opens = key === 'Enter' || key === 'F2'
  if (column === 'evidence' && letter in MARKS) return { kind: 'mark', mark: MARKS[letter as keyof typeof MARKS] }
  if (column === 'basis') {
    if (opens || key === ' ') return { kind: 'basis', basis: 'other' }
    if (letter === 'o') return { kind: 'basis', basis: 'own-hands' }
    if (letter === 'h') return { kind: 'basis', basis: 'hired' }
  }
  if (column === 'price') {
    if (opens) return { kind: 'price', typed: '' }
    if (/^[\d.$]$/.test(key)) return { kind: 'price', typed: key === '$' ? '' : key }
  }
  return null
}
