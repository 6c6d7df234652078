const text = (name: string, value: unknown): string => {
  if (typeof value === 'string') return value
  if (typeof value === 'number' || typeof value === 'boolean') return String(value)
  throw new TypeError(`Parameter ${name} must be text, a number or a boolean.`)
}

/**
 * The address of a request below /api: `:name` of the path is filled from `params`, absent query
 * values are left out.
 *
 *     requestUrl('/jobs/:jobId', { jobId: 'a b' }, { limit: 5 })  // '/api/jobs/a%20b?limit=5'
 */
export function requestUrl(path: string, params?: unknown, query?: unknown): string {
  const values = new Map<string, unknown>(Object.entries(params ?? {}))
  const asking = new Map<string, unknown>(Object.entries(query ?? {}))
  const filled = path.replace(/:([A-Za-z]+)/g, (_, name: string) =>
    encodeURIComponent(text(name, values.get(name))),
  )
  const search = new URLSearchParams()
  for (const [name, value] of asking) {
    if (value !== undefined) search.set(name, text(name, value))
  }
  const asked = search.toString()
  return `/api${filled}${asked === '' ? '' : `?${asked}`}`
}
