import type { FieldProblem, Problem } from '../../shared/schemas/problem.ts'

/** A refusal by the server, or the news that it can't be reached (`status` 0, `code` "unreachable"). */
export class ProblemError extends Error {
  readonly status: number
  readonly code: string
  /** The bad fields, by their path in the body that was sent. */
  readonly errors: readonly FieldProblem[]
  /** With 412: the resource as it stands now. */
  readonly current: unknown
  readonly requestId: string | null
  /** With 429: seconds to wait. */
  readonly retryAfterSeconds: number | null

  constructor(problem: Pick<Problem, 'status' | 'code' | 'detail'> & Partial<Problem>, retryAfterSeconds: number | null = null) {
    super(problem.detail)
    this.name = 'ProblemError'
    this.status = problem.status
    this.code = problem.code
    this.errors = problem.errors ?? []
    this.current = problem.current
    this.requestId = problem.requestId ?? null
    this.retryAfterSeconds = retryAfterSeconds
  }

  get isUnreachable(): boolean {
    return this.status === 0
  }

  get isStale(): boolean {
    return this.status === 412
  }
}

/** What is thrown when no answer came at all. */
export function unreachable(): ProblemError {
  return new ProblemError({
    status: 0,
    code: 'unreachable',
    detail: 'Quoinbook can’t be reached. Nothing that you typed is lost; check the connection and try again.',
  })
}
