import type { JobInsert } from '#server/db/tables/jobs'
import type { Calendar } from './calendar'
import { DEMO_COMPANIES, DEMO_PEOPLE } from './people'

const ofWicket = { company_id: DEMO_COMPANIES.wicket.id, created_by: DEMO_PEOPLE.maren.id }
const ofBramblejack = {
  company_id: DEMO_COMPANIES.bramblejack.id,
  created_by: DEMO_PEOPLE.tomas.id,
}
const ofPuddlewick = {
  company_id: DEMO_COMPANIES.puddlewick.id,
  created_by: DEMO_PEOPLE.corin.id,
}
const ofCorcho = { company_id: DEMO_COMPANIES.corcho.id, created_by: DEMO_PEOPLE.rosario.id }
const ofGander = { company_id: DEMO_COMPANIES.gander.id, created_by: DEMO_PEOPLE.bram.id }

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
  tannery: {
    ...ofPuddlewick,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84406',
    name: 'Tannery Yard lofts',
    address: '7 Tannery Yard, Fennwick',
    pitch_rise: 4,
  },
  nettle: {
    ...ofPuddlewick,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84407',
    name: 'Nettle Court duplex',
    address: '22 Nettle Court, Upper Wend',
    pitch_rise: 6,
  },
  mirador: {
    ...ofCorcho,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84408',
    name: 'Casa Mirador',
    address: '51 Saltmarsh Road, Low Tansley',
    pitch_rise: 5,
  },
  molino: {
    ...ofCorcho,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84409',
    name: 'Bodega del Molino',
    address: 'Old Mill Lane, Upper Wend',
    pitch_rise: 3,
  },
  gosling: {
    ...ofGander,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84410',
    name: 'Gosling Creek farm',
    address: '900 Creek Road, Fennwick',
    pitch_rise: 8,
  },
  ferry: {
    ...ofGander,
    id: '5f2b8e94-a1c3-4e7d-8f06-93bd41c84411',
    name: 'Ferry House boat shed',
    address: '3 Ferry Steps, Low Tansley',
    pitch_rise: 10,
  },
} as const satisfies Record<string, JobInsert>

export type DemoJob = keyof typeof DEMO_JOBS

/** Opened one after another before the first order came in. */
export const jobRows = ({ moment }: Calendar): JobInsert[] =>
  Object.values(DEMO_JOBS).map((job, index) => ({
    ...job,
    created_at: moment(-14, `13:${20 + 2 * index}`),
  }))
