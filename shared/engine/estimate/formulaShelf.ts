import { findUnit, type Dimension } from '../../catalogue/units.ts'
import { checkUnit, quantityOf } from '../formula/checkKinds.ts'
import { compileFormula, type Evaluate } from '../formula/compileFormula.ts'
import type { FormulaColumns } from '../formula/formulaColumns.ts'
import { FormulaError } from '../formula/formulaError.ts'
import { dimensionOf } from '../formula/kinds.ts'
import type { FormulaParser } from '../formula/parsedNode.ts'
import { parseFormula } from '../formula/parseFormula.ts'
import { someNode, type FormulaNode } from '../formula/syntaxTree.ts'
import { ROOMS_HOUSE_MEASURES } from '../takeoff/houseMeasureList.ts'
import type { LineInput } from '../estimateInput.ts'
import { lineErrorOf, type LineError } from './lineError.ts'

/** A line's quantity, ready to be worked out; one that can't be read holds its error instead of a tree. */
export type LineFormula = LineFormulaParts & ({ node: FormulaNode; error: null } | { node: null; error: LineError })

interface LineFormulaParts {
  evaluate: Evaluate
  dimension: Dimension | 'any' | null
  /** Measures of the house that come from its rooms. */
  roomsMeasures: readonly string[]
  /** Whether a change of any room changes it. */
  dependsOnRooms: boolean
}

/** More distinct formulas than an estimate needs; every keystroke of one that is being typed adds one. */
const SHELF_MAX = 4000

const ROOMS_MEASURE_NAMES: ReadonlySet<string> = new Set(ROOMS_HOUSE_MEASURES.map(({ name }) => name))

/** Reads and compiles each distinct formula once; lines with the same text, scope and unit share it. */
export class FormulaShelf {
  private readonly formulas = new Map<string, LineFormula>()

  constructor(
    private readonly columns: FormulaColumns,
    private readonly parse: FormulaParser,
  ) {}

  formulaOf({ quantity, roomKey, unit }: Pick<LineInput, 'quantity' | 'roomKey' | 'unit'>): LineFormula {
    const text = String(quantity)
    const scope = roomKey === null ? 'house' : 'room'
    const shelfKey = `${scope}\n${unit}\n${text}`
    const known = this.formulas.get(shelfKey)
    if (known) return known
    if (this.formulas.size >= SHELF_MAX) this.formulas.clear()
    const formula = this.read(text, scope, unit)
    this.formulas.set(shelfKey, formula)
    return formula
  }

  private read(text: string, scope: 'room' | 'house', unit: string): LineFormula {
    try {
      const known = findUnit(unit)
      if (known === null)
        throw new FormulaError('unknown-unit', `\`${unit}\` is not a unit that is known here. Write sf, lf, each …`, [0, 0])
      const node = parseFormula(text, scope, this.parse)
      const kind = quantityOf(node)
      checkUnit(kind, known, text)
      const roomsMeasures = roomsMeasuresIn(node)
      return {
        evaluate: compileFormula(node, this.columns),
        node,
        error: null,
        dimension: kind.fits === 'any' ? 'any' : dimensionOf(kind),
        roomsMeasures,
        dependsOnRooms: roomsMeasures.length > 0 || someNode(node, ({ kind: nodeKind }) => nodeKind === 'sum-rooms'),
      }
    } catch (thrown) {
      return {
        evaluate: () => NaN,
        node: null,
        error: lineErrorOf(thrown, text),
        dimension: null,
        roomsMeasures: [],
        dependsOnRooms: false,
      }
    }
  }
}

function roomsMeasuresIn(node: FormulaNode): string[] {
  return [...ROOMS_MEASURE_NAMES].filter((name) =>
    someNode(node, (part) => part.kind === 'measure' && part.measure.scope === 'house' && part.measure.name === name),
  )
}
