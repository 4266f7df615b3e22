import { onScopeDispose, ref, shallowRef } from 'vue'
import { formatCents } from '../../shared/engine/index.ts'
import type { EstimateModel } from './estimateModel.ts'

/** A listener isn't talked over: the total is read out once typing has rested this long. */
const REST_MS = 900

/** The totals of an estimate as they stand at this keystroke, what they leave out, and a sentence for a screen reader once they rest. */
export function useEstimateTotals(model: EstimateModel) {
  const totals = shallowRef(model.totals())
  const leftOutCount = ref(model.leftOut().size)
  const announcement = ref('')
  let timer: ReturnType<typeof setTimeout> | undefined

  const stop = model.onNews(() => {
    const before = totals.value.totalCents.likely
    totals.value = model.totals()
    leftOutCount.value = model.leftOut().size
    if (totals.value.totalCents.likely === before) return
    clearTimeout(timer)
    timer = setTimeout(announce, REST_MS)
  })

  function announce(): void {
    const { low, likely, high } = totals.value.totalCents
    announcement.value = `Total ${formatCents(likely)}, from ${formatCents(low)} to ${formatCents(high)}.`
  }

  onScopeDispose(() => {
    stop()
    clearTimeout(timer)
  })

  return { totals, leftOutCount, announcement }
}
