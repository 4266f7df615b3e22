import { computed, shallowReactive, shallowRef } from 'vue'
import type { PriceItem, PriceItemFields, PriceItemPatch } from '../../../shared/schemas/priceItem.ts'
import type { ItemRowRef } from '../../api/priceBook.ts'
import { ProblemError } from '../../api/ProblemError.ts'
import { isSame } from '../../composables/mergeFields.ts'
import { fieldText, type CellField } from './itemFields.ts'
import { keyCell, type HeldEdits } from './rowEdits.ts'

/** The calls that a draft is edited by. */
export interface DraftCalls {
  update(row: ItemRowRef, patch: PriceItemPatch): Promise<PriceItem>
  add(fields: PriceItemFields, regionKey: string | null): Promise<PriceItem>
  drop(row: ItemRowRef): Promise<void>
}

/** An item in one view of the draft: the base prices (`null`), or what a region pays. */
export interface ItemPlace {
  key: string
  regionKey: string | null
}

interface Step {
  /** What undoing takes back: "the installed price of Vinyl plank". */
  title: string
  undo(): Promise<void>
}

const STEPS_MAX = 100

/**
 * The draft while it is edited: rows as the server has them with what is still on its way laid over them, cells that can't be saved as they were
 * keyed, and the steps that can be undone. Saves of one item go one after the other, each against the version that the one before left.
 */
