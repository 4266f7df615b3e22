import type { AppContext } from 'vue'
import type { CellClassParams, ColDef, EditableCallbackParams, ValueGetterParams, ValueSetterParams } from 'ag-grid-community'
import { EVIDENCE_MARKS } from '../../../shared/schemas/estimate.ts'
import { NAME_MAX, NOTE_MAX } from '../../../shared/schemas/common.ts'
import { WHOLE_HOUSE, type GridRow } from '../../composables/estimateRows.ts'
import { FIELD_OF_COLUMN, type CellColumn } from '../../composables/lineCells.ts'
import type { LineField } from '../../composables/lineRow.ts'
import { AmountCell } from './cells/AmountCell.ts'
import { DescriptionCell } from './cells/DescriptionCell.ts'
import { HoursCell } from './cells/HoursCell.ts'
import { MarkCell } from './cells/MarkCell.ts'
import { PriceCell } from './cells/PriceCell.ts'
import { QuantityCell } from './cells/QuantityCell.ts'
import { RangeCell } from './cells/RangeCell.ts'
import { BasisCell, NoteCell, RoomCell } from './cells/TextCell.ts'
import ChoiceCellEditor, { type Choice } from './editors/ChoiceCellEditor.vue'
import FormulaCellEditor from './editors/FormulaCellEditor.vue'
import TextCellEditor from './editors/TextCellEditor.vue'
import { vueCellEditor } from './editors/vueCellEditor.ts'
import { COLUMN_TITLES } from './columnTitles.ts'
import type { GridContext } from './gridContext.ts'
import { columnOfError } from './lineProblem.ts'

type Column = ColDef<GridRow> & { colId: CellColumn }

/** From here on a window has room for whole descriptions and formulas. */
const WIDE_WINDOW = 1700
const MARK_CHOICES: readonly Choice[] = EVIDENCE_MARKS.map((mark) => ({ value: mark, title: mark, mark }))

interface ColumnOptions {
  isReadOnly: boolean
  /** What the editors stand in: stores, theme, routes. */
  appContext: AppContext | null
  isSelected(key: string, column: string): boolean
  isFound(key: string): boolean
}

/** The columns of the estimate grid, left to right; the first two stay in view. */
export function estimateColumns({ isReadOnly, appContext, isSelected, isFound }: ColumnOptions): Column[] {
  const choiceEditor = vueCellEditor(ChoiceCellEditor, appContext)
  const formulaEditor = vueCellEditor(FormulaCellEditor, appContext)
  const textEditor = vueCellEditor(TextCellEditor, appContext)
  const isEditable = ({ data }: EditableCallbackParams<GridRow>) => !isReadOnly && data?.kind === 'line'
  const classRules = {
    'is-selected': ({ data, column }: CellClassParams<GridRow>) => data !== undefined && isSelected(data.key, column.getColId()),
    'is-found': ({ data }: CellClassParams<GridRow>) => data !== undefined && isFound(data.key),
    'is-wrong': ({ data, column }: CellClassParams<GridRow>) => hasProblem(data, column.getColId() as CellColumn),
    'is-at-odds': ({ data, column }: CellClassParams<GridRow>) => isAtOdds(data, column.getColId() as CellColumn),
  }
  const column = (colId: CellColumn, width: number, more: Partial<ColDef<GridRow>>): Column => ({
    headerName: COLUMN_TITLES[colId],
    width,
    cellClassRules: classRules,
    valueGetter: valueOf,
    valueSetter: keep,
    ...more,
    colId,
  })

  const isWide = window.innerWidth >= WIDE_WINDOW
  return [
    column('evidence', 62, {
      pinned: 'left',
      lockPosition: 'left',
      headerTooltip: 'How it is known',
      cellRenderer: MarkCell,
      editable: isEditable,
      cellEditor: choiceEditor,
      cellEditorParams: { choices: () => MARK_CHOICES, label: 'How it is known' },
    }),
    column('description', isWide ? 320 : 216, {
      pinned: 'left',
      lockPosition: 'left',
      cellRenderer: DescriptionCell,
      editable: isEditable,
      cellEditor: textEditor,
      cellEditorParams: { label: 'Description', maxLength: NAME_MAX },
    }),
    column('room', 112, {
      cellRenderer: RoomCell,
      editable: isEditable,
      cellEditor: choiceEditor,
      cellEditorParams: ({ context }: { context: GridContext }) => ({ choices: () => roomChoices(context), label: 'Room' }),
    }),
    column('quantity', isWide ? 320 : 236, { cellRenderer: QuantityCell, editable: isEditable, cellEditor: formulaEditor }),
    column('basis', 90, { cellRenderer: BasisCell }),
    column('price', 132, { cellRenderer: PriceCell, type: 'figure' }),
    column('amount', 104, { cellRenderer: AmountCell, type: 'figure' }),
    column('range', 104, { cellRenderer: RangeCell }),
    column('hours', 60, { cellRenderer: HoursCell, type: 'figure' }),
    column('note', 180, {
      flex: 1,
      minWidth: 80,
      cellRenderer: NoteCell,
      editable: isEditable,
      cellEditor: textEditor,
      cellEditorParams: { label: 'Note', maxLength: NOTE_MAX, isLong: true },
    }),
  ]
}

/** The model keeps what was keyed and has the row drawn; to the grid itself nothing changed. */
function keep({ data, column, newValue, context }: ValueSetterParams<GridRow, unknown>): boolean {
  if (data?.kind === 'line') (context as GridContext).editing.commit(data, column.getColId() as CellColumn, newValue)
  return false
}

/** What an editor begins with, and what tells the grid that a cell differs. */
function valueOf({ data, column }: ValueGetterParams<GridRow>): unknown {
  if (data?.kind !== 'line') return null
  const field = FIELD_OF_COLUMN[column.getColId() as CellColumn]
  return field === null ? null : (data.wrong[field]?.text ?? data.fields[field])
}

function roomChoices({ rooms }: GridContext): Choice[] {
  return [{ value: null, title: WHOLE_HOUSE }, ...rooms().map(({ id, name }) => ({ value: id, title: name }))]
}

function hasProblem(row: GridRow | undefined, column: CellColumn): boolean {
  if (row?.kind !== 'line') return false
  const field = FIELD_OF_COLUMN[column]
  return (field !== null && row.wrong[field] !== undefined) || (row.figures.error !== null && columnOfError(row) === column)
}

function isAtOdds(row: GridRow | undefined, column: CellColumn): boolean {
  const field: LineField | null = FIELD_OF_COLUMN[column]
  return row?.kind === 'line' && field !== null && row.conflicts.some(({ path }) => path === field)
}
