import type { ColDef, ColGroupDef, ICellRendererParams } from 'ag-grid-community'
import { HOUSE_SYSTEMS } from '../../../shared/catalogue/houseSystems.ts'
import { cellText, RANGES, type CellField } from './itemFields.ts'
import { isCellChanged, shownText, type GridRow } from './gridRows.ts'

export interface ColumnOptions {
  /** Which cells may be keyed into. */
  mayEdit: (field: CellField) => boolean
  /** Version that the marks of changed cells compare with. */
  versionBefore: number | null
  /** The prices are a region's, by its factors or its own. */
  isRegional: boolean
}

interface FieldColumn {
  field: CellField
  title: string
  /** Said of the cell by itself, where the head alone would not tell. */
  spokenTitle: string
  width: number
  isFigure: boolean
}

const RANGE_TITLES = { materials: 'Materials, $', installed: 'Installed, $' }
const END_TITLES = [
  ['low', 'Low'],
  ['likely', 'Likely'],
  ['high', 'High'],
] as const
const AFTER_PRICES: readonly FieldColumn[] = [
  { field: 'minimumChargeCents', title: 'Minimum, $', spokenTitle: 'Minimum charge', width: 96, isFigure: true },
  { field: 'laborSharePercent', title: 'Labor, %', spokenTitle: 'Labor share', width: 80, isFigure: true },
  { field: 'wastePercent', title: 'Waste, %', spokenTitle: 'Waste', width: 82, isFigure: true },
  { field: 'packageSize', title: 'Package', spokenTitle: 'Package size', width: 84, isFigure: true },
  { field: 'packageName', title: 'Packed in', spokenTitle: 'Package name', width: 90, isFigure: false },
  { field: 'hoursPerUnit', title: 'Hours a unit', spokenTitle: 'Hours a unit', width: 100, isFigure: true },
]
const LAST: readonly FieldColumn[] = [
  { field: 'uniformat', title: 'UNIFORMAT', spokenTitle: 'UNIFORMAT II code', width: 100, isFigure: false },
  { field: 'priceDate', title: 'Price date', spokenTitle: 'Price date', width: 104, isFigure: false },
  { field: 'note', title: 'Note', spokenTitle: 'Note', width: 320, isFigure: false },
]
const systemTitles = new Map<string, string>(HOUSE_SYSTEMS.map(({ key, title }) => [key, title]))

/** The column that opens an item with all its fields. */
export const OPEN_COLUMN = 'open'

const SOURCE_COLUMN: ColDef<GridRow> = {
  colId: 'source',
  headerName: 'Price is',
  width: 92,
  valueGetter: ({ data }) => (data?.item.isRegionsOwn ? 'its own' : 'by factors'),
}

/** Columns of the price book: name first, then prices, then what a quantity and a package need, then the rest. */
export function priceBookColumns(options: ColumnOptions): (ColDef<GridRow> | ColGroupDef<GridRow>)[] {
  const column = (spec: FieldColumn) => fieldColumn(spec, options)
  return [
    {
      colId: OPEN_COLUMN,
      headerName: 'Open',
      width: 62,
      pinned: 'left',
      sortable: false,
      resizable: false,
      suppressMovable: true,
      valueGetter: () => 'Open',
      cellClass: 'open-cell',
      cellRenderer: openRenderer,
    },
    { ...column({ field: 'name', title: 'Item', spokenTitle: 'Name', width: 280, isFigure: false }), pinned: 'left', initialSort: 'asc' },
    { colId: 'unit', headerName: 'Unit', width: 66, valueGetter: ({ data }) => data?.item.unit },
    ...(options.isRegional ? [SOURCE_COLUMN] : []),
    ...RANGES.map((range): ColGroupDef<GridRow> => ({
      headerName: RANGE_TITLES[range],
      marryChildren: true,
      children: END_TITLES.map(([end, title]) =>
        column({
          field: `${range}.${end}`,
          title,
          spokenTitle: `${range === 'materials' ? 'Materials' : 'Installed'} ${end}`,
          width: 86,
          isFigure: true,
        }),
      ),
    })),
    ...AFTER_PRICES.map(column),
    { colId: 'system', headerName: 'House system', width: 190, valueGetter: ({ data }) => systemTitles.get(data?.item.system ?? '') },
    ...LAST.map(column),
    { colId: 'key', headerName: 'Key', width: 220, valueGetter: ({ data }) => data?.item.key },
  ]
}

