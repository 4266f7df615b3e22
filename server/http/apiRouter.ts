import { Router, type Request, type Response } from 'express'
import { AppError, notFound } from '../errors/AppError.ts'
import type { Idempotency } from '../middleware/idempotency.ts'
import { requireAccess } from '../middleware/requireAccess.ts'
import { AlreadyAnswered, FileAnswer, JsonText } from './answers.ts'
import { readIfMatch } from './etag.ts'
import type { Operation } from './operation.ts'
import { readJsonBody } from './readJsonBody.ts'
import { sendAnswer } from './sendAnswer.ts'

interface ApiParts {
  idempotency: Idempotency
  /** Tests compare each answer with the schema that describes it; in use that time is spared. */
  checkAnswers: boolean
}

/** Routes every operation, says 405 where only the method is wrong and 404 for all else. */
export function apiRouter(operations: readonly Operation[], parts: ApiParts): Router {
  const router = Router()
  for (const operation of operations) {
    router[operation.method](operation.path, requireAccess(operation.action), ...(operation.guards ?? []), (req, res) =>
      perform(operation, req, res, parts),
    )
  }
  for (const [path, methods] of methodsByPath(operations)) {
    router.all(path, () => {
      throw new AppError({
        status: 405,
        code: 'method-not-allowed',
        detail: `This address takes ${methods} alone.`,
        headers: { Allow: methods },
      })
    })
  }
  router.use(() => {
    throw notFound('address in the API')
  })
  return router
}

/** One request, from its guards to its answer. */
async function perform(operation: Operation, req: Request, res: Response, { idempotency, checkAnswers }: ApiParts): Promise<void> {
  res.setHeader('Cache-Control', 'private, no-cache')
  const user = req.activeSession?.user ?? null
  const ifMatch = operation.ifMatch ? readIfMatch(req) : null
  const body = operation.body ? await readJsonBody(req, res, operation.bodyLimit) : undefined
  const run = () => operation.run({ user, params: joinWildcards(req.params), query: req.query, body, ifMatch, req, res })
  const mayBeRepeated = operation.method === 'post' && operation.action !== 'public' && user !== null
  const usualStatus = operation.status ?? 200
  const { status, answer } = mayBeRepeated
    ? await idempotency({ req, res, userId: user.id, body, status: usualStatus, run })
    : { status: usualStatus, answer: await run() }
  if (checkAnswers) checkAnswer(operation, answer)
  sendAnswer(res, status, answer)
}

/** Express gives a wildcard as the list of its parts. */
function joinWildcards(params: Record<string, string | string[]>): Record<string, string> {
  return Object.fromEntries(Object.entries(params).map(([name, value]) => [name, Array.isArray(value) ? value.join('/') : value]))
}

function methodsByPath(operations: readonly Operation[]): Map<string, string> {
  const methods = new Map<string, string>()
  for (const { path, method } of operations) {
    const known = methods.get(path)
    methods.set(path, known ? `${known}, ${method.toUpperCase()}` : method.toUpperCase())
  }
  return methods
}

function checkAnswer({ id, response }: Operation, answer: unknown): void {
  const isNotJson = answer instanceof FileAnswer || answer instanceof AlreadyAnswered
  if (!response || isNotJson) return
  const parsed = response.safeParse(answer instanceof JsonText ? JSON.parse(answer.text) : answer)
  if (!parsed.success) throw new Error(`The answer of ${id} differs from its description: ${parsed.error.message}`)
}
