import type { RoomDraft } from './roomDraft.ts'

const FIELDS: Record<string, string> = {
  'shape.lengthIn': 'length',
  'shape.widthIn': 'width',
  'shape.cutLengthIn': 'cutLength',
  'shape.cutWidthIn': 'cutWidth',
  'ceiling.heightIn': 'height',
  'ceiling.lowIn': 'low',
  'ceiling.highIn': 'high',
}

/** The field of the form that a path of the API's body is keyed in: `openings[1].widthIn` → `opening-7-width`. */
export function fieldOfPath(path: string, draft: Pick<RoomDraft, 'openings' | 'deductions'>): string {
  const known = FIELDS[path]
  if (known) return known
  const row = /^(opening|deduction)s\[(\d+)\](?:\.(\w+?)(?:In)?)?$/.exec(path)
  if (!row) return /^[^.[]*/.exec(path)?.[0] ?? path
  const [, noun, index, part] = row
  // A row that never could be read isn't in the body.
  const rows = (noun === 'opening' ? draft.openings : draft.deductions).filter(({ kept }) => kept !== null)
  const id = rows[Number(index)]?.id
  return id === undefined ? `${noun}s` : `${noun}-${id}-${part ?? 'width'}`
}
