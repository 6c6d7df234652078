import { z } from 'zod'
import { endpoint, noContent } from '#shared/http/endpoint'
import { idParams, textField } from '#shared/http/fields'
import {
  companySchema,
  emailField,
  languageSchema,
  personRowSchema,
  roleSchema,
} from '#shared/people/people.contract'
import { PASSWORD_INPUT_LENGTH } from '#shared/people/password-rules'

/** By an invitation an account gets its first password, by a reset another one. */
export const passwordLinkKindSchema = z.enum(['invitation', 'reset'])

/** Days that an invitation can be taken up. */
export const INVITATION_DAYS = 7
/** Minutes that a reset can be taken up. */
export const RESET_MINUTES = 60

const personParams = idParams('personId')

/** Judged by `passwordProblem`, which needs to know whose it is. */
const newPassword = z.string().min(1, 'Type a password.').max(PASSWORD_INPUT_LENGTH)

/** 32 random bytes, base64url. */
const tokenField = z.string().regex(/^[\w-]{43}$/, 'This is no token of a link that we send.')

export const invitePerson = endpoint({
  method: 'POST',
  path: '/people',
  permission: 'people.invite',
  summary: 'Invite somebody by mail; a crew lead invites crew leads of the own company.',
  body: z.strictObject({
    name: textField(80),
    email: emailField,
    role: roleSchema,
    /** For a crew lead invited by the shop; a crew lead invites into the own company. */
    companyId: z.uuid().optional(),
    language: languageSchema,
  }),
  answer: personRowSchema,
  success: 201,
  idempotent: true,
})

export const inviteAgain = endpoint({
  method: 'POST',
  path: '/people/:personId/invitation',
  permission: 'people.invite',
  summary: 'Send a new invitation; the one before ends.',
  params: personParams,
  answer: personRowSchema,
  idempotent: true,
})

export const deactivatePerson = endpoint({
  method: 'POST',
  path: '/people/:personId/deactivation',
  permission: 'people.manage',
  summary: 'Close an account and end its sessions at once.',
  params: personParams,
  answer: personRowSchema,
})

export const reactivatePerson = endpoint({
  method: 'POST',
  path: '/people/:personId/reactivation',
  permission: 'people.manage',
  summary: 'Open a closed account again.',
  params: personParams,
  answer: personRowSchema,
})

export const createCompany = endpoint({
  method: 'POST',
  path: '/companies',
  permission: 'companies.write',
  summary: 'Add a company that orders here.',
  body: z.strictObject({ name: textField(80) }),
  answer: companySchema,
  success: 201,
  idempotent: true,
})

export const listCrew = endpoint({
  method: 'GET',
  path: '/crew',
  permission: 'crew.read',
  summary: 'The people of the own company.',
  answer: z.strictObject({ items: z.array(personRowSchema) }),
})

export const changePassword = endpoint({
  method: 'PUT',
  path: '/me/password',
  permission: 'self.manage',
  summary: 'Change the own password; every other session ends.',
  body: z.strictObject({
    current: z.string().min(1, 'Type the password you have now.').max(PASSWORD_INPUT_LENGTH),
    password: newPassword,
  }),
  answer: noContent,
  success: 204,
})

export const askPasswordReset = endpoint({
  method: 'POST',
  path: '/password-resets',
  permission: 'public',
  summary: 'Ask for a link by mail. The answer is the same for an address nobody has.',
  body: z.strictObject({ email: emailField }),
  answer: noContent,
  success: 204,
})

export const readPasswordLink = endpoint({
  method: 'POST',
  path: '/password-links',
  permission: 'public',
  summary: 'Whose password a link sets. The token is in the body, which no log holds.',
  body: z.strictObject({ token: tokenField }),
  answer: z.strictObject({
    kind: passwordLinkKindSchema,
    name: z.string(),
    email: z.string(),
    language: languageSchema,
  }),
  changes: false,
})

export const setPassword = endpoint({
  method: 'POST',
  path: '/passwords',
  permission: 'public',
  summary: 'Set a password by a link, which is worth nothing afterwards; every session ends.',
  body: z.strictObject({ token: tokenField, password: newPassword }),
  answer: noContent,
  success: 204,
})

export type PasswordLinkKind = z.infer<typeof passwordLinkKindSchema>
