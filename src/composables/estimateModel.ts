import { shallowRef, type ShallowRef } from 'vue'
import { newIdempotencyKey } from '../api/http.ts'
import type { Estimate, EstimatePatch, EstimateWhole, LineFields, OrderedLines } from '../../shared/schemas/estimate.ts'
import type { House } from '../../shared/schemas/house.ts'
import type { Room } from '../../shared/schemas/room.ts'
import type { EstimateChange, EstimateCommand } from './estimateChange.ts'
import { createEstimateFigures } from './estimateFigures.ts'
import { createEstimateSaver } from './estimateSaver.ts'
import { createEstimateVersions } from './estimateVersions.ts'
import { createLineChanges } from './lineChanges.ts'
import { createLineList } from './lineList.ts'
import { rowOfLine, type LineField, type LineRow } from './lineRow.ts'
import { createLineSaver, type LineCalls, type StepOutcome } from './lineSaver.ts'
import { settleConflict } from './mergeLine.ts'
import { createSettingsSaver } from './settingsSaver.ts'
import { takeWhole } from './takeWhole.ts'
import { ProblemError } from '../api/ProblemError.ts'

/** The calls that an estimate is saved with (`api/estimates.ts`). */
export interface EstimateCalls extends LineCalls {
  orderLines(estimateId: string, ids: readonly string[]): Promise<OrderedLines>
  updateEstimate(estimate: Pick<Estimate, 'id' | 'version'>, patch: EstimatePatch): Promise<Estimate>
}

/** What changed on the page: `rows` look different; where `isStructural`, lines came, went or moved between groups. */
export interface ModelNews {
  rows: readonly LineRow[]
  isStructural: boolean
}

/** A refused order is put together anew over a fresh read; after this many refusals the server's order stands. */
const ORDER_TRIES_MAX = 3

interface ModelOptions {
  calls: EstimateCalls
  /** There is a version that this page hasn't seen: read the whole and hand it to `take`. */
  onBehind(): void
}

/**
 * One estimate as the page holds it: its lines in order, their running figures, what is changed and what is saved. Changes show at once and are sent by
 * themselves; what others save is merged in. Screens listen with `onNews`; nothing here knows how lines are shown.
 */
