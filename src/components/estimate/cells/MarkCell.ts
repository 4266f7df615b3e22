import type { Evidence } from '../../../../shared/schemas/estimate.ts'
import { EVIDENCE_WORDS } from '../../base/evidenceWords.ts'
import type { GridRow } from '../../../composables/estimateRows.ts'
import { RowCell } from './RowCell.ts'

const SHAPES: Record<Evidence, string> = {
  seen: '<circle cx="8" cy="8" r="5.5"/>',
  measured: '<circle cx="8" cy="8" r="5.5"/><path class="filled" d="M8 2.5a5.5 5.5 0 0 1 0 11z"/>',
  tested: '<circle class="filled" cx="8" cy="8" r="5.5"/>',
  bid: '<rect class="filled" x="2.5" y="2.5" width="11" height="11"/>',
}

/** How a line is known: the evidence mark, drawn as `EvidenceMark` draws it. */
export class MarkCell extends RowCell {
  private shown: Evidence | null = null

  protected className(): string {
    return 'mark-cell'
  }

  protected show(row: GridRow): void {
    const mark = row.kind === 'line' ? row.fields.evidence : null
    if (mark === this.shown) return
    this.shown = mark
    this.box.dataset.mark = mark ?? ''
    this.box.title = mark === null ? '' : EVIDENCE_WORDS[mark]
    this.box.innerHTML = mark === null ? '' : `<svg viewBox="0 0 16 16" role="img" aria-label="${mark}">${SHAPES[mark]}</svg>`
  }
}
