export const ROLES = ['crewLead', 'bender', 'counter', 'manager'] as const
export type Role = (typeof ROLES)[number]

/** The top-level areas of the client; each route of a place begins with its word. */
export const PLACES = ['roof', 'brake', 'rack', 'counter', 'office'] as const
export type Place = (typeof PLACES)[number]

/**
 * Who may do what. Routes and buttons read this one table. A crew lead's rights end at the own
 * company: that is a matter of rows, see `seesOnlyOwnCompany`.
 */
export const PERMISSIONS = {
  /** Everyone who is signed in. */
  'self.manage': ['crewLead', 'bender', 'counter', 'manager'],
  'live.follow': ['crewLead', 'bender', 'counter', 'manager'],
  'jobs.read': ['crewLead', 'counter', 'manager'],
  'jobs.write': ['crewLead', 'counter', 'manager'],
  'shelf.read': ['crewLead', 'counter', 'manager'],
  'shelf.write': ['crewLead', 'counter', 'manager'],
  'stocks.read': ['crewLead', 'bender', 'counter', 'manager'],
  /** Lots and what is left of them are the shop's own. */
  'stockItems.read': ['bender', 'counter', 'manager'],
  'prices.read': ['crewLead', 'counter', 'manager'],
  /** Measuring is the bender's; what is cut by it is the manager's decision. */
  'stocks.test': ['bender', 'manager'],
  'stocks.calibrate': ['manager'],
  'brakes.read': ['crewLead', 'bender', 'counter', 'manager'],
  'plans.make': ['crewLead', 'bender', 'counter', 'manager'],
  'orders.read': ['crewLead', 'counter', 'manager'],
  'orders.submit': ['crewLead', 'counter', 'manager'],
  'orders.amend': ['crewLead', 'counter', 'manager'],
  'orders.withdraw': ['crewLead', 'counter', 'manager'],
  'orders.ask': ['counter', 'manager'],
  'orders.release': ['counter', 'manager'],
  'pieces.read': ['crewLead', 'bender', 'counter', 'manager'],
  'pieces.bend': ['bender', 'manager'],
  'pieces.scrap': ['bender', 'manager'],
  'labels.print': ['bender', 'counter', 'manager'],
  'runs.read': ['bender', 'counter', 'manager'],
  'runs.claim': ['bender', 'manager'],
  'rack.read': ['bender', 'counter', 'manager'],
  'bundles.write': ['bender', 'counter', 'manager'],
  'bundles.handOff': ['counter', 'manager'],
  'people.read': ['manager'],
  /** A crew lead invites crew leads of the own company. */
  'people.invite': ['crewLead', 'manager'],
  'people.manage': ['manager'],
  'crew.read': ['crewLead'],
  'companies.read': ['counter', 'manager'],
  'companies.write': ['manager'],
  'mails.read': ['manager'],
  'mails.send': ['manager'],
  'audit.read': ['manager'],
} as const satisfies Record<string, readonly Role[]>

export type Permission = keyof typeof PERMISSIONS

export const may = (role: Role, permission: Permission): boolean =>
  (PERMISSIONS[permission] as readonly Role[]).includes(role)

/** Crew leads read and write the rows of their own company only; the shop's people see all. */
export const seesOnlyOwnCompany = (role: Role): boolean => role === 'crewLead'

/** The places a role works in; the first is where it lands after signing in. */
export const PLACES_OF: Record<Role, readonly [Place, ...Place[]]> = {
  crewLead: ['roof'],
  bender: ['brake', 'rack'],
  counter: ['counter', 'rack', 'roof', 'brake'],
  manager: ['office', 'counter', 'brake', 'rack', 'roof'],
}