export function createEstimateModel(whole: EstimateWhole, { calls, onBehind }: ModelOptions) {
  const estimateId = whole.estimate.id
  const figures = createEstimateFigures(whole, readFormulas)
  const byPosition = [...whole.lines].sort((a, b) => a.position - b.position)
  const list = createLineList(byPosition.map((line) => rowOfLine(line, figures.of(line.id))))
  const removed = new Map<string, LineRow>()
  const versions = createEstimateVersions(whole.estimate.version)
  const house: ShallowRef<House> = shallowRef(whole.house)
  const rooms: ShallowRef<readonly Room[]> = shallowRef(whole.rooms)
  const listeners = new Set<(news: ModelNews) => void>()
  const changes = createLineChanges({ list, removed, figures })
  let isOrderUnsaved = false
  let orderTries = 0
  let editedKey: string | null = null

  const settings = createSettingsSaver({
    initial: whole.estimate,
    updateEstimate: calls.updateEstimate,
    onSettings(fresh) {
      figures.setSettings(fresh)
      tell({ rows: [], isStructural: false })
    },
    onVersion: versions.wrote,
  })
  const lineSaver = createLineSaver({
    estimateId,
    calls,
    newKey: newIdempotencyKey,
    savedIdAbove: (row) => list.savedIdAbove(row.key),
    onAnswer(row, adopted, estimateVersion) {
      list.named(row)
      if (estimateVersion !== null) versions.wrote(estimateVersion)
      const isShown = !row.isRemoved
      if (isShown) figures.set(row)
      if (isShown) tell({ rows: [row], isStructural: isGroupTouched(adopted) })
    },
  })
  const saver = createEstimateSaver({
    nextStep: lineSaver.nextStep,
    take: lineSaver.take,
    nextWhole,
    onState: (rows) => tell({ rows: rows.filter(({ isRemoved }) => !isRemoved), isStructural: false }),
    onIdle: catchUp,
  })

  /** Formulas that had to wait for their parser count from now on. */
  function readFormulas(): void {
    figures.reopen(list.rows())
    tell({ rows: list.rows(), isStructural: false })
  }

  function tell(news: ModelNews): void {
    for (const listener of listeners) listener(news)
  }

  function apply(command: EstimateCommand): void {
    const touched = command.changes.flatMap(applyChange)
    const isStructural =
      command.changes.some(({ kind }) => kind === 'add' || kind === 'remove' || kind === 'order') || command.changes.some(isRegrouping)
    tell({ rows: touched.filter(({ isRemoved }) => !isRemoved), isStructural })
    saver.want(touched)
  }

  function applyChange(change: EstimateChange): readonly LineRow[] {
    if (change.kind === 'settings') {
      settings.change(change.after)
      figures.setSettings(settings.estimate.value.settings)
      return []
    }
    if (change.kind === 'order') isOrderUnsaved = true
    return changes.apply(change)
  }

  function nextWhole(): (() => Promise<StepOutcome>) | null {
    if (isOrderUnsaved) return sendOrder
    return settings.hasUnsent() ? settings.send : null
  }

  async function sendOrder(): Promise<StepOutcome> {
    isOrderUnsaved = false
    const ids = list.rows().flatMap(({ id, isRemovedAtServer }) => (id === null || isRemovedAtServer ? [] : [id]))
    try {
      versions.wrote((await calls.orderLines(estimateId, ids)).estimateVersion)
      orderTries = 0
      return 'done'
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error
      const isPassing = error.isUnreachable || error.status >= 500
      orderTries += isPassing ? 0 : 1
      isOrderUnsaved = isPassing || orderTries < ORDER_TRIES_MAX
      // Somebody added or removed a line in the meantime: the fresh read brings it in, and then the order goes out again.
      if (!isPassing) onBehind()
      return 'later'
    }
  }

  function catchUp(): void {
    if (versions.isBehind()) onBehind()
  }

  /**
   * Takes in the estimate as the server has it now. While a write of ours is under way a read may or may not know of it: it is left, and repeated when the
   * writes have been answered.
   */
  function take(fresh: EstimateWhole): void {
    if (saver.isBusy() || versions.isOld(fresh.estimate.version)) return
    versions.read(fresh.estimate.version)
    figures.setMeasured(rooms.value, fresh)
    house.value = fresh.house
    rooms.value = fresh.rooms
    settings.take(fresh.estimate)
    const { changed } = takeWhole(fresh, {
      list,
      removed,
      figures,
      isOrderOurs: isOrderUnsaved,
      isBeingEdited: ({ key }) => key === editedKey,
    })
    for (const row of list.rows()) row.figures = figures.of(row.key)
    saver.review(changed)
    tell({ rows: list.rows(), isStructural: true })
    saver.want(changed.filter((row) => !row.isRemoved))
  }

  /** Shows what the line would come to with `fields`, without keeping it; `null` goes back to how it is. */
  function preview(key: string, fields: Partial<LineFields> | null): void {
    const row = list.find(key)
    if (!row) return
    row.previewed = fields
    figures.set(row, { ...row.fields, ...fields })
    tell({ rows: [row], isStructural: false })
  }

  /** Keeps what was keyed into a field that somebody else changed while it was being keyed: both values stand until a person chooses. */
  function keepBoth(key: string, field: LineField, value: LineFields[LineField]): void {
    const row = list.find(key)
    if (!row) return
    changes.setAtOdds(row, field, value)
    tell({ rows: [row], isStructural: isGroupTouched({ [field]: true }) })
    saver.want([row])
  }

  /** Settles a field that somebody else changed too. */
  function settle(row: LineRow, field: LineField, choice: 'mine' | 'theirs'): void {
    settleConflict(row, field, choice)
    row.state = lineSaver.restingState(row)
    figures.set(row)
    tell({ rows: [row], isStructural: isGroupTouched({ [field]: true }) })
    saver.want([row])
  }

  /** What becomes of a line that was changed here and removed elsewhere. */
  function settleGone(row: LineRow, choice: 'put-back' | 'let-go'): void {
    row.problem = ''
    row.state = choice === 'put-back' ? 'saving' : 'saved'
    if (choice === 'let-go') changes.drop(row)
    tell({ rows: [row], isStructural: true })
    saver.want([row])
  }

  return {
    estimateId,
    estimate: settings.estimate as Readonly<ShallowRef<Estimate>>,
    settingsConflicts: settings.conflicts,
    settingsProblem: settings.problem,
    house: house as Readonly<ShallowRef<House>>,
    rooms: rooms as Readonly<ShallowRef<readonly Room[]>>,
    list,
    apply,
    preview,
    take,
    keepBoth,
    settle,
    settleSettings(path: string, choice: 'mine' | 'theirs'): void {
      settings.settle(path, choice)
      figures.setSettings(settings.estimate.value.settings)
      tell({ rows: [], isStructural: false })
      saver.want([])
    },
    settleGone,
    /** Says which line somebody is typing in, so that it isn't taken from under the cursor. */
    setEdited(key: string | null): void {
      editedKey = key
    },
    /** A live event: the estimate got to this version. */
    heard(version: number): void {
      versions.heard(version)
      if (!saver.isBusy()) catchUp()
    },
    totals: figures.totals,
    subtotals: figures.subtotals,
    leftOut: figures.leftOut,
    saving: { state: saver.state, troubled: saver.troubled, retry: saver.retry, hasUnsent: saver.hasUnsent, stop: saver.stop },
    onNews(listener: (news: ModelNews) => void): () => void {
      listeners.add(listener)
      return () => listeners.delete(listener)
    },
  }
}

export type EstimateModel = ReturnType<typeof createEstimateModel>

function isRegrouping(change: EstimateChange): boolean {
  return change.kind === 'edit' && change.edits.some(({ after }) => isGroupTouched(after))
}

function isGroupTouched(fields: object): boolean {
  return 'roomId' in fields || 'system' in fields || 'trade' in fields
}
