import { z } from 'zod'
import { ROLES } from '#shared/access/permissions'
import { endpoint, noContent } from '#shared/http/endpoint'
import { momentSchema, textField } from '#shared/http/fields'
import { PASSWORD_INPUT_LENGTH } from '#shared/people/password-rules'

export const languageSchema = z.enum(['en', 'es'])
/** Inches with fractions, decimal inches, millimeters. */
export const unitsSchema = z.enum(['fraction', 'decimal', 'mm'])
export const themeSchema = z.enum(['light', 'dark', 'system'])
export const roleSchema = z.enum(ROLES)

/** In small letters: an address is the same however it is typed. */
export const emailField = z
  .string()
  .trim()
  .toLowerCase()
  .pipe(z.email('Type a mail address such as name@example.com.').max(254))

export const companySchema = z.strictObject({ id: z.uuid(), name: z.string() })

/** The person who is signed in, with what the screens need to speak their way. */
export const selfSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  /** The company of a crew lead; null for the shop's own people. */
  company: companySchema.nullable(),
  language: languageSchema,
  units: unitsSchema,
  theme: themeSchema,
})

export const sessionSchema = z.strictObject({
  person: selfSchema.nullable(),
  /** Sent back as `X-CSRF-Token` with every change. A new one comes with every sign-in. */
  csrfToken: z.string(),
})

export const personRowSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  company: companySchema.nullable(),
  active: z.boolean(),
  /** Has not set a password yet. */
  invited: z.boolean(),
  lastSignInAt: momentSchema.nullable(),
})

export const getSession = endpoint({
  method: 'GET',
  path: '/session',
  permission: 'public',
  summary: 'Who is signed in, and the CSRF token of this session.',
  answer: sessionSchema,
})

export const signIn = endpoint({
  method: 'POST',
  path: '/session',
  permission: 'public',
  summary: 'Sign in with mail address and password.',
  body: z.strictObject({
    email: emailField,
    password: z.string().min(1, 'Type your password.').max(PASSWORD_INPUT_LENGTH),
  }),
  answer: sessionSchema,
})

export const signOut = endpoint({
  method: 'DELETE',
  path: '/session',
  permission: 'self.manage',
  summary: 'Sign out on this device.',
  answer: noContent,
  success: 204,
})

export const signOutEverywhere = endpoint({
  method: 'DELETE',
  path: '/sessions',
  permission: 'self.manage',
  summary: 'Sign out on every device, this one included.',
  answer: noContent,
  success: 204,
})

export const updateSelf = endpoint({
  method: 'PATCH',
  path: '/me',
  permission: 'self.manage',
  summary: 'Change the own name, language, units or theme.',
  body: z.strictObject({
    name: textField(80).optional(),
    language: languageSchema.optional(),
    units: unitsSchema.optional(),
    theme: themeSchema.optional(),
  }),
  answer: selfSchema,
})

export const listPeople = endpoint({
  method: 'GET',
  path: '/people',
  permission: 'people.read',
  summary: 'Everyone with an account.',
  answer: z.strictObject({ items: z.array(personRowSchema) }),
})

export const listCompanies = endpoint({
  method: 'GET',
  path: '/companies',
  permission: 'companies.read',
  summary: 'The companies that order here.',
  answer: z.strictObject({ items: z.array(companySchema) }),
})

export type Language = z.infer<typeof languageSchema>
export type Units = z.infer<typeof unitsSchema>
export type Theme = z.infer<typeof themeSchema>
export type Company = z.infer<typeof companySchema>
export type Self = z.infer<typeof selfSchema>
export type Session = z.infer<typeof sessionSchema>
export type PersonRow = z.infer<typeof personRowSchema>
