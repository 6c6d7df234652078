import type { PersonInsert } from '#server/db/tables/people'
import type { SignedIn } from '#server/http/signed-in'

/** One password for everyone: a demo shop guards nothing. */
export const DEMO_PASSWORD = 'foldyard-demo'

/** Companies, people, addresses and colors of the demo shop are invented. */
export const DEMO_COMPANIES = {
  wicket: { id: '3d1f0a52-6c1e-4b0e-9a57-0c0f5a3e1101', name: 'Wicket & Plume Roofing' },
  bramblejack: { id: '3d1f0a52-6c1e-4b0e-9a57-0c0f5a3e1102', name: 'Bramblejack Roof Crews' },
  puddlewick: { id: '3d1f0a52-6c1e-4b0e-9a57-0c0f5a3e1103', name: 'Puddlewick Exteriors' },
  corcho: { id: '3d1f0a52-6c1e-4b0e-9a57-0c0f5a3e1104', name: 'Tejados Luna de Corcho' },
  gander: { id: '3d1f0a52-6c1e-4b0e-9a57-0c0f5a3e1105', name: 'Old Gander Sheet & Shingle' },
} as const

const person = (
  id: string,
  name: string,
  email: string,
  role: SignedIn['role'],
  company: SignedIn['company'] = null,
  language: SignedIn['language'] = 'en',
): SignedIn => ({
  id,
  name,
  email,
  role,
  company,
  companyId: company?.id ?? null,
  language,
  units: 'fraction',
  // Light is read in the sun; at the other places the system's choice is followed.
  theme: role === 'crewLead' ? 'light' : 'system',
})

/** Somebody for every role, and a crew lead or two for each company. */
export const DEMO_PEOPLE = {
  maren: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2201',
    'Maren Quillfeather',
    'maren@example.com',
    'crewLead',
    DEMO_COMPANIES.wicket,
  ),
  tomas: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2202',
    'Tomás Valdeluna',
    'tomas@example.com',
    'crewLead',
    DEMO_COMPANIES.bramblejack,
    'es',
  ),
  wren: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2203',
    'Wren Ashgrove',
    'wren@example.com',
    'bender',
  ),
  ines: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2204',
    'Ines Marrowby',
    'ines@example.com',
    'counter',
  ),
  juno: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2205',
    'Juno Hathersedge',
    'juno@example.com',
    'manager',
  ),
  petra: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2206',
    'Petra Larkmoor',
    'petra@example.com',
    'crewLead',
    DEMO_COMPANIES.wicket,
  ),
  corin: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2207',
    'Corin Fernhollow',
    'corin@example.com',
    'crewLead',
    DEMO_COMPANIES.puddlewick,
  ),
  rosario: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2208',
    'Rosario Vallehondo',
    'rosario@example.com',
    'crewLead',
    DEMO_COMPANIES.corcho,
    'es',
  ),
  bram: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2209',
    'Bram Oxenthistle',
    'bram@example.com',
    'crewLead',
    DEMO_COMPANIES.gander,
  ),
  oskar: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2210',
    'Oskar Tindlebrook',
    'oskar@example.com',
    'bender',
  ),
  hollis: person(
    '8b7a4c10-52f9-4d36-8c55-71d20e4f2211',
    'Hollis Wrenfield',
    'hollis@example.com',
    'counter',
  ),
} as const satisfies Record<string, SignedIn>

export type DemoPerson = keyof typeof DEMO_PEOPLE

export const personRow = (
  { id, companyId, role, name, email, language }: SignedIn,
  passwordHash: string,
  createdAt: Date,
): PersonInsert => ({
  id,
  company_id: companyId,
  role,
  name,
  email,
  language,
  password_hash: passwordHash,
  created_at: createdAt,
})
