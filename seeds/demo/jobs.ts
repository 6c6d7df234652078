import type { JobInsert } from '#server/db/tables/jobs'
import type { Calendar } from './calendar'
import { DEMO_COMPANIES, DEMO_PEOPLE } from './people'

const ofWicket = { company_id: DEMO_COMPANIES.wicket.id, created_by: DEMO_PEOPLE.maren.id }
const ofBramblejack = {
  company_id: DEMO_COMPANIES.bramblejack.id,
  created_by: DEMO_PEOPLE.tomas.id,
}

export const DEMO_JOBS = {
  harrow: {
    ...ofWicket,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84401',
    name: 'Harrow Lane house',
    address: '14 Harrow Lane, Fennwick',
    pitch_rise: 6,
  },
  millpond: {
    ...ofWicket,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84402',
    name: 'Mill Pond barn',
    address: 'Mill Pond Road, Fennwick',
    pitch_rise: 8,
  },
  orchard: {
    ...ofWicket,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84403',
    name: 'Orchard Row garages',
    address: '2-8 Orchard Row, Low Tansley',
    pitch_rise: 4,
  },
  tern: {
    ...ofBramblejack,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84404',
    name: 'Tern Street school annex',
    address: '300 Tern Street, Low Tansley',
    pitch_rise: 3,
  },
  chapel: {
    ...ofBramblejack,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84405',
    name: 'Cobble Hill chapel',
    address: '1 Cobble Hill, Upper Wend',
    pitch_rise: 12,
  },
} as const satisfies Record<string, JobInsert>

export type DemoJob = keyof typeof DEMO_JOBS

/** Opened one after another before the first order came in. */
export const jobRows = ({ moment }: Calendar): JobInsert[] =>
  Object.values(DEMO_JOBS).map((job, index) => ({
    ...job,
    created_at: moment(-11, `${13 + index}:20`),
  }))
