import { z } from 'zod'
import { JsonText } from '../../http/answers.ts'
import { openApiOf } from '../../http/openApi.ts'
import { operation, type Operation } from '../../http/operation.ts'

/** The description of all calls, this one included. */
export function openApiOperations(others: readonly Operation[], version: string): Operation[] {
  let text: string | null = null
  const self: Operation = operation(
    {
      id: 'readOpenApi',
      method: 'get',
      path: '/openapi.json',
      action: 'public',
      summary: 'This description, as OpenAPI 3.1.',
      response: z.looseObject({ openapi: z.literal('3.1.0') }),
    },
    () => {
      text ??= JSON.stringify(openApiOf([...others, self], version))
      return new JsonText(text)
    },
  )
  return [self]
}
