import type { ShelfProfileInsert } from '#server/db/tables/shelf-profiles'
import { applyEdit, type ProfileEdit } from '#shared/profile/edits'
import type { Profile } from '#shared/profile/profile.schema'
import { getStarter, STARTERS, type StarterKey } from '#shared/profile/starters'
import { DEMO_PEOPLE, type DemoPerson } from './people'

const from = (key: StarterKey, ...edits: ProfileEdit[]): Profile =>
  edits.reduce(applyEdit, getStarter(key).profile)

const leg = (place: number, length: number): ProfileEdit => ({ kind: 'setLeg', leg: place, length })

/** What the crews ordered: starters made to fit their roofs, and two drawn from nothing. */
export const DEMO_PROFILES = {
  eaveDrip: from('eaveDrip'),
  deepEave: from('eaveDrip', leg(1, 5), leg(2, 3.5)),
  gableRake: from('gableRake'),
  tallRake: from('gableRake', leg(1, 4), leg(2, 7.25)),
  ridge: from('ridge'),
  slimRidge: from('ridge', leg(2, 5.25), leg(3, 5.25)),
  valley: from('valley'),
  wideValley: from('valley', leg(1, 11.5), leg(2, 11.5)),
  headwall: from('headwall'),
  sidewall: from('sidewall', leg(2, 6)),
  peak: from('highSidePeak'),
  closure: from('zClosure'),
  openHemClosure: from('zClosure', {
    kind: 'setHem',
    edge: 'B',
    hem: { style: 'open', length: 0.5, gap: 0.125, turn: -1 },
  }),
  bareValley: from('valley', { kind: 'setColorSide', colorSide: 'none' }),
  bareDrip: from('eaveDrip', leg(2, 3), { kind: 'setColorSide', colorSide: 'none' }),
  /** Over the top of a low wall, a kicked and hemmed drip on either side. */
  wallCap: {
    version: 1,
    legs: [0.625, 3.5, 8.25, 3.5, 0.625],
    bends: [{ turn: 30 }, { turn: -90 }, { turn: -90 }, { turn: 30 }],
    hemA: { style: 'closed', length: 0.5, turn: -1 },
    hemB: { style: 'closed', length: 0.5, turn: -1 },
    colorSide: 'left',
  },
  /** A fascia cover with a return under the soffit. */
  fascia: {
    version: 1,
    legs: [1, 7.5, 1.5],
    bends: [{ turn: -90 }, { turn: -90 }],
    hemA: null,
    hemB: { style: 'closed', length: 0.5, turn: -1 },
    colorSide: 'left',
  },
} as const satisfies Record<string, Profile>

export type DemoProfile = keyof typeof DEMO_PROFILES

const saved = (
  id: string,
  lead: DemoPerson,
  name: string,
  profile: DemoProfile,
): ShelfProfileInsert => ({
  id,
  company_id: DEMO_PEOPLE[lead].companyId,
  saved_by: DEMO_PEOPLE[lead].id,
  starter_key: null,
  name,
  profile: JSON.stringify(DEMO_PROFILES[profile]),
})

/** The shop's starters, and what the two companies put on their shelves. */
export const shelfRows = (nextId: () => string): ShelfProfileInsert[] => [
  ...STARTERS.map(({ key, profile }) => ({
    id: nextId(),
    company_id: null,
    starter_key: key,
    name: key,
    profile: JSON.stringify(profile),
  })),
  saved(nextId(), 'maren', 'Parapet cap 8 1/4', 'wallCap'),
  saved(nextId(), 'maren', 'Barn rake, tall', 'gableRake'),
  saved(nextId(), 'tomas', 'Fascia cover 7 1/2', 'fascia'),
]

/** Saved again under its name some days later: the version before stays. */
export const SHELF_CHANGE = {
  name: 'Barn rake, tall',
  companyId: DEMO_PEOPLE.maren.companyId,
  saved: {
    profile: JSON.stringify(DEMO_PROFILES.tallRake),
    version: 2,
    saved_by: DEMO_PEOPLE.maren.id,
  },
} as const
