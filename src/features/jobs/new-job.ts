import { z } from 'zod'
import { optionalText, textField } from '#shared/http/fields'
import { parsePitch } from './pitch'

/** The form of a new job. Messages are keys of the `jobs` texts. */
export const newJobForm = (needsCompany: boolean) =>
  z.strictObject({
    name: textField(80),
    address: optionalText(200),
    pitch: z.string().transform((text, context) => {
      const pitch = parsePitch(text)
      if (pitch.ok) return pitch.rise
      context.addIssue({ code: 'custom', message: pitch.refusal })
      return z.NEVER
    }),
    companyId: needsCompany ? z.uuid() : z.literal(''),
  })

export type NewJobFields = z.input<ReturnType<typeof newJobForm>>
export type NewJobValues = z.output<ReturnType<typeof newJobForm>>
