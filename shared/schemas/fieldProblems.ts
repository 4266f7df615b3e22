import type { z } from 'zod'
import type { FieldProblem } from './problem.ts'

/** The part of a zod issue that the words are made of; zod hands over more. */
interface RawIssue {
  code?: string | undefined
  input?: unknown
  expected?: unknown
  origin?: unknown
  minimum?: unknown
  maximum?: unknown
  inclusive?: unknown
  values?: unknown
  divisor?: unknown
}

const KIND_WORDS: Record<string, string> = {
  string: 'must be text',
  number: 'must be a number',
  int: 'must be a whole number',
  boolean: 'must be true or false',
  array: 'must be a list',
  tuple: 'must be a list',
  object: 'must be an object',
  record: 'must be an object',
}

/**
 * Words for an issue whose schema brought none of its own, made to follow the field's name: "is missing", "must be a number".
 * Hand it to zod as `schema.safeParse(value, { error: issueWords })`.
 */
export function issueWords(issue: RawIssue): string {
  switch (issue.code) {
    case 'invalid_type':
      return issue.input === undefined ? 'is missing' : (KIND_WORDS[String(issue.expected)] ?? `must be ${String(issue.expected)}`)
    case 'too_small':
      return tooSmallWords(issue)
    case 'too_big':
      return tooBigWords(issue)
    case 'invalid_value':
      return issue.input === undefined ? 'is missing' : `must be one of ${listed(issue.values)}`
    case 'not_multiple_of':
      return `must be a multiple of ${String(issue.divisor)}`
    case 'unrecognized_keys':
      return 'is not a known field'
    case 'invalid_union':
      return issue.input === undefined ? 'is missing' : 'has none of the forms that are taken here'
    default:
      return 'is not in a form that is taken here'
  }
}

function tooSmallWords({ origin, minimum, inclusive }: RawIssue): string {
  if (origin === 'string') return minimum === 1 ? 'is empty' : `needs at least ${String(minimum)} characters`
  if (origin === 'array' || origin === 'set') return `needs at least ${String(minimum)} entries`
  return inclusive ? `must be at least ${String(minimum)}` : `must be more than ${String(minimum)}`
}

function tooBigWords({ origin, maximum, inclusive }: RawIssue): string {
  if (origin === 'string') return `is longer than ${String(maximum)} characters`
  if (origin === 'array' || origin === 'set') return `has more than ${String(maximum)} entries`
  return inclusive ? `must be at most ${String(maximum)}` : `must be less than ${String(maximum)}`
}

function listed(values: unknown): string {
  return Array.isArray(values) ? values.map(String).join(', ') : String(values)
}

/** `['openings', 0, 'widthIn']` → `openings[0].widthIn`, as a body is addressed. */
function fieldPath(path: readonly PropertyKey[]): string {
  return path.reduce<string>((text, part) => {
    if (typeof part === 'number') return `${text}[${part}]`
    return text === '' ? String(part) : `${text}.${String(part)}`
  }, '')
}

/** The bad fields of a refused value. An unknown key is named itself, not the object around it. */
export function fieldProblems(error: z.ZodError): FieldProblem[] {
  return error.issues.flatMap((issue) => {
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({ path: fieldPath([...issue.path, key]), code: 'unknown-field', message: issue.message }))
    }
    return [{ path: fieldPath(issue.path), code: ownCode(issue) ?? issue.code.replaceAll('_', '-'), message: issue.message }]
  })
}

/** The code that a check of our own gave with its issue: `params: { code: 'bad-length' }`. */
function ownCode(issue: z.core.$ZodIssue): string | null {
  const code: unknown = issue.code === 'custom' ? issue.params?.code : null
  return typeof code === 'string' ? code : null
}
