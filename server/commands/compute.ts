import { readFile } from 'node:fs/promises'
import { buffer } from 'node:stream/consumers'
import { computeEstimate, readEstimateDocument } from '../../shared/engine/index.ts'
import type { FieldProblem, Problem } from '../../shared/schemas/problem.ts'

/** What a shell sees when the document can't be computed. */
const BAD_DOCUMENT = 2

await compute(process.argv[2])

/** Prints the results of an estimate document; of one that can't be read, problem details. `-` is standard input. */
async function compute(path: string | undefined): Promise<void> {
  if (path === undefined)
    return refuse('no-document', 'Name an estimate document: npm run --silent compute -- FILE.json, or - for standard input.')
  const text = await readText(path)
  if (text === null) return refuse('unreadable', `${path} can not be read.`)
  const json = parseJson(text)
  if ('message' in json) return refuse('not-json', `The document is not JSON: ${json.message}`)
  const read = readEstimateDocument(json.value)
  if (!read.ok) return refuse('invalid', detailOf(read.errors), read.errors)
  print(computeEstimate(read.input))
}

async function readText(path: string): Promise<string | null> {
  try {
    const bytes = path === '-' ? await buffer(process.stdin) : await readFile(path)
    return bytes.toString('utf8').replace(/^\uFEFF/, '')
  } catch {
    return null
  }
}

function parseJson(text: string): { value: unknown } | { message: string } {
  try {
    return { value: JSON.parse(text) as unknown }
  } catch (error) {
    return { message: error instanceof Error ? error.message : String(error) }
  }
}

function refuse(code: string, detail: string, errors?: FieldProblem[]): void {
  const problem: Problem = { type: 'about:blank', title: 'Unprocessable Entity', status: 422, detail, code, ...(errors && { errors }) }
  print(problem)
  process.exitCode = BAD_DOCUMENT
}

function detailOf(errors: readonly FieldProblem[]): string {
  const [first] = errors
  if (errors.length > 1 || first === undefined) return `${errors.length} fields of the document need another look.`
  return first.path === '' ? `The document ${first.message}.` : `${first.path}: ${first.message}`
}

function print(value: unknown): void {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`)
}
