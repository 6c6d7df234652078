import type { Clock } from '#server/adapters/clock'
import { newCode } from '#server/features/pieces/new-code'
import type { CodeKind } from '#shared/pieces/codes'

/** What the services of the shop floor need besides the database. */
export interface MakingPorts {
  /** Absent: everything happens when the database says, so that all processes agree. */
  readonly clock?: Clock
  readonly drawCode: (kind: CodeKind) => string
}

export const makingPorts: MakingPorts = { drawCode: newCode }
