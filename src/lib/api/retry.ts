import { mayPass } from '@/lib/api/api-errors'

/** A change is tried for about a minute; afterwards the person decides. */
const CHANGE_RETRIES = 6
const READ_RETRIES = 2

/** Only failures that may pass are tried again, never a refusal. */
export const retryChange = (failures: number, error: Error): boolean =>
  mayPass(error) && failures < CHANGE_RETRIES

export const retryRead = (failures: number, error: Error): boolean =>
  mayPass(error) && failures < READ_RETRIES

/** Milliseconds: 1, 2, 4, 8 and then 15 seconds. */
export const retryDelay = (failures: number): number => Math.min(1000 * 2 ** failures, 15_000)
