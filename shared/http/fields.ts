import { z } from 'zod'

/** Text a person typed: trimmed, not empty, bounded. */
export const textField = (most: number) => z.string().trim().min(1, 'Cannot be empty.').max(most)

export const optionalText = (most: number) => z.string().trim().max(most)

/** A calendar day, `YYYY-MM-DD`. */
export const daySchema = z.iso.date()

/** A moment, ISO 8601 in UTC. */
export const momentSchema = z.iso.datetime()

export const idParams = <Name extends string>(name: Name) =>
  z.strictObject({ [name]: z.uuid() } as Record<Name, z.ZodUUID>)
