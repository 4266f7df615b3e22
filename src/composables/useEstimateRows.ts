import { storeToRefs } from 'pinia'
import { onScopeDispose, shallowRef, watch } from 'vue'
import { useGridPreferences } from '../stores/gridPreferences.ts'
import { buildEstimateRows, groupId, groupKeyOf, refreshSubtotals, type GridRow, type GroupRow, type Subtotal } from './estimateRows.ts'
import type { EstimateModel, ModelNews } from './estimateModel.ts'
import type { LineRow } from './lineRow.ts'

const NO_SUBTOTALS: ReadonlyMap<string | null, Subtotal> = new Map()

/** What is to be drawn again: all rows in a new order, or some of them as they are. */
export type RowsNews = { kind: 'order' } | { kind: 'look'; rows: readonly GridRow[] }

/** The estimate's lines under their heads, as grid and cards show them; grouping and folding are the person's. */
export function useEstimateRows(model: EstimateModel) {
  const { grouping } = storeToRefs(useGridPreferences())
  const collapsed = shallowRef<ReadonlySet<string>>(new Set())
  const known = new Map<string, GroupRow>()
  const rows = shallowRef<readonly GridRow[]>(build())
  const listeners = new Set<(news: RowsNews) => void>()

  function build(folded: ReadonlySet<string> = collapsed.value, groups = known): GridRow[] {
    const subtotals = grouping.value === 'none' ? NO_SUBTOTALS : model.subtotals(grouping.value)
    return buildEstimateRows({
      lines: model.list.rows(),
      grouping: grouping.value,
      rooms: model.rooms.value,
      collapsed: folded,
      subtotals,
      known: groups,
    })
  }

  /** Heads and feet keep their objects, so the grid has to be told that they say something else. */
  function rebuild(changed: readonly GridRow[] = []): void {
    rows.value = build()
    tell({ kind: 'order' })
    tell({ kind: 'look', rows: [...changed, ...known.values()] })
  }

  function follow({ rows: changed, isStructural }: ModelNews): void {
    if (isStructural) {
      rebuild(changed)
      return
    }
    const groups = grouping.value === 'none' ? [] : refreshSubtotals(known.values(), model.subtotals(grouping.value))
    tell({ kind: 'look', rows: [...changed, ...groups] })
  }

  function tell(news: RowsNews): void {
    for (const listener of listeners) listener(news)
  }

  /** Folds a group up or opens it. */
  function toggle(groupKey: string | null | undefined): void {
    const id = groupId(grouping.value, groupKey)
    const next = new Set(collapsed.value)
    if (!next.delete(id)) next.add(id)
    collapsed.value = next
    rebuild()
  }

  /** Opens the group that a line is folded up in. */
  function reveal(row: LineRow): void {
    const groupKey = groupKeyOf(row, grouping.value)
    if (collapsed.value.has(groupId(grouping.value, groupKey))) toggle(groupKey)
  }

  function collapseAll(isCollapsed: boolean): void {
    const heads = [...known.values()].filter(({ kind }) => kind === 'head')
    collapsed.value = new Set(isCollapsed ? heads.map(({ groupKey }) => groupId(grouping.value, groupKey)) : [])
    rebuild()
  }

  /** Lines of one group, in order. */
  function group(row: LineRow): LineRow[] {
    const key = groupKeyOf(row, grouping.value)
    return model.list.rows().filter((other) => groupKeyOf(other, grouping.value) === key)
  }

  const stopHearing = model.onNews(follow)
  const stopWatching = watch(grouping, () => {
    known.clear()
    rebuild()
  })
  onScopeDispose(() => {
    stopHearing()
    stopWatching()
  })

  return {
    grouping,
    collapsed,
    rows,
    toggle,
    reveal,
    collapseAll,
    group,
    /** Heads, lines and feet with nothing folded up, as on paper. */
    all: (): GridRow[] => build(new Set(), new Map()),
    /** The lines that are shown, in order, folded groups left out. */
    shownLines: (): LineRow[] => rows.value.filter((row): row is LineRow => row.kind === 'line'),
    onNews(listener: (news: RowsNews) => void): () => void {
      listeners.add(listener)
      return () => listeners.delete(listener)
    },
  }
}

export type EstimateRows = ReturnType<typeof useEstimateRows>
