import { useQueryClient, type QueryClient } from '@tanstack/vue-query'
import { onScopeDispose, shallowRef, watch, type Ref } from 'vue'
import { addLine, estimateQuery, orderLines, removeLine, restoreLine, updateEstimate, updateLine } from '../api/estimates.ts'
import type { EstimateWhole } from '../../shared/schemas/estimate.ts'
import { createEstimateModel, type EstimateModel } from './estimateModel.ts'
import { loadFormulaParser, needsFormulaParser } from './formulaParser.ts'
import { onLiveEvent } from './useLiveEvents.ts'

const calls = { addLine, updateLine, removeLine, restoreLine, orderLines, updateEstimate }

/** Models with something left to send outlive their page, so that leaving it loses nothing. */
const kept = new Map<string, EstimateModel>()

/** Reads an estimate, keeps a model of it while the caller lives, and has it follow what others change. */
export function useEstimateModel(estimateId: Ref<string | undefined>) {
  const queries = useQueryClient()
  const model = shallowRef<EstimateModel | null>(null)
  const error = shallowRef<unknown>(null)

  async function open(): Promise<void> {
    const id = estimateId.value
    close()
    error.value = null
    if (id === undefined) return
    try {
      const waiting = kept.get(id)
      if (waiting) {
        model.value = waiting
        void catchUp(queries, waiting)
        return
      }
      const opened = await openModel(queries, await readWhole(queries, id))
      const isStillWanted = estimateId.value === id
      if (isStillWanted) model.value = opened
      else forget(opened)
    } catch (problem) {
      error.value = problem
    }
  }

  function close(): void {
    const leaving = model.value
    model.value = null
    if (leaving && !leaving.saving.hasUnsent()) forget(leaving)
  }

  const stopHearing = onLiveEvent(({ type, id, version }) => {
    if (type === 'estimate' && id === model.value?.estimateId) model.value.heard(version)
  })
  /** The stream of events may have been cut while the tab was away or the machine asleep. */
  function lookAgain(): void {
    if (document.visibilityState === 'visible' && model.value) void catchUp(queries, model.value)
  }
  function retryNow(): void {
    model.value?.saving.retry()
  }
  function askBeforeLeaving(event: BeforeUnloadEvent): void {
    const hasUnsent = [...kept.values()].some((open) => open.saving.hasUnsent() || open.saving.troubled.value.length > 0)
    if (hasUnsent) event.preventDefault()
  }

  document.addEventListener('visibilitychange', lookAgain)
  window.addEventListener('online', retryNow)
  window.addEventListener('beforeunload', askBeforeLeaving)
  watch(estimateId, () => void open(), { immediate: true })
  onScopeDispose(() => {
    stopHearing()
    document.removeEventListener('visibilitychange', lookAgain)
    window.removeEventListener('online', retryNow)
    window.removeEventListener('beforeunload', askBeforeLeaving)
    close()
  })

  return { model, error, retry: open }
}

async function openModel(queries: QueryClient, whole: EstimateWhole): Promise<EstimateModel> {
  if (needsFormulaParser(whole.lines.map(({ quantity }) => quantity))) await loadFormulaParser()
  const model = createEstimateModel(whole, { calls, onBehind: () => void catchUp(queries, model) })
  kept.set(model.estimateId, model)
  return model
}

function forget(model: EstimateModel): void {
  model.saving.stop()
  kept.delete(model.estimateId)
}

/** Reads of one estimate that overlap become one. A read that fails is made up for by the next event. */
async function catchUp(queries: QueryClient, model: EstimateModel): Promise<void> {
  const whole = await readWhole(queries, model.estimateId).catch(() => null)
  if (whole && kept.get(model.estimateId) === model) model.take(whole)
}

function readWhole(queries: QueryClient, id: string): Promise<EstimateWhole> {
  return queries.fetchQuery({ ...estimateQuery(id), staleTime: 0, gcTime: 0 })
}
