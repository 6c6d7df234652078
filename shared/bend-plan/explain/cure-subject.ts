import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Section } from '../plan.schema'
import { sectionOf } from '../section'
import type { SectionHem } from '../section'

/** What cures change: the lengths, turns and hems that a person reads and can set. */
export interface CureSubject {
  /** For a bare section, the section read as if it were a profile. */
  readonly profile: Profile
  /** What would be bent; undefined where the changed profile has errors. */
  readonly findSection: (changed: Profile) => Section | undefined
  /** Whether the edits can be applied to what the person has. */
  readonly hasEdits: boolean
}

export const profileSubject = (profile: Profile, sheet: Sheet): CureSubject => ({
  profile,
  findSection: (changed) =>
    hasErrors(profileProblems(changed, sheet)) ? undefined : sectionOf(changed, sheet),
  hasEdits: true,
})

const readHem = (hem: SectionHem | null): Hem | null => {
  if (hem === null) return null
  const { lip, gap, turn } = hem
  return gap > 0
    ? { style: 'open', length: lip, gap, turn }
    : { style: 'closed', length: lip, turn }
}

const writeHem = (hem: Hem | null): SectionHem | null =>
  hem && { lip: hem.length, gap: hem.style === 'open' ? hem.gap : 0, turn: hem.turn }

/** Lengths stay planning lengths: there is no profile whose outside dimensions could be told. */
export const sectionSubject = (section: Section): CureSubject => ({
  profile: {
    version: 1,
    legs: section.legs,
    bends: section.turns.map((turn) => ({ turn })),
    hemA: readHem(section.hemA),
    hemB: readHem(section.hemB),
    colorSide: 'none',
  },
  findSection: ({ legs, bends, hemA, hemB }) => ({
    legs,
    turns: bends.map(({ turn }) => turn),
    hemA: writeHem(hemA),
    hemB: writeHem(hemB),
  }),
  hasEdits: false,
})
