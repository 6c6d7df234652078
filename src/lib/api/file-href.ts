import type { z } from 'zod'
import type { Endpoint, fileAnswerSchema } from '#shared/http/endpoint'
import type { CallOptions } from '@/lib/api/call'
import { requestUrl } from '@/lib/api/request-url'

/** An endpoint of the contract made with `fileEndpoint`. */
export type FileEndpoint = Endpoint<z.ZodType, z.ZodType, z.ZodType, typeof fileAnswerSchema>

/**
 * The address of a file of the API, for a link that opens in a new tab. The browser sends the
 * session along; who may not see the file gets a problem instead.
 *
 *     <a href={fileHref(labelsPdf, { params: { printId } })} target="_blank" rel="noreferrer">
 */
export const fileHref = <E extends FileEndpoint>(
  { path }: E,
  { params, query }: Pick<CallOptions<E>, 'params' | 'query'>,
): string => requestUrl(path, params, query)
