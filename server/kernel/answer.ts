import { endsVerb } from './ends-verb'
import { planVerb } from './plan-verb'
import { roofRunVerb } from './roof-run-verb'
import { stripVerb } from './strip-verb'
import type { ExitCode, Verb, VerbAnswer } from './verb'
import { badInput } from './verb'

const VERBS: Readonly<Record<string, Verb>> = {
  strip: stripVerb,
  plan: planVerb,
  ends: endsVerb,
  'roof-run': roofRunVerb,
}

/** Bad input outranks what cannot be made; either outranks an answer. */
const worstExit = (answers: readonly VerbAnswer[]): ExitCode => {
  const exits = answers.map(({ exit }) => exit)
  return exits.includes(2) ? 2 : exits.includes(3) ? 3 : 0
}

/** An array of inputs gives the array of answers; each says by itself what became of it. */
const answerAll = (verb: Verb, inputs: readonly unknown[]): VerbAnswer => {
  const answers = inputs.map((input) => verb(input))
  return { exit: worstExit(answers), output: answers.map(({ output }) => output) }
}

/** Answers one call from the shell: a verb and the text of its JSON input. */
export const answerKernel = (verbName: string | undefined, text: string): VerbAnswer => {
  const verb = Object.hasOwn(VERBS, verbName ?? '') ? VERBS[verbName ?? ''] : undefined
  if (!verb) {
    const verbs = Object.keys(VERBS).join(', ')
    return badInput([{ path: 'verb', message: `The kernel answers ${verbs}.` }])
  }
  let input: unknown
  try {
    input = JSON.parse(text)
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    return badInput([{ path: '', message: `The input is not JSON: ${reason}` }])
  }
  return Array.isArray(input) ? answerAll(verb, input) : verb(input)
}
