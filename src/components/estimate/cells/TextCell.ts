import { BASIS_WORDS, roomName } from '../../../composables/lineCells.ts'
import type { GridRow } from '../../../composables/estimateRows.ts'
import type { LineField } from '../../../composables/lineRow.ts'
import { setText } from './element.ts'
import { RowCell, type GridCellParams } from './RowCell.ts'

/** A plain word of a line; what couldn't be taken stands in its place, with why in its title. */
abstract class TextCell extends RowCell {
  protected abstract readonly field: LineField
  protected abstract text(row: Extract<GridRow, { kind: 'line' }>, params: GridCellParams): string

  protected className(): string {
    return 'text-cell'
  }

  protected show(row: GridRow, params: GridCellParams): void {
    const wrong = row.kind === 'line' ? row.wrong[this.field] : undefined
    const text = row.kind === 'line' ? (wrong?.text ?? this.text(row, params)) : ''
    setText(this.box, text)
    this.box.title = wrong?.words ?? text
  }
}

export class RoomCell extends TextCell {
  protected readonly field = 'roomId'

  protected text({ fields }: Extract<GridRow, { kind: 'line' }>, { context }: GridCellParams): string {
    return roomName(fields.roomId, context.rooms())
  }
}

export class BasisCell extends TextCell {
  protected readonly field = 'basis'

  protected text({ fields }: Extract<GridRow, { kind: 'line' }>): string {
    return BASIS_WORDS[fields.basis]
  }
}

export class NoteCell extends TextCell {
  protected readonly field = 'note'

  protected text({ fields }: Extract<GridRow, { kind: 'line' }>): string {
    return fields.note
  }
}
