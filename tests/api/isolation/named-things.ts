import { z } from 'zod'
import type { Endpoint } from '#shared/http/endpoint'

const NAMES_A_THING = /(?:^|[a-z])(?:id|ids|code|codes)$/i

const nodeSchema = z.record(z.string(), z.unknown())

/** Names of all properties of a schema, at any depth. */
function propertyNames(node: unknown): string[] {
  if (Array.isArray(node)) return node.flatMap(propertyNames)
  const object = nodeSchema.safeParse(node)
  if (!object.success) return []
  const own = nodeSchema.safeParse(object.data.properties)
  return [
    ...(own.success ? Object.keys(own.data) : []),
    ...Object.values(object.data).flatMap(propertyNames),
  ]
}

const namesIn = (schema: z.ZodType): string[] => [
  ...new Set(
    propertyNames(z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' })).filter((name) =>
      NAMES_A_THING.test(name),
    ),
  ),
]

/** What a request to this endpoint names by an id or a code: in its path, its query and its body. */
export const namedThings = (endpoint: Endpoint): string[] => [
  ...new Set([endpoint.params, endpoint.query, endpoint.body].flatMap(namesIn)),
]

export const nameOf = (endpoint: Endpoint): string => `${endpoint.method} ${endpoint.path}`
