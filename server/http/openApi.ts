import { z } from 'zod'
import { problemSchema } from '../../shared/schemas/problem.ts'
import type { Operation } from './operation.ts'
import { PROBLEM_MEDIA_TYPE } from './problem.ts'

type Json = Record<string, unknown>

/** The description of the API (OpenAPI 3.1), made from the same declarations that route and guard it. */
export function openApiOf(operations: readonly Operation[], version: string): Json {
  const paths: Record<string, Json> = {}
  for (const operation of operations) {
    const path = openApiPath(operation.path)
    paths[path] = { ...paths[path], [operation.method]: describe(operation) }
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Quoinbook',
      version,
      description: 'Cost estimates for worn houses. Amounts are whole cents, unit prices ten-thousandths of a dollar, lengths inches.',
    },
    servers: [{ url: '/api' }],
    paths,
    components: {
      securitySchemes: {
        session: {
          type: 'apiKey',
          in: 'cookie',
          name: 'quoinbook_session',
          description: 'Set by signIn; `__Host-quoinbook_session` under https.',
        },
      },
      schemas: { Problem: jsonSchema(problemSchema, 'output') },
      responses: {
        Problem: {
          description: 'Refused, with words to act on.',
          content: { [PROBLEM_MEDIA_TYPE]: { schema: { $ref: '#/components/schemas/Problem' } } },
        },
      },
    },
  }
}

/** `/houses/:id` and `/items/*key` → `/houses/{id}` and `/items/{key}`. */
function openApiPath(path: string): string {
  return path.replace(/[:*](\w+)/g, '{$1}')
}

function describe(operation: Operation): Json {
  const { id, summary, action, body } = operation
  return {
    operationId: id,
    summary,
    tags: [operation.path.split('/')[1] ?? ''],
    security: action === 'public' ? [] : [{ session: [] }],
    ...(action === 'public' ? {} : { 'x-action': action }),
    parameters: parametersOf(operation),
    ...(body ? { requestBody: { required: true, content: { 'application/json': { schema: jsonSchema(body, 'input') } } } } : {}),
    responses: responsesOf(operation),
  }
}

function parametersOf({ path, params, query, ifMatch, method, action, headers = {} }: Operation): Json[] {
  const pathNames = [...path.matchAll(/[:*](\w+)/g)].map(([, name]) => String(name))
  const paramSchemas = propertiesOf(params)
  const { required = [], ...querySchemas } = { ...propertiesOf(query), required: requiredOf(query) }
  const mayBeRepeated = method === 'post' && action !== 'public'
  const headerWords = {
    ...(ifMatch ? { 'If-Match': 'The ETag of the version that was changed.' } : {}),
    ...(mayBeRepeated ? { 'Idempotency-Key': 'Makes it safe to send the same request again within 24 hours.' } : {}),
    ...headers,
  }
  return [
    ...pathNames.map((name) => ({ name, in: 'path', required: true, schema: paramSchemas[name] ?? { type: 'string' } })),
    ...Object.entries(querySchemas).map(([name, schema]) => ({ name, in: 'query', required: required.includes(name), schema })),
    ...Object.entries(headerWords).map(([name, description]) => ({
      name,
      in: 'header',
      required: name === 'If-Match',
      description,
      schema: { type: 'string' },
    })),
  ]
}

function responsesOf({ status = 200, method, response, produces, action, body, params, ifMatch }: Operation): Json {
  const mediaType = produces ?? 'application/json'
  const content = response || produces ? { content: { [mediaType]: { schema: answerSchema(response, mediaType) } } } : {}
  const refusals = [
    ...(action === 'public' ? [] : [401, 403]),
    ...(params ? [404] : []),
    ...(body || ifMatch ? [400] : []),
    ...(body ? [413, 415] : []),
    // A rule can stand against any write, and a repeated one may still be worked on.
    ...(action === 'public' || method === 'get' ? [] : [409]),
    ...(ifMatch ? [412, 428] : []),
    ...(body || params ? [422] : []),
    429,
  ]
  return {
    [String(status)]: { description: status === 204 ? 'Done.' : 'The answer.', ...content },
    ...Object.fromEntries(refusals.map((refusal) => [String(refusal), { $ref: '#/components/responses/Problem' }])),
    default: { $ref: '#/components/responses/Problem' },
  }
}

function answerSchema(response: z.ZodType | undefined, mediaType: string): Json {
  if (response) return jsonSchema(response, 'output')
  return mediaType.startsWith('text/') ? { type: 'string' } : { type: 'string', format: 'binary' }
}

/** What JSON Schema can't say (a check by code) is left open rather than refused. */
function jsonSchema(schema: z.ZodType, io: 'input' | 'output'): Json {
  const { $schema: _dialect, ...json } = z.toJSONSchema(schema, { io, unrepresentable: 'any' })
  return json
}

function propertiesOf(schema: z.ZodType | undefined): Record<string, Json> {
  return schema ? ((jsonSchema(schema, 'input').properties ?? {}) as Record<string, Json>) : {}
}

function requiredOf(schema: z.ZodType | undefined): string[] {
  return schema ? ((jsonSchema(schema, 'input').required ?? []) as string[]) : []
}
