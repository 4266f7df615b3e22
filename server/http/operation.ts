import type { Request, RequestHandler, Response } from 'express'
import type { z } from 'zod'
import type { Action } from '../../shared/access/permissions.ts'
import type { CurrentUser } from '../../shared/schemas/account.ts'
import type { Answer } from './answers.ts'
import { parseInput } from './parseInput.ts'

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete'
/** Who may call: an action of the permission table, or anybody. */
export type Access = Action | 'public'

/** What stands about a call before it is run: enough to route, guard and document it. */
interface OperationHead<A extends Access, M extends boolean> {
  /** The stable `operationId`. */
  id: string
  method: Method
  /** Below `/api`, in Express's notation: `/houses/:id`, `/items/*key`. */
  path: string
  action: A
  summary: string
  /** Status of a good answer; 200 unless told, 204 answers without a body. */
  status?: number
  /** The call needs `If-Match`; without it the answer is 428. */
  ifMatch?: M
  /** Other request headers that the call reads, with what they mean, for the description. */
  headers?: Record<string, string>
  /** Run before the body is read: a stricter rate limit, for instance. */
  guards?: RequestHandler[]
  /** Largest body, in bytes; 1 MB unless told. */
  bodyLimit?: number
  /** Media type of the answer; JSON unless told. */
  produces?: string
}

interface OperationSchemas<P, Q, B, R> {
  /** Path parameters; a wildcard arrives joined by slashes. */
  params?: z.ZodType<P>
  query?: z.ZodType<Q>
  body?: z.ZodType<B>
  /** Checked in tests, not on each answer: what comes in is checked always. */
  response?: z.ZodType<R>
}

export interface OperationContext<A extends Access, M extends boolean, P, Q, B> {
  /** Who asks; on a public call there may be nobody. */
  user: A extends 'public' ? CurrentUser | null : CurrentUser
  params: P
  query: Q
  body: B
  /** The version of `If-Match`, where the call asks for it. */
  ifMatch: M extends true ? number : null
  req: Request
  res: Response
}

/** What the router hands over, unchecked. */
interface OperationInput {
  user: CurrentUser | null
  params: unknown
  query: unknown
  body: unknown
  ifMatch: number | null
  req: Request
  res: Response
}

/** A call of the API: its description, and `run`, which checks the input and calls the handler. */
export interface Operation extends OperationHead<Access, boolean>, OperationSchemas<unknown, unknown, unknown, unknown> {
  run(input: OperationInput): unknown
}

/**
 * Declares one call. The handler gets checked input and returns the answer; it throws an `AppError` to refuse.
 * A handler that returns without awaiting runs inside the transaction that remembers its Idempotency-Key.
 */
export function operation<const A extends Access, M extends boolean = false, P = undefined, Q = undefined, B = undefined, R = void>(
  spec: OperationHead<A, M> & OperationSchemas<P, Q, B, R>,
  handler: (context: OperationContext<A, M, P, Q, B>) => NoInfer<Answer<R>> | Promise<NoInfer<Answer<R>>>,
): Operation {
  return {
    ...spec,
    run(input) {
      const context = {
        ...input,
        params: parseIfDeclared(spec.params, input.params),
        query: parseIfDeclared(spec.query, input.query),
        body: parseIfDeclared(spec.body, input.body),
      }
      // The router has checked access and If-Match by the same spec that these types follow.
      return handler(context as OperationContext<A, M, P, Q, B>)
    },
  }
}

function parseIfDeclared(schema: z.ZodType | undefined, value: unknown): unknown {
  return schema ? parseInput(schema, value) : undefined
}
