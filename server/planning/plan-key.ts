import { createHash } from 'node:crypto'
import { bendingShape } from '#server/planning/bending-shape'
import { KERNEL_VERSION } from '#server/planning/kernel-version'
import type { PlanTask } from '#server/planning/plan-task'

/** Names a plan by everything that settles it: two tasks with one key have one plan, to the byte. */
export const planKey = ({ profile, sheet, brake, pieceLength }: PlanTask): string =>
  createHash('sha256')
    .update(JSON.stringify([KERNEL_VERSION, bendingShape(profile), sheet, brake, pieceLength]))
    .digest('base64url')
