import { describe, expect, it } from 'vitest'
import { buildTestApp } from '../support/buildTestApp.ts'

interface Described {
  operationId: string
  summary: string
  security: unknown[]
  parameters: { name: string; in: string; required: boolean; schema: object }[]
  requestBody?: { content: Record<string, { schema: { type?: string; properties?: object } }> }
  responses: Record<string, { description?: string; content?: Record<string, { schema: object }>; $ref?: string }>
}
interface Description {
  openapi: string
  info: { title: string; version: string }
  paths: Record<string, Record<string, Described>>
  components: { schemas: Record<string, object>; responses: Record<string, object>; securitySchemes: Record<string, object> }
}

interface DocumentDescription {
  required: string[]
  additionalProperties: boolean
  properties: Record<string, { items?: { properties: Record<string, object> } }>
}

const app = buildTestApp()
const description = (await app.anonymous().get('/api/openapi.json')).body as Description
const calls = Object.entries(description.paths).flatMap(([path, methods]) =>
  Object.entries(methods).map(([method, call]) => ({ path, method, call })),
)

describe('GET /api/openapi.json', () => {
  it('describes every call that the app routes, in OpenAPI 3.1', () => {
    expect(description.openapi).toBe('3.1.0')
    expect(description.info).toMatchObject({ title: 'Quoinbook', version: expect.stringMatching(/^\d+\.\d+\.\d+$/) })
    expect(calls.map(({ call }) => call.operationId).sort()).toEqual(app.operations.map(({ id }) => id).sort())
  })

  it('gives each call an id of its own that a program can be written against', () => {
    const ids = calls.map(({ call }) => call.operationId)
    expect(new Set(ids).size).toBe(ids.length)
    for (const id of ids) expect(id).toMatch(/^[a-z][A-Za-z]+$/)
  })

  it.each(['/compute', '/houses/import'])('describes the document that %s takes, field by field', (path) => {
    const schema = description.paths[path]?.post?.requestBody?.content['application/json']?.schema as DocumentDescription
    expect(schema.required).toEqual(['format', 'version', 'house'])
    expect(schema.additionalProperties).toBe(false)
    expect(Object.keys(schema.properties)).toEqual(
      expect.arrayContaining(['house', 'rooms', 'lines', 'unknowns', 'inspections', 'settings']),
    )
    const { unitPrice, quantity } = schema.properties.lines?.items?.properties ?? {}
    expect(JSON.stringify(unitPrice)).toContain('"type":"string","description":"Dollars as a decimal string, at most 4 decimals."')
    expect(quantity).toMatchObject({ anyOf: [{ type: 'number' }, { type: 'string' }] })
  })

  it('points at nothing that is not there', () => {
    const pointers = [...JSON.stringify(description).matchAll(/"\$ref":"#\/([^"]+)"/g)].map(([, pointer]) => String(pointer))
    expect(pointers.length).toBeGreaterThan(0)
    for (const pointer of new Set(pointers)) {
      const found = pointer.split('/').reduce<unknown>((part, key) => (part as Record<string, unknown> | undefined)?.[key], description)
      expect([pointer, typeof found]).toEqual([pointer, 'object'])
    }
  })
})

describe.each(calls)('the description of $method $path', ({ path, call }) => {
  it('says what it does and what it answers, good or refused', () => {
    expect(call.summary.length).toBeGreaterThan(5)
    const good = Object.entries(call.responses).filter(([status]) => status.startsWith('2'))
    expect(good).toHaveLength(1)
    const [[status, answer] = ['', {}]] = good
    if (status !== '204' && status !== '202') expect(Object.values(answer.content ?? {})[0]?.schema).toBeTypeOf('object')
    expect(Object.keys(call.responses).some((code) => code.startsWith('4'))).toBe(true)
  })

  it('names each parameter of its path', () => {
    const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name)
    expect(call.parameters.filter((parameter) => parameter.in === 'path').map(({ name }) => name)).toEqual(inPath)
    expect(path).not.toMatch(/[:*]/)
  })

  it('says whether one must be signed in', () => {
    const { action } = app.operations.find(({ id }) => id === call.operationId) ?? {}
    expect(call.security).toEqual(action === 'public' ? [] : [{ session: [] }])
    expect('401' in call.responses).toBe(action !== 'public')
  })

  it('says what a write may be refused with: a conflict of rules, a header or body that can’t be read', () => {
    const { action, method, ifMatch, body } = app.operations.find(({ id }) => id === call.operationId) ?? {}
    expect('409' in call.responses).toBe(action !== 'public' && method !== 'get')
    expect('400' in call.responses).toBe(ifMatch === true || body !== undefined)
    expect(call.responses.default).toEqual({ $ref: '#/components/responses/Problem' })
  })

  it('says which headers it needs: If-Match where an edit could be stale', () => {
    const ifMatch = call.parameters.find(({ name }) => name === 'If-Match')
    const needsIt = app.operations.find(({ id }) => id === call.operationId)?.ifMatch === true
    expect(ifMatch?.required ?? false).toBe(needsIt)
    expect(['412', '428'].every((code) => code in call.responses)).toBe(needsIt)
  })
})