export function createDraftEditor(calls: DraftCalls, sayProblem: (error: unknown) => void) {
  const saved = shallowReactive(new Map<string | null, readonly PriceItem[]>())
  const onTheirWay = shallowReactive(new Map<string, readonly PriceItemPatch[]>())
  const held = shallowReactive(new Map<string, HeldEdits>())
  const steps = shallowRef<readonly Step[]>([])
  const chains = new Map<string, Promise<unknown>>()
  const savingCount = shallowRef(0)

  /** Takes over what the server sent. A row that was saved meanwhile is newer than the list, and stays. */
  function take(regionKey: string | null, list: readonly PriceItem[]): void {
    const known = new Map((saved.get(regionKey) ?? []).map((item) => [item.key, item]))
    saved.set(
      regionKey,
      list.map((item) => {
        const own = known.get(item.key)
        if (!own) return item
        const isNewer = own.rowVersion > item.rowVersion && own.isRegionsOwn === item.isRegionsOwn
        return isNewer || isSame(own, item) ? own : item
      }),
    )
  }

  function rows(regionKey: string | null): readonly PriceItem[] {
    const list = saved.get(regionKey) ?? []
    if (onTheirWay.size === 0) return list
    return list.map((item) => {
      const patches = onTheirWay.get(placeId({ key: item.key, regionKey }))
      return patches ? Object.assign({}, item, ...patches) : item
    })
  }

  function rowOf({ key, regionKey }: ItemPlace): PriceItem | undefined {
    return rows(regionKey).find((item) => item.key === key)
  }

  function savedRow({ key, regionKey }: ItemPlace): PriceItem {
    const row = saved.get(regionKey)?.find((item) => item.key === key)
    if (!row) throw new ProblemError({ status: 404, code: 'not-found', detail: `${key} is no longer in the draft.` })
    return row
  }

  function putRow(regionKey: string | null, row: PriceItem): void {
    const list = saved.get(regionKey) ?? []
    const isThere = list.some(({ key }) => key === row.key)
    saved.set(regionKey, isThere ? list.map((item) => (item.key === row.key ? row : item)) : [...list, row])
  }

  function takeOut({ key, regionKey }: ItemPlace): void {
    saved.set(
      regionKey,
      (saved.get(regionKey) ?? []).filter((item) => item.key !== key),
    )
  }

  function remember(step: Step): void {
    steps.value = [...steps.value, step].slice(-STEPS_MAX)
  }

  /** Runs one after the other what is done to one item. */
  async function inTurn<T>(place: ItemPlace, work: () => Promise<T>): Promise<T> {
    const id = placeId(place)
    const turn = (chains.get(id) ?? Promise.resolve()).catch(() => undefined).then(work)
    chains.set(id, turn)
    savingCount.value += 1
    try {
      return await turn
    } finally {
      savingCount.value -= 1
      if (chains.get(id) === turn) chains.delete(id)
    }
  }

  /** Saves fields of an item, shown at once. In a region's view an item without prices of its own gets them. Throws what the server refused. */
  async function save(place: ItemPlace, patch: PriceItemPatch): Promise<void> {
    const id = placeId(place)
    onTheirWay.set(id, [...(onTheirWay.get(id) ?? []), patch])
    try {
      await inTurn(place, () => saveNow(place, patch))
    } finally {
      const rest = (onTheirWay.get(id) ?? []).filter((one) => one !== patch)
      if (rest.length > 0) onTheirWay.set(id, rest)
      else onTheirWay.delete(id)
    }
  }

  async function saveNow(place: ItemPlace, patch: PriceItemPatch): Promise<void> {
    const before = savedRow(place)
    const givesOwnPrices = place.regionKey !== null && !before.isRegionsOwn
    if (givesOwnPrices) {
      const own = await calls.add({ ...fieldsOf(before), ...patch }, place.regionKey)
      putRow(place.regionKey, { ...own, isRegionsOwn: true })
      remember({
        title: `${before.name}: own prices of a region`,
        undo: () => inTurn(place, () => dropOwnPrices(place, before)),
      })
      return
    }
    await sendPatch(place, before, patch)
    const inverse = Object.fromEntries(Object.keys(patch).map((field) => [field, before[field as keyof PriceItemPatch]])) as PriceItemPatch
    remember({ title: before.name, undo: () => inTurn(place, () => sendPatch(place, savedRow(place), inverse)) })
  }

  async function dropOwnPrices(place: ItemPlace, derived: PriceItem): Promise<void> {
    await calls.drop({ ...place, rowVersion: savedRow(place).rowVersion })
    putRow(place.regionKey, derived)
  }

  /** Fields that nobody else touched meanwhile are saved over the newer row; the others stay theirs and are named. */
  async function sendPatch(place: ItemPlace, before: PriceItem, patch: PriceItemPatch): Promise<void> {
    const keepMark = (item: PriceItem): PriceItem => (before.isRegionsOwn ? { ...item, isRegionsOwn: true } : item)
    try {
      putRow(place.regionKey, keepMark(await calls.update({ ...place, rowVersion: before.rowVersion }, patch)))
    } catch (error) {
      const current = error instanceof ProblemError && error.isStale ? (error.current as PriceItem | null) : null
      if (!current) throw error
      putRow(place.regionKey, keepMark(current))
      const fields = Object.keys(patch) as (keyof PriceItemPatch)[]
      const contested = fields.filter((field) => !isSame(current[field], before[field]))
      if (contested.length > 0) throw contestedProblem(current, contested)
      putRow(place.regionKey, keepMark(await calls.update({ ...place, rowVersion: current.rowVersion }, patch)))
    }
  }

  /** Takes what was keyed into a cell: saved when it can be, else held in the cell with the reason. */
  async function key(place: ItemPlace, field: CellField, text: string): Promise<void> {
    const row = rowOf(place)
    if (!row) return
    const id = placeId(place)
    const before = held.get(id) ?? {}
    const { held: stillHeld, patch } = keyCell(row, before, field, text)
    setHeld(id, stillHeld)
    if (patch === null) return
    const sent = [...new Set([...Object.keys(before).filter((cell) => !(cell in stillHeld)), field])] as CellField[]
    const texts = sent.map((cell) => [cell, cell === field ? text : (before[cell]?.text ?? '')] as const)
    try {
      await save(place, patch)
    } catch (error) {
      const words = error instanceof Error ? error.message : String(error)
      setHeld(id, { ...(held.get(id) ?? {}), ...Object.fromEntries(texts.map(([cell, own]) => [cell, { text: own, problem: words }])) })
      const isNoMatterOfTheCell = !(error instanceof ProblemError) || error.status === 409 || error.isUnreachable
      if (isNoMatterOfTheCell) sayProblem(error)
    }
  }

  function setHeld(id: string, edits: HeldEdits): void {
    if (Object.keys(edits).length > 0) held.set(id, edits)
    else held.delete(id)
  }

  /** Gives a held cell back what is saved. */
  function discard(place: ItemPlace, field: CellField): void {
    const id = placeId(place)
    const { [field]: _, ...rest } = held.get(id) ?? {}
    setHeld(id, rest)
  }

  async function add(fields: PriceItemFields): Promise<void> {
    const place = { key: fields.key, regionKey: null }
    await inTurn(place, async () => putRow(null, await calls.add(fields, null)))
    remember({ title: `adding ${fields.name}`, undo: () => inTurn(place, () => dropNow(place)) })
  }

  async function dropNow(place: ItemPlace): Promise<void> {
    await calls.drop({ ...place, rowVersion: savedRow(place).rowVersion })
    takeOut(place)
    held.delete(placeId(place))
  }

  /** Takes a region's own prices away. What it pays instead comes with the next list from the server. */
  async function dropOwn(place: ItemPlace): Promise<void> {
    const own = savedRow(place)
    await inTurn(place, () => calls.drop({ ...place, rowVersion: savedRow(place).rowVersion }))
    remember({
      title: `${own.name}: own prices of a region`,
      undo: () =>
        inTurn(place, async () => putRow(place.regionKey, { ...(await calls.add(fieldsOf(own), place.regionKey)), isRegionsOwn: true })),
    })
  }

  /** Drops an item. `ownRows` are the prices that regions have of it, which go with it and come back with an undo. */
  async function drop(key_: string, ownRows: readonly { regionKey: string; item: PriceItem }[]): Promise<void> {
    const place = { key: key_, regionKey: null }
    const before = savedRow(place)
    await inTurn(place, () => dropNow(place))
    remember({
      title: `dropping ${before.name}`,
      undo: () =>
        inTurn(place, async () => {
          putRow(null, await calls.add(fieldsOf(before), null))
          for (const { regionKey, item } of ownRows) await calls.add(fieldsOf(item), regionKey)
        }),
    })
  }

  /** Takes the last step back. */
  async function undo(): Promise<string | null> {
    const step = steps.value.at(-1)
    if (!step) return null
    steps.value = steps.value.slice(0, -1)
    await step.undo()
    return step.title
  }

  return {
    take,
    rows,
    rowOf,
    heldOf: (place: ItemPlace): HeldEdits => held.get(placeId(place)) ?? NOTHING_HELD,
    /** Every cell of a view that isn't saved, with its reason. */
    heldCells: (regionKey: string | null) =>
      rows(regionKey).flatMap((item) =>
        Object.entries(held.get(placeId({ key: item.key, regionKey })) ?? {}).map(([field, edit]) => ({
          item,
          field: field as CellField,
          ...edit,
        })),
      ),
    save,
    key,
    discard,
    add,
    drop,
    dropOwn,
    undo,
    canUndo: computed(() => steps.value.length > 0),
    isSaving: computed(() => savingCount.value > 0),
  }
}

const NOTHING_HELD: HeldEdits = {}

function placeId({ key, regionKey }: ItemPlace): string {
  return `${regionKey ?? ''}|${key}`
}

/** The fields of a row without what the server keeps beside them. */
export function fieldsOf(item: PriceItem): PriceItemFields {
  const { rowVersion: _version, isRegionsOwn: _own, ...fields } = item
  return fields
}

function contestedProblem(current: PriceItem, fields: readonly (keyof PriceItemPatch)[]): ProblemError {
  const theirs = fields.map((field) => fieldText(current, field)).join(', ')
  return new ProblemError({ status: 412, code: 'stale', detail: `somebody else saved ${theirs} here in the meantime`, current })
}
