import { useQuery } from '@tanstack/vue-query'
import { computed, onScopeDispose, shallowRef, triggerRef } from 'vue'
import { bookItemsQuery } from '../api/priceBook.ts'
import type { PriceItem } from '../../shared/schemas/priceItem.ts'
import type { EstimateModel } from './estimateModel.ts'
import { createItemSearch } from './itemSearch.ts'
import type { LineRow } from './lineRow.ts'
import type { PastePlan } from './pastePlan.ts'
import { useEstimateEdits } from './useEstimateEdits.ts'
import { useEstimateRows } from './useEstimateRows.ts'
import { useEstimateTotals } from './useEstimateTotals.ts'
import { useNotice } from './useNotice.ts'
import { usePermissions } from './usePermissions.ts'
import { useUndoToast } from './useUndoToast.ts'

/** Where a line that is being looked for will go. */
export interface FinderStart {
  /** Below this line; `null`: at the end. */
  afterKey: string | null
  roomId: string | null
  system: string | undefined
  text: string
}

/** A search that begins where a line stands: below it, in its room, items of its house system first. */
export function finderBelow(line: LineRow | undefined, text = ''): FinderStart {
  return { afterKey: line?.key ?? null, roomId: line?.fields.roomId ?? null, system: line?.fields.system, text }
}

/** The one panel or dialog that is open over the estimate. */
export type DeskPanel =
  | { kind: 'finder'; start: FinderStart }
  | { kind: 'own-line'; start: FinderStart }
  | { kind: 'price'; key: string; typed: string }
  | { kind: 'line'; key: string }
  | { kind: 'paste'; plan: PastePlan; confirm: () => void }
  | { kind: 'settings' }
  | { kind: 'columns' }
  | { kind: 'keys' }
  | { kind: 'trouble' }
  | { kind: 'share' }

/** One estimate on the desk: its model, what can be done to it, and what is open over it. Grid, cards, totals and dialogs share it. */
export function useEstimateDesk(model: EstimateModel) {
  const { may } = usePermissions()
  const isReadOnly = !may('estimate.write')
  const toasts = useUndoToast()
  const panel = shallowRef<DeskPanel | null>(null)
  const notice = useNotice()
  const focusedKey = shallowRef<string | null>(null)
  /** A line that is to be gone to: the grid follows. */
  const wanted = shallowRef<{ key: string } | null>(null)

  const { priceBookVersion, regionKey } = model.estimate.value
  const { data: items } = useQuery({ ...bookItemsQuery({ version: priceBookVersion, isDraft: false }, regionKey), enabled: !isReadOnly })
  const byKey = computed(() => new Map((items.value ?? []).map((item) => [item.key, item])))
  const byName = computed(() => new Map((items.value ?? []).map((item) => [item.name.toLowerCase(), item])))
  const searchItems = computed(() => createItemSearch(items.value ?? []))
  const findItem = (key: string): PriceItem | undefined => byKey.value.get(key)

  const edits = useEstimateEdits({ model, findItem })
  const rows = useEstimateRows(model)
  const totals = useEstimateTotals(model)

  /** The line that stands in focus, drawn again whenever it changes. */
  const focusedLine = shallowRef<LineRow | undefined>()
  function focus(key: string | null): void {
    focusedKey.value = key
    focusedLine.value = key === null ? undefined : model.list.find(key)
  }
  const stopHearing = model.onNews(({ rows: changed, isStructural }) => {
    const line = focusedLine.value
    if (!line) return
    if (isStructural && !model.list.find(line.key)) focus(null)
    else if (changed.includes(line)) triggerRef(focusedLine)
  })
  onScopeDispose(stopHearing)

  /** Removes lines and offers them back. */
  function removeLines(keys: readonly string[]): void {
    const [first] = keys
    const name = first === undefined ? '' : (model.list.find(first)?.fields.description ?? '')
    const command = edits.remove(keys, keys.length === 1 ? `removal of “${name}”` : `removal of ${keys.length} lines`)
    if (!command) return
    const text = keys.length === 1 ? `“${name}” removed` : `${keys.length} lines removed`
    toasts.offerUndo(text, () => Promise.resolve(edits.history.takeBack(command)))
  }

  function undo(): void {
    const command = edits.history.undo()
    notice.say(command ? `Undone: ${command.words}.` : 'There is nothing to undo.')
  }

  function redo(): void {
    const command = edits.history.redo()
    notice.say(command ? `Done again: ${command.words}.` : 'There is nothing to do again.')
  }

  return {
    model,
    isReadOnly,
    edits,
    rows,
    totals,
    toasts,
    notice: notice.text,
    say: notice.say,
    panel,
    focusedKey,
    focusedLine,
    focus,
    wanted,
    show(key: string): void {
      wanted.value = { key }
    },
    items,
    findItem,
    findItemByName: (name: string): PriceItem | undefined => byName.value.get(name.toLowerCase()),
    searchItems,
    removeLines,
    undo,
    redo,
    open(opened: DeskPanel): void {
      panel.value = opened
    },
    close(): void {
      panel.value = null
    },
  }
}

export type EstimateDesk = ReturnType<typeof useEstimateDesk>
