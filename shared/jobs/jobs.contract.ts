import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { idParams, momentSchema, optionalText, textField } from '#shared/http/fields'
import { pageOf, pageQuery } from '#shared/http/paging'
import { companySchema } from '#shared/people/people.contract'

/** Rise in inches per 12 inches of run. */
export const pitchRiseSchema = z
  .number()
  .min(0, 'A pitch cannot be below 0 in 12.')
  .max(24, 'A pitch above 24 in 12 is a wall; type 24 or less.')

export const jobSchema = z.strictObject({
  id: z.uuid(),
  company: companySchema,
  name: z.string(),
  address: z.string(),
  pitchRise: pitchRiseSchema,
  version: z.int(),
  orderCount: z.int(),
  createdAt: momentSchema,
})

const jobFields = {
  name: textField(80),
  address: optionalText(200),
  pitchRise: pitchRiseSchema,
}

export const listJobs = endpoint({
  method: 'GET',
  path: '/jobs',
  permission: 'jobs.read',
  summary: 'Jobs, newest first.',
  query: z.strictObject({ ...pageQuery, search: z.string().trim().max(80).optional() }),
  answer: pageOf(jobSchema),
})

export const getJob = endpoint({
  method: 'GET',
  path: '/jobs/:jobId',
  permission: 'jobs.read',
  summary: 'One job.',
  params: idParams('jobId'),
  answer: jobSchema,
})

export const createJob = endpoint({
  method: 'POST',
  path: '/jobs',
  permission: 'jobs.write',
  summary: 'Open a job.',
  body: z.strictObject({
    ...jobFields,
    /** Whose job; needed from the shop's people, a crew lead always means the own company. */
    companyId: z.uuid().optional(),
  }),
  answer: jobSchema,
  success: 201,
  idempotent: true,
})

export const updateJob = endpoint({
  method: 'PATCH',
  path: '/jobs/:jobId',
  permission: 'jobs.write',
  summary: 'Change name, address or pitch.',
  params: idParams('jobId'),
  body: z.strictObject({
    version: z.int(),
    name: jobFields.name.optional(),
    address: jobFields.address.optional(),
    pitchRise: jobFields.pitchRise.optional(),
  }),
  answer: jobSchema,
})

export type Job = z.infer<typeof jobSchema>
