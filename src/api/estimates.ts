import { queryOptions } from '@tanstack/vue-query'
import type {
  Estimate,
  EstimatePatch,
  EstimateWhole,
  Line,
  LinePatch,
  NewLine,
  OrderedLines,
  SavedLine,
} from '../../shared/schemas/estimate.ts'
import { http } from './http.ts'

type LineRef = Pick<Line, 'id' | 'estimateId'>
type VersionedLineRef = LineRef & Pick<Line, 'version'>

/** The whole estimate: house, rooms, lines, settings. */
export function estimateQuery(estimateId: string) {
  return queryOptions({
    queryKey: ['estimate', estimateId],
    queryFn: ({ signal }) => http.get<EstimateWhole>(`/estimates/${estimateId}`, { signal }),
    // The page keeps its own copy and compares by line version: a deep comparison of 5,000 lines would only cost time.
    structuralSharing: false,
  })
}

/** Throws a stale `ProblemError` whose `current` is the estimate as it stands now. */
export function updateEstimate(estimate: Pick<Estimate, 'id' | 'version'>, patch: EstimatePatch): Promise<Estimate> {
  return http.patch<Estimate>(`/estimates/${estimate.id}`, patch, { ifMatch: estimate.version })
}

/** The same `idempotencyKey` on a repeat adds the line once. */
export function addLine(estimateId: string, line: NewLine, idempotencyKey: string): Promise<SavedLine> {
  return http.post<SavedLine>(`/estimates/${estimateId}/lines`, line, { idempotencyKey })
}

/** Throws a stale `ProblemError` whose `current` is the line as somebody else left it. */
export function updateLine(line: VersionedLineRef, patch: LinePatch): Promise<SavedLine> {
  return http.patch<SavedLine>(linePath(line), patch, { ifMatch: line.version })
}

export function removeLine(line: VersionedLineRef): Promise<SavedLine> {
  return http.delete<SavedLine>(linePath(line), { ifMatch: line.version })
}

export function restoreLine(line: LineRef): Promise<SavedLine> {
  return http.post<SavedLine>(`${linePath(line)}/restore`)
}

/** Puts the lines in the order of the ids, which name each line once. */
export function orderLines(estimateId: string, ids: readonly string[]): Promise<OrderedLines> {
  return http.put<OrderedLines>(`/estimates/${estimateId}/lines/order`, { ids })
}

/** The estimate document, as other programs read it. */
export function exportEstimate(estimateId: string): Promise<{ content: Blob; fileName: string }> {
  return http.download(`/estimates/${estimateId}/document`)
}

/** The estimate as an .xlsx file, made on the server. */
export function downloadWorkbook(estimateId: string, signal?: AbortSignal): Promise<{ content: Blob; fileName: string }> {
  return http.download(`/estimates/${estimateId}/workbook`, signal ? { signal } : {})
}

function linePath({ estimateId, id }: LineRef): string {
  return `/estimates/${estimateId}/lines/${id}`
}
