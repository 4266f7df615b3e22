import { checkFormula } from '../../../shared/engine/index.ts'
import type { PriceItemFields } from '../../../shared/schemas/priceItem.ts'
import type { FieldProblem } from '../../../shared/schemas/problem.ts'
import type { Queryable } from '../../db/client.ts'
import { invalid, notFound } from '../../errors/AppError.ts'
import { currentRow } from './draftRows.ts'
import { findRegionsOfItem } from './priceItemRepository.ts'
import { findRegion } from './priceRegionRepository.ts'

/** What the schema can't see: formulas that fit the unit, and a unit that an item's rows of all regions share. */
export function checkDraftItem(tx: Queryable, draft: number, fields: PriceItemFields, regionKey: string | null): void {
  const unitProblems = regionKey === null ? baseUnitProblems(tx, draft, fields) : regionProblems(tx, draft, fields, regionKey)
  const problems = [...formulaProblems(fields), ...unitProblems]
  if (problems.length > 0) throw invalid(problems)
}

/** A region's own prices are for the unit that they were keyed in. */
function baseUnitProblems(tx: Queryable, draft: number, { key, unit }: PriceItemFields): FieldProblem[] {
  const others = findRegionsOfItem(tx, draft, key).filter((regionKey) => {
    const own = currentRow(tx, draft, { key, regionKey })
    return own !== null && own.unit !== unit
  })
  if (others.length === 0) return []
  const message = `can't change while regions have prices of their own for it (${others.join(', ')}): drop those first`
  return [{ path: 'unit', code: 'regions-own', message }]
}

function formulaProblems({ roomFormula, houseFormula, unit }: PriceItemFields): FieldProblem[] {
  const formulas = [
    { path: 'roomFormula', scope: 'room', text: roomFormula },
    { path: 'houseFormula', scope: 'house', text: houseFormula },
  ] as const
  return formulas.flatMap(({ path, scope, text }) => {
    if (text === null) return []
    const checked = checkFormula(text, { scope, unit })
    return checked.ok ? [] : [{ path, code: checked.code, message: checked.message }]
  })
}

function regionProblems(tx: Queryable, draft: number, { key, unit }: PriceItemFields, regionKey: string): FieldProblem[] {
  if (!findRegion(tx, draft, regionKey)) throw notFound('region')
  const base = currentRow(tx, draft, { key, regionKey: null })
  if (!base) return [{ path: 'key', code: 'unknown-item', message: 'is not an item of the draft: a region prices an item that there is' }]
  return base.unit === unit ? [] : [{ path: 'unit', code: 'other-unit', message: `must be ${base.unit}, as the item itself` }]
}
