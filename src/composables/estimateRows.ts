import { HOUSE_SYSTEMS } from '../../shared/catalogue/houseSystems.ts'
import { TRADES } from '../../shared/catalogue/trades.ts'
import type { LowLikelyHigh } from '../../shared/schemas/common.ts'
import type { Room } from '../../shared/schemas/room.ts'
import type { LineRow } from './lineRow.ts'

export const GROUPINGS = ['room', 'system', 'trade', 'none'] as const
export type Grouping = (typeof GROUPINGS)[number]

/** Lines of the house as a whole stand in a group of this title. */
export const WHOLE_HOUSE = 'Whole house'

export interface Subtotal {
  amountCents: LowLikelyHigh
  hours: number
  lineCount: number
}

/** The head of a group (its name, across all columns) or its foot (its subtotal, in the columns; the place to add a line). */
export interface GroupRow extends Subtotal {
  kind: 'head' | 'foot'
  key: string
  /** A room's id (`null`: the house), a system's or a trade's key; `undefined` where there is one group of all. */
  groupKey: string | null | undefined
  title: string
  isCollapsed: boolean
  /** Key of the group's last line: where a line that is added at the foot goes. */
  lastLineKey: string | null
}

export type GridRow = LineRow | GroupRow

interface RowsQuestion {
  lines: readonly LineRow[]
  grouping: Grouping
  rooms: readonly Room[]
  /** `groupId`s of the groups that are folded up. */
  collapsed: ReadonlySet<string>
  subtotals: ReadonlyMap<string | null, Subtotal>
  /** Heads and feet of the last time: the same objects come back, so that the grid keeps their rows. */
  known: Map<string, GroupRow>
}

const NO_SUBTOTAL: Subtotal = { amountCents: { low: 0, likely: 0, high: 0 }, hours: 0, lineCount: 0 }

/** What a group goes by in `collapsed`: `room:…`, `room:house`, `system:floors`. */
export function groupId(grouping: Grouping, groupKey: string | null | undefined): string {
  return `${grouping}:${groupKey ?? 'house'}`
}

/** The group that a line belongs to. */
export function groupKeyOf(line: LineRow, grouping: Grouping): string | null | undefined {
  if (grouping === 'none') return undefined
  return grouping === 'room' ? line.fields.roomId : line.fields[grouping]
}

/** Heads, lines and feet in the order that the grid shows them; lines keep their own order inside a group. Groups without lines are left out. */
export function buildEstimateRows({ lines, grouping, rooms, collapsed, subtotals, known }: RowsQuestion): GridRow[] {
  const byGroup = new Map<string | null | undefined, LineRow[]>()
  for (const line of lines) {
    const key = groupKeyOf(line, grouping)
    const group = byGroup.get(key)
    if (group) group.push(line)
    else byGroup.set(key, [line])
  }
  const titles = groupTitles(grouping, rooms)
  const order = [...titles.keys()].filter((key) => byGroup.has(key))
  const strangers = [...byGroup.keys()].filter((key) => !titles.has(key))
  return [...order, ...strangers].flatMap((key) => groupRows(key, titles.get(key) ?? String(key), byGroup.get(key) ?? []))

  function groupRows(groupKey: string | null | undefined, title: string, members: LineRow[]): GridRow[] {
    const id = groupId(grouping, groupKey)
    const isCollapsed = collapsed.has(id)
    const subtotal = groupKey === undefined ? NO_SUBTOTAL : (subtotals.get(groupKey) ?? NO_SUBTOTAL)
    const shared = { groupKey, title, isCollapsed, ...subtotal, lineCount: members.length, lastLineKey: members.at(-1)?.key ?? null }
    const foot = remembered(known, { ...shared, kind: 'foot', key: `foot:${id}` })
    if (grouping === 'none') return [...members, foot]
    const head = remembered(known, { ...shared, kind: 'head', key: `head:${id}` })
    return isCollapsed ? [head] : [head, ...members, foot]
  }
}

/** Puts fresh subtotals into the heads and feet that are shown; answers with those that changed. */
export function refreshSubtotals(known: Iterable<GroupRow>, subtotals: ReadonlyMap<string | null, Subtotal>): GroupRow[] {
  const changed: GroupRow[] = []
  for (const row of known) {
    const fresh = row.groupKey === undefined ? undefined : subtotals.get(row.groupKey)
    if (!fresh || (isSameRange(fresh.amountCents, row.amountCents) && fresh.hours === row.hours)) continue
    row.amountCents = fresh.amountCents
    row.hours = fresh.hours
    changed.push(row)
  }
  return changed
}

/** Names of the groups, in the order that they stand in. */
export function groupTitles(grouping: Grouping, rooms: readonly Room[]): Map<string | null | undefined, string> {
  switch (grouping) {
    case 'none':
      return new Map([[undefined, 'All lines']])
    case 'room': {
      const inOrder = [...rooms].sort((a, b) => a.position - b.position)
      return new Map<string | null, string>([[null, WHOLE_HOUSE], ...inOrder.map(({ id, name }) => [id, name] as const)])
    }
    case 'system':
      return new Map(HOUSE_SYSTEMS.map(({ key, title }) => [key, title]))
    case 'trade':
      return new Map(TRADES.map(({ key, title }) => [key, title]))
  }
}

function remembered(known: Map<string, GroupRow>, row: GroupRow): GroupRow {
  const before = known.get(row.key)
  if (before) return Object.assign(before, row)
  known.set(row.key, row)
  return row
}

function isSameRange(a: LowLikelyHigh, b: LowLikelyHigh): boolean {
  return a.low === b.low && a.likely === b.likely && a.high === b.high
}