/** What a screen reader calls the cell that is edited. */
export function spokenTitle(field: string): string {
  const [name, end] = field.split('.')
  if (end !== undefined) return `${name === 'materials' ? 'Materials' : 'Installed'} ${end}`
  return [...AFTER_PRICES, ...LAST].find((spec) => spec.field === field)?.spokenTitle ?? 'Name'
}

function fieldColumn({ field, title, width, isFigure }: FieldColumn, { mayEdit, versionBefore }: ColumnOptions): ColDef<GridRow> {
  return {
    colId: field,
    headerName: title,
    width,
    editable: mayEdit(field),
    valueGetter: ({ data }) => data && shownText(data, field),
    ...(isFigure ? { valueFormatter: ({ data, value }) => (data?.held[field] ? value : withCommas(value)) } : {}),
    equals: () => false,
    headerClass: isFigure ? 'figure-head' : '',
    cellClass: isFigure ? 'figure-cell' : '',
    cellClassRules: {
      'held-cell': ({ data }) => data?.held[field] !== undefined,
      'changed-cell': ({ data }) => data !== undefined && isCellChanged(data, field),
      'added-cell': ({ data }) => data?.before === null,
    },
    cellRendererSelector: ({ data }) => {
      const isMarked = data !== undefined && (data.held[field] !== undefined || isCellChanged(data, field))
      return isMarked ? { component: (params: ICellRendererParams<GridRow>) => markedRenderer(params, field, versionBefore) } : undefined
    },
    ...(isFigure ? { comparator: compareFigures } : { comparator: (a: string, b: string) => (a ?? '').localeCompare(b ?? '') }),
  }
}

/** `1200.00` → `1,200.00`, to read; what is edited has none. */
function withCommas(text: string | undefined): string {
  const [whole = '', ...decimals] = (text ?? '').split('.')
  return [whole.replace(/\B(?=(?:\d{3})+$)/g, ','), ...decimals].join('.')
}

/** Empty cells come after all figures. */
function compareFigures(a: string | undefined, b: string | undefined): number {
  const figure = (text: string | undefined) => (text ? Number(text) : Number.POSITIVE_INFINITY)
  const [left, right] = [figure(a), figure(b)]
  if (left === right) return 0
  return left < right ? -1 : 1
}

function openRenderer({ data }: ICellRendererParams<GridRow>): HTMLElement {
  const button = document.createElement('button')
  button.type = 'button'
  button.className = 'open-button'
  button.tabIndex = -1
  button.textContent = 'Open'
  button.setAttribute('aria-label', `Open ${data?.item.name ?? 'the item'}`)
  return button
}

/** The figure with what is to be said about it: read out, and shown when the pointer rests on it. */
function markedRenderer(
  { data, value, valueFormatted }: ICellRendererParams<GridRow>,
  field: CellField,
  versionBefore: number | null,
): HTMLElement {
  const cell = document.createElement('span')
  cell.textContent = String(valueFormatted ?? value ?? '')
  const words = data ? markWords(data, field, versionBefore) : ''
  cell.title = words
  const spoken = document.createElement('span')
  spoken.className = 'visually-hidden'
  spoken.textContent = `, ${words}`
  cell.append(spoken)
  return cell
}

function markWords({ held, before }: GridRow, field: CellField, versionBefore: number | null): string {
  const problem = held[field]?.problem
  if (problem !== undefined) return `not saved: ${problem}`
  const was = before ? cellText(before, field) : ''
  return `${was === '' ? 'empty' : was} in version ${versionBefore ?? ''}`.trim()
}
