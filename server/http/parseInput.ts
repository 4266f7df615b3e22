import type { z } from 'zod'
import { fieldProblems, issueWords } from '../../shared/schemas/fieldProblems.ts'
import { invalid } from '../errors/AppError.ts'

/** The value as its schema gives it, or a 422 that names each bad field. */
export function parseInput<T>(schema: z.ZodType<T>, value: unknown): T {
  const parsed = schema.safeParse(value, { error: issueWords })
  if (!parsed.success) throw invalid(fieldProblems(parsed.error))
  return parsed.data
}
