import type { z } from 'zod'

/** 0: an answer; 2: bad input, named; 3: cannot be made, and the answer says why. */
export type ExitCode = 0 | 2 | 3

export interface VerbAnswer {
  readonly exit: ExitCode
  readonly output: unknown
}

export interface InputError {
  /** Where in the input, joined by dots; empty for the input as a whole. */
  readonly path: string
  readonly message: string
}

export type Verb = (input: unknown) => VerbAnswer

export const badInput = (error: readonly InputError[]): VerbAnswer => ({
  exit: 2,
  output: { error },
})

/** A verb is a schema of its input and what to do with it; bad input never reaches `answer`. */
export const defineVerb =
  <Schema extends z.ZodType>(
    schema: Schema,
    answer: (input: z.output<Schema>) => VerbAnswer,
  ): Verb =>
  (input) => {
    const parsed = schema.safeParse(input)
    return parsed.success
      ? answer(parsed.data)
      : badInput(
          parsed.error.issues.map(({ path, message }) => ({
            path: path.map(String).join('.'),
            message,
          })),
        )
  }
