import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { idParams, momentSchema, textField } from '#shared/http/fields'
import { companySchema } from '#shared/people/people.contract'
import { profileSchema } from '#shared/profile/profile.schema'

/** A saved profile: a company's own, or one of the shop's starters (company null). */
export const shelfProfileSchema = z.strictObject({
  id: z.uuid(),
  company: companySchema.nullable(),
  /** Key of a starter, which has its name in both languages in the locales; null otherwise. */
  starterKey: z.string().nullable(),
  name: z.string(),
  profile: profileSchema,
  version: z.int(),
  updatedAt: momentSchema,
})

/** How a company's saved profile was at a version; the latest is the one on the shelf. */
export const shelfVersionSchema = z.strictObject({
  version: z.int(),
  name: z.string(),
  profile: profileSchema,
  /** Null where it was not noted yet. */
  savedBy: z.string().nullable(),
  savedAt: momentSchema,
})

export const listShelf = endpoint({
  method: 'GET',
  path: '/profiles',
  permission: 'shelf.read',
  summary: "The shop's starters and the company's own profiles.",
  answer: z.strictObject({ items: z.array(shelfProfileSchema) }),
})

export const createShelfProfile = endpoint({
  method: 'POST',
  path: '/profiles',
  permission: 'shelf.write',
  summary: 'Put a profile on the shelf.',
  body: z.strictObject({
    name: textField(80),
    profile: profileSchema,
    /** Whose shelf; needed from the shop's people. */
    companyId: z.uuid().optional(),
  }),
  answer: shelfProfileSchema,
  success: 201,
  idempotent: true,
})

export const updateShelfProfile = endpoint({
  method: 'PUT',
  path: '/profiles/:profileId',
  permission: 'shelf.write',
  summary:
    'Change a profile of the own shelf: a new version. The old ones and ordered copies stay as they are.',
  params: idParams('profileId'),
  body: z.strictObject({ version: z.int(), name: textField(80), profile: profileSchema }),
  answer: shelfProfileSchema,
})

export const listShelfVersions = endpoint({
  method: 'GET',
  path: '/profiles/:profileId/versions',
  permission: 'shelf.read',
  summary: 'Every version of a saved profile, the latest first; none of a starter.',
  params: idParams('profileId'),
  answer: z.strictObject({ items: z.array(shelfVersionSchema) }),
})

export type ShelfVersion = z.infer<typeof shelfVersionSchema>
export type ShelfProfile = z.infer<typeof shelfProfileSchema>
