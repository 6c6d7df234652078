import type { RequestHandler } from 'express'
import { notAllowed, notSignedIn } from '#server/http/errors'
import { may, type Permission } from '#shared/access/permissions'

/** Refuses whoever the one table of permissions does not name. */
export const requirePermission =
  (permission: Permission | 'public'): RequestHandler =>
  (request, _response, next) => {
    if (permission !== 'public') {
      if (!request.user) throw notSignedIn()
      if (!may(request.user.role, permission)) throw notAllowed()
    }
    next()
  }
