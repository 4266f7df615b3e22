import { parentPort } from 'node:worker_threads'
import { computeEstimate, toEstimateInput, workbookSheets, type WorkbookContext } from '../../shared/engine/index.ts'
import type { EstimateWhole } from '../../shared/schemas/estimate.ts'
import { writeWorkbook } from '../features/workbook/writeWorkbook.ts'

export interface WorkbookJob {
  id: number
  /** The whole estimate as JSON text, as the database gives it: it's taken apart here, off the main thread. */
  wholeText: string
  context: WorkbookContext
}

export type WorkbookJobDone = { id: number; bytes: Uint8Array<ArrayBuffer> } | { id: number; error: string }

parentPort?.on('message', (job: WorkbookJob) => {
  void answer(job)
})

async function answer({ id, wholeText, context }: WorkbookJob): Promise<void> {
  try {
    const whole = JSON.parse(wholeText) as EstimateWhole
    const results = computeEstimate(toEstimateInput(whole))
    const bytes = new Uint8Array(await writeWorkbook(workbookSheets(whole, results, context)))
    parentPort?.postMessage({ id, bytes } satisfies WorkbookJobDone, [bytes.buffer])
  } catch (error) {
    parentPort?.postMessage({
      id,
      error: error instanceof Error ? (error.stack ?? error.message) : String(error),
    } satisfies WorkbookJobDone)
  }
}
