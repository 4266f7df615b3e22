import { spawn } from 'node:child_process'
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { computeEstimate, readEstimateDocument } from '../../shared/engine/index.ts'
import { buildEstimateDocument } from '../support/buildEstimateDocument.ts'
import { runProgram } from '../support/runProgram.ts'

const COMPUTE = 'server/commands/compute.ts'
let folder: string

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'quoinbook-compute-'))
})
afterAll(() => rm(folder, { recursive: true }))

async function computeText(text: string) {
  const path = join(folder, 'estimate.json')
  await writeFile(path, text)
  const { code, out, err } = await runProgram(COMPUTE, [path], {})
  expect(err).toBe('')
  return { code, answer: JSON.parse(out) as unknown }
}

async function computeInput(text: string) {
  const program = spawn(process.execPath, ['--import', 'tsx', COMPUTE, '-'], { stdio: ['pipe', 'pipe', 'inherit'] })
  let out = ''
  program.stdout.on('data', (chunk: Buffer) => (out += chunk.toString()))
  program.stdin.end(text)
  const code = await new Promise<number | null>((resolve) => program.once('close', resolve))
  return { code, answer: JSON.parse(out) as unknown }
}

function resultsOf(document: unknown) {
  const read = readEstimateDocument(document)
  if (!read.ok) throw new Error(JSON.stringify(read.errors))
  return computeEstimate(read.input)
}

describe('npm run compute', () => {
  const document = buildEstimateDocument()

  it('prints the results of a file, and ends well', async () => {
    expect(await computeText(JSON.stringify(document))).toEqual({ code: 0, answer: resultsOf(document) })
  })

  it('takes standard input for -, and formulas that need a parser', async () => {
    const formula = buildEstimateDocument({ lines: document.lines.map((line) => ({ ...line, quantity: 'floor_area * 2' })) })
    const { code, answer } = await computeInput(JSON.stringify(formula))
    expect(code).toBe(0)
    expect(answer).toMatchObject({ lines: [{ key: 'plank', measured: 250, amountCents: { likely: 75_000 } }], errors: [] })
  })

  it('ends well where a line has an error, and names it', async () => {
    const { code, answer } = await computeText(
      JSON.stringify(buildEstimateDocument({ lines: document.lines.map((line) => ({ ...line, unit: 'lf' })) })),
    )
    expect(code).toBe(0)
    expect(answer).toMatchObject({ lines: [], errors: [{ path: 'lines[0].quantity', code: 'unit-mismatch' }] })
  })

  it('reads a file that begins with a byte order mark', async () => {
    expect((await computeText(`\uFEFF${JSON.stringify(document)}`)).code).toBe(0)
  })

  describe('prints problem details and ends with 2', () => {
    it('for a document with a wrong field', async () => {
      const { code, answer } = await computeText(JSON.stringify({ ...document, colour: 'red' }))
      expect(code).toBe(2)
      expect(answer).toMatchObject({ status: 422, code: 'invalid', errors: [{ path: 'colour', code: 'unknown-field' }] })
    })

    it('for what is no JSON', async () =>
      expect(await computeText('{ "format": ')).toMatchObject({ code: 2, answer: { code: 'not-json' } }))

    it('for a file that isn’t there', async () => {
      const { code, out } = await runProgram(COMPUTE, [join(folder, 'nowhere.json')], {})
      expect({ code, answer: JSON.parse(out) }).toMatchObject({ code: 2, answer: { code: 'unreadable' } })
    })

    it('for no file at all', async () => {
      const { code, out } = await runProgram(COMPUTE, [], {})
      expect({ code, answer: JSON.parse(out) }).toMatchObject({ code: 2, answer: { code: 'no-document' } })
    })
  })
})
