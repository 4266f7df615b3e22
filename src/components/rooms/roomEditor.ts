import { computed, effectScope, reactive, watch, type ComputedRef } from 'vue'
import type { RoomInput } from '../../../shared/engine/estimateInput.ts'
import type { Room, RoomFields, RoomPatch } from '../../../shared/schemas/room.ts'
import { isSame } from '../../composables/mergeFields.ts'
import { useMergedSave } from '../../composables/useMergedSave.ts'
import { draftPartText, ROOM_KEYS, setDraftPart, type RoomKey } from './draftParts.ts'
import { fieldOfPath } from './fieldOfPath.ts'
import { readDeduction, readOpening, readRoomDraft, type DraftProblem, type DraftReading } from './readRoomDraft.ts'
import { draftFromRoom, newRowId, type RoomDraft } from './roomDraft.ts'

export interface RoomEditorOptions {
  send(room: Room, patch: RoomPatch): Promise<Room>
  onSaved(room: Room): void
  /** Keeps on this device what isn't saved; `null` when all is. */
  layBy(laidBy: { draft: RoomDraft; saved: Room } | null): void
  /** What was kept from the last time. */
  takenUp?: { draft: RoomDraft; saved: Room } | null
}

export type RoomProblems = ReadonlyMap<string, DraftProblem>

export interface RoomEditor {
  draft: RoomDraft
  reading: ComputedRef<DraftReading>
  /** The room as keyed, for the engine: what can't be read stands as it was saved. */
  input: ComputedRef<RoomInput>
  /** What is wrong, by field of the form, what the server said among it. */
  problems: ComputedRef<RoomProblems>
  save: ReturnType<typeof useMergedSave<RoomFields, Room>>
  /** Sends what is left and ends. */
  stop(): Promise<void>
}

/** One room being keyed: its form as text, what it reads as, and its saving. It lives on when another room is chosen. */
export function roomEditor(room: Room, { send, onSaved, layBy, takenUp = null }: RoomEditorOptions): RoomEditor {
  const scope = effectScope(true)
  return scope.run(() => {
    const first = takenUp?.saved ?? room
    const draft = reactive(takenUp ? withOwnRowIds(takenUp.draft) : draftFromRoom(first))
    const untouched = new Map<RoomKey, { text: string; value: unknown }>()
    rememberUntouched(ROOM_KEYS, first, draftFromRoom(first))

    const save = useMergedSave<RoomFields, Room>(first, { fieldsOf, send, onSaved, onTheirs })
    const reading = computed(() => readRoomDraft(draft))
    const input = computed<RoomInput>(() => {
      const { fields, shape } = reading.value
      // A shape whose walls cross isn't saved, but it is measured: the engine then says why it can't be.
      return { key: room.id, ...save.mine.value, ...fields, ...(shape ? { shape } : {}) }
    })
    const problems = computed<RoomProblems>(() => {
      const fromServer = save.fieldErrors.value.map(({ path, message }) => ({ field: fieldOfPath(path, draft), message, isEmpty: false }))
      return new Map([...fromServer, ...reading.value.problems].map((problem) => [problem.field, problem]))
    })

    // The form holds a length that the saved room has more finely than text says, so only what was touched is read back from it.
    function rememberUntouched(keys: readonly RoomKey[], fields: RoomFields, from: RoomDraft): void {
      for (const key of keys) untouched.set(key, { text: draftPartText(from, key), value: fields[key] })
    }

    function onTheirs(fields: RoomFields, keys: RoomKey[]): void {
      const unread = new Set(reading.value.problems.filter(({ isEmpty }) => !isEmpty).map(({ field }) => keyOfField(field)))
      const open = keys.filter((key) => !unread.has(key))
      for (const key of open) setDraftPart(draft, key, fields)
      rememberUntouched(open, fields, draft)
    }

    watch(
      draft,
      () => {
        const change: Partial<Record<RoomKey, unknown>> = {}
        for (const key of ROOM_KEYS) {
          const before = untouched.get(key)
          if (before && before.text === draftPartText(draft, key)) change[key] = before.value
          else if (key in reading.value.fields) change[key] = reading.value.fields[key]
        }
        save.edit(change as Partial<RoomFields>)
        keepReadableRows(draft)
      },
      { immediate: takenUp !== null },
    )
    watch([draft, save.status, save.saved], () => {
      const isAllSaved = save.status.value === 'saved' && reading.value.problems.length === 0
      layBy(isAllSaved ? null : { draft, saved: save.saved.value })
    })
    if (takenUp) save.hear(room)

    return {
      draft,
      reading,
      input,
      problems,
      save,
      stop: () => save.stop().finally(() => scope.stop()),
    }
  }) as RoomEditor
}

function fieldsOf({ name, use, shape, ceiling, openings, deductions, note }: Room): RoomFields {
  return { name, use, shape, ceiling, openings, deductions, note }
}

/** Rows laid by in another visit have ids of that visit. */
function withOwnRowIds(draft: RoomDraft): RoomDraft {
  const fresh = <Row extends { id: number }>(rows: Row[]): Row[] => rows.map((row) => ({ ...row, id: newRowId() }))
  return {
    ...draft,
    walk: { ...draft.walk, runs: fresh(draft.walk.runs) },
    openings: fresh(draft.openings),
    deductions: fresh(draft.deductions),
  }
}

/** What a row last said stands for it while somebody is in the middle of retyping it. */
function keepReadableRows(draft: RoomDraft): void {
  for (const row of draft.openings) {
    const opening = readOpening(row)
    if (opening && !isSame(opening, row.kept)) row.kept = opening
  }
  for (const row of draft.deductions) {
    const deduction = readDeduction(row)
    if (deduction && !isSame(deduction, row.kept)) row.kept = deduction
  }
}

function keyOfField(field: string): RoomKey {
  if (field.startsWith('opening')) return 'openings'
  if (field.startsWith('deduction')) return 'deductions'
  if (field === 'height' || field === 'low' || field === 'high') return 'ceiling'
  return field === 'name' || field === 'note' ? field : 'shape'
}
