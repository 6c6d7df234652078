import type { Profile } from '#shared/profile/profile.schema'
import { closedHem, profileOf } from '../../support/arbitrary-profile'

const many = Array.from({ length: 25 }, (_, index) => (index % 2 === 0 ? 2.5 : 1.5))
const manyTurns = Array.from({ length: 24 }, (_, index) => [90, -90, -90, 90][index % 4] ?? 90)

/** Trim as the trade knows it, and some shapes that are hard to label. Outside dimensions. */
export const NAMED_PROFILES: Readonly<Record<string, Profile>> = {
  'kicked ridge': profileOf([0.75, 6, 6, 0.75], [-45, -53.1, -45]),
  gable: profileOf([4, 4, 0.75], [-90, 45], { hemB: closedHem(0.5, -1) }),
  'box eave': profileOf([5, 6, 1.25], [-72, -90], { hemB: closedHem(0.5, 1) }),
  'W valley': profileOf([10, 1.125, 1.125, 10], [63.4, -90, 63.4], {
    hemA: closedHem(0.5, 1),
    hemB: closedHem(0.5, 1),
  }),
  'Z closure': profileOf([1, 1.5, 1], [90, -90]),
  'corner with pockets': profileOf([0.75, 1.25, 4, 4, 1.25, 0.75], [-90, -90, -90, -90, -90]),
  'box gutter': profileOf([0.75, 4.5, 5, 5.5], [90, 90, 90], { hemA: closedHem(0.5, 1) }),
  coping: profileOf([0.75, 4, 12, 3.5, 0.75], [45, -90, -90, 45], {
    hemA: closedHem(0.5, -1),
    hemB: closedHem(0.5, -1),
  }),
  'square spiral': profileOf([0.6, 1, 1.4, 1.8, 2.2, 2.6], [90, 90, 90, 90, 90]),
  'closed tube': profileOf([0.75, 2, 2, 2, 2], [90, 90, 90, 90]),
  'flat strip': profileOf([6]),
  'tiny angle': profileOf([0.5, 0.5], [90]),
  'open hems': profileOf([3, 5, 2], [-135, 100], {
    hemA: { style: 'open', length: 0.75, gap: 0.25, turn: 1 },
    hemB: { style: 'open', length: 0.5, gap: 0.125, turn: -1 },
    colorSide: 'both',
  }),
  'sharp folds': profileOf([4, 4.125, 1], [-150, 120], { colorSide: 'right' }),
  'plain metal': profileOf([2, 8, 2], [60, -60], {
    hemB: closedHem(0.5, 1),
    colorSide: 'none',
  }),
  'many ribs': profileOf(many, manyTurns),
}
