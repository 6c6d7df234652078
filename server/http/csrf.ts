import { csrfSync } from 'csrf-sync'

/**
 * The token lies in the session and comes back as `X-CSRF-Token` with every change. Signing in
 * begins a new session and so a new token.
 */
export const { csrfSynchronisedProtection, generateToken, invalidCsrfTokenError } = csrfSync({
  size: 32,
  getTokenFromRequest: (request) => request.get('x-csrf-token'),
})
