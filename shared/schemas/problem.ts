import { z } from 'zod'

/** One bad field: where it stands in the body, `openings[0].widthIn`, and words a person can act on. */
export const fieldProblemSchema = z.object({ path: z.string(), code: z.string(), message: z.string() })

/** Problem details after RFC 9457, with a stable `code` and the bad fields. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  code: z.string(),
  errors: z.array(fieldProblemSchema).optional(),
  requestId: z.string().optional(),
  /** With 412: the resource as it stands now, so that the client can merge. */
  current: z.unknown().optional(),
})

export type FieldProblem = z.infer<typeof fieldProblemSchema>
export type Problem = z.infer<typeof problemSchema>
