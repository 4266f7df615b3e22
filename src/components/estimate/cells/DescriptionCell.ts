import type { GridRow } from '../../../composables/estimateRows.ts'
import type { LineState } from '../../../composables/lineRow.ts'
import { element, setText } from './element.ts'
import { RowCell, type GridCellParams } from './RowCell.ts'

const STATE_WORDS: Record<LineState, string> = {
  saved: '',
  saving: '',
  waiting: 'not saved yet',
  refused: 'not saved',
  'at-odds': 'two values',
  gone: 'removed elsewhere',
}

/** What a line is for, and where it isn't saved, that; at the foot of a group, the place to add one. */
export class DescriptionCell extends RowCell {
  private readonly words = element('span', 'words')
  private readonly state = element('span', 'line-state')

  constructor() {
    super()
    this.box.append(this.words, this.state)
  }

  protected className(): string {
    return 'description-cell'
  }

  protected show(row: GridRow, { context }: GridCellParams): void {
    if (row.kind !== 'line') {
      const mayAdd = row.kind === 'foot' && !context.isReadOnly
      this.words.className = mayAdd ? 'add-words' : 'words'
      setText(this.words, mayAdd ? 'Add a line' : '')
      setText(this.state, '')
      return
    }
    const wrong = row.wrong.description
    this.words.className = 'words'
    setText(this.words, wrong?.text ?? row.fields.description)
    setText(this.state, STATE_WORDS[row.state])
    this.state.title = row.problem
    this.box.title = wrong?.words ?? row.fields.description
  }
}
