import pg from 'pg'
import { hadToGiveWay } from '#server/db/transaction'
import { invalidField, ProblemError, wrongState } from '#server/http/errors'

type Refusal = (error: pg.DatabaseError) => ProblemError

const taken = (path: string, what: string): Refusal => {
  return () => invalidField(path, `There is already ${what}. Choose another.`)
}

const movedMeanwhile: Refusal = () =>
  new ProblemError(
    'changed-meanwhile',
    'Somebody else was faster. Look at how it stands now and try again.',
  )

/** What a constraint means to the person whose request broke it. */
const BY_CONSTRAINT: Record<string, Refusal> = {
  companies_name_unique: taken('name', 'a company of this name'),
  people_email_unique: taken('email', 'an account with this mail address'),
  stocks_unique: taken('colorName', 'this metal in this thickness and color'),
  brakes_name_unique: taken('name', 'a brake of this name'),
  shelf_profiles_name_unique: taken('name', 'a profile of this name on this shelf'),
  orders_job_of_company: () =>
    invalidField('jobId', 'This job belongs to another company. Choose a job of the own company.'),
  orders_one_end: () => wrongState('The order was released or withdrawn meanwhile.'),
  bundles_number_unique: movedMeanwhile,
  pieces_bundle: () => wrongState('A bundle holds pieces of one order only.'),
  pieces_remade_once: () => wrongState('This piece was already made again.'),
  pieces_one_live_per_place: () => wrongState('Another piece already stands in for this one.'),
  piece_events_undone_once: () => wrongState('This was already undone.'),
}

/** What the triggers raise; see the migrations. The other codes are faults of ours. */
const BY_CODE: Record<string, Refusal> = {
  FY001: () => wrongState('The piece cannot go from where it is to where it was sent.'),
  FY003: () => invalidField('reason', 'This move needs a reason. Say why in a few words.'),
  FY005: () => wrongState('A released order is frozen and cannot be changed.'),
  FY006: movedMeanwhile,
}

/** The problem that a refusal of the database stands for; undefined when it is a fault of ours. */
export function findDatabaseProblem(error: unknown): ProblemError | undefined {
  if (!(error instanceof pg.DatabaseError)) return undefined
  if (hadToGiveWay(error)) return movedMeanwhile(error)
  const refusal = BY_CONSTRAINT[error.constraint ?? ''] ?? BY_CODE[error.code ?? '']
  return refusal?.(error)
}
