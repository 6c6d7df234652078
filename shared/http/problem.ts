import { z } from 'zod'

/** Every way in which a request can fail, with its status. `type` of the answer is `/problems/<code>`. */
export const PROBLEMS = {
  'invalid-input': 400,
  'idempotency-key-missing': 400,
  'not-signed-in': 401,
  'wrong-credentials': 401,
  'csrf-token-wrong': 403,
  'not-allowed': 403,
  'not-found': 404,
  /** Somebody else changed it meanwhile; `current` shows what is there now. */
  'changed-meanwhile': 409,
  /** The thing is not in the state the request needs; `current` shows who moved it and when. */
  'wrong-state': 409,
  /** The key was used for another request. */
  'idempotency-key-reused': 422,
  /** The profile cannot be made as drawn; `errors` names legs and bends by code. */
  'profile-problem': 422,
  /** No brake of the shop bends a line under the checks made. */
  'cannot-bend': 422,
  'too-many-requests': 429,
  internal: 500,
  'not-ready': 503,
} as const

export type ProblemCode = keyof typeof PROBLEMS

export const fieldErrorSchema = z.strictObject({
  /** Dotted path of the field, as in the request. */
  path: z.string(),
  /** What is wrong and what cures it, in English. */
  message: z.string(),
  /** A stable code where the client has its own words for it. */
  code: z.string().optional(),
})

/** RFC 9457 problem details. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  code: z.string(),
  /** Names the request in the server's log. */
  requestId: z.string().optional(),
  errors: z.array(fieldErrorSchema).optional(),
  /** What is there now, for a conflict. */
  current: z.unknown().optional(),
})

export type FieldError = z.infer<typeof fieldErrorSchema>
export type Problem = z.infer<typeof problemSchema>
