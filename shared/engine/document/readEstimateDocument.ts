import { fieldProblems, issueWords } from '../../schemas/fieldProblems.ts'
import type { FieldProblem } from '../../schemas/problem.ts'
import type { EstimateInput, LineInput } from '../estimateInput.ts'
import { effectivePrice } from '../pricing/effectivePrice.ts'
import { crossCheck } from './crossCheck.ts'
import { documentSchema, type KeyedEstimate } from './documentSchema.ts'
import type { EstimateDocument } from './estimateDocument.ts'
import type { KeyedLine } from './lineDocument.ts'

export type ReadDocument =
  | {
      ok: true
      /** As it was given. */
      document: EstimateDocument
      /** What the engine computes. */
      input: EstimateInput
      /** What the app keeps of it: fields as a person keys them, lengths in inches, money in cents, defaults filled in. */
      keyed: KeyedEstimate
    }
  | { ok: false; errors: FieldProblem[] }

/** Checks an estimate document and reads it. Every field that is wrong is named by its path, with words; unknown fields are refused by name. */
export function readEstimateDocument(json: unknown): ReadDocument {
  const read = documentSchema.safeParse(json, { error: issueWords })
  if (!read.success) return { ok: false, errors: fieldProblems(read.error) }
  const problems = crossCheck(read.data)
  if (problems.length > 0) return { ok: false, errors: problems }
  return { ok: true, document: json as EstimateDocument, input: toInput(read.data), keyed: read.data }
}

function toInput({ house, rooms, lines, settings }: KeyedEstimate): EstimateInput {
  const { storeys, footprint, wallHeightIn, overhangIn, roof } = house
  return {
    house: { storeys, footprint, wallHeightIn, overhangIn, roof },
    rooms: rooms.map(({ key, name, use, shape, ceiling, openings, deductions }) => ({
      key,
      name,
      use,
      shape,
      ceiling,
      openings,
      deductions,
    })),
    lines: lines.map(toLineInput),
    settings,
  }
}

function toLineInput(line: KeyedLine): LineInput {
  const { key, roomKey, system, trade, unit, quantity, wastePercent, packageSize, basis, minimumChargeCents, hoursPerUnit, evidence } = line
  return {
    key,
    roomKey,
    system,
    trade,
    unit,
    quantity,
    wastePercent,
    packageSize,
    basis,
    unitPriceE4: effectivePrice(line),
    minimumChargeCents,
    hoursPerUnit,
    evidence,
  }
}
