import { getSession } from '#shared/people/people.contract'
import { send } from '@/lib/api/send'

let held: string | null = null

/** Called with the token of every session answer; null after signing out. */
export function holdCsrfToken(token: string | null): void {
  held = token
}

/** Asks for the session's present token, for example after another tab signed in anew. */
export async function renewCsrfToken(): Promise<string> {
  const session = await send(getSession, { headers: {} })
  held = session.csrfToken
  return session.csrfToken
}

export const csrfToken = async (): Promise<string> => held ?? (await renewCsrfToken())
