import { onScopeDispose, ref } from 'vue'
import { downloadWorkbook } from '../api/estimates.ts'
import { saveFile } from './saveFile.ts'
import { useErrorMessage } from './useErrorMessage.ts'

const SHOWN_AFTER_MS = 500

/** Fetches the workbook of an estimate and hands it to the browser to keep. What takes longer than half a second shows, and can be given up. */
export function useWorkbookDownload() {
  const errorMessage = useErrorMessage()
  const isUnderWay = ref(false)
  /** Under way for long enough to be told. */
  const isSlow = ref(false)
  /** Why there is no workbook, in words; empty when all is well. */
  const problem = ref('')
  let giveUp: AbortController | null = null

  async function download(estimateId: string): Promise<void> {
    if (isUnderWay.value) return
    isUnderWay.value = true
    problem.value = ''
    giveUp = new AbortController()
    const timer = setTimeout(() => (isSlow.value = true), SHOWN_AFTER_MS)
    try {
      saveFile(await downloadWorkbook(estimateId, giveUp.signal))
    } catch (error) {
      if (!giveUp.signal.aborted) problem.value = errorMessage(error)
    } finally {
      clearTimeout(timer)
      isUnderWay.value = false
      isSlow.value = false
    }
  }

  function cancel(): void {
    giveUp?.abort()
  }

  onScopeDispose(cancel)
  return { download, cancel, isUnderWay, isSlow, problem }
}
