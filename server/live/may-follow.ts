import type { LiveMessage } from '#server/live/live-message'
import { seesOnlyOwnCompany, type Role } from '#shared/access/permissions'

export interface Viewer {
  readonly role: Role
  readonly companyId: string | null
}

/** The shop's people hear of everything; a crew lead of the own company and of what concerns all. */
export function mayFollow(
  viewer: Viewer,
  { audience, companyId }: Pick<LiveMessage, 'audience' | 'companyId'>,
): boolean {
  if (!seesOnlyOwnCompany(viewer.role)) return true
  if (audience === 'all') return true
  return audience === 'company' && companyId !== null && companyId === viewer.companyId
}
