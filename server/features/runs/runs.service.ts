import type { Db } from '#server/db/knex'
import { momentWords } from '#server/features/pieces/move-words'
import { makingPorts, type MakingPorts } from '#server/features/pieces/making-ports'
import { movePieces } from '#server/features/pieces/move-piece'
import { notAllowed, notFound, wrongState } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { announce } from '#server/live/announce'
import type { AnswerOf, BodyOf } from '#shared/http/endpoint'
import type { bendCount, Run, RunSummary } from '#shared/runs/runs.contract'
import { findLockedQueued } from './queued-pieces.queries'
import { getRun, listRuns } from './runs.queries'
import { claimRun, findLockedRun, releaseClaim } from './runs.store'

export interface RunsService {
  readonly listRuns: (state: 'open' | 'done') => Promise<{ items: RunSummary[] }>
  readonly getRun: (id: string) => Promise<Run>
  /** Throws `wrong-state` with who holds it. */
  readonly claimRun: (id: string, person: SignedIn) => Promise<Run>
  /** Throws `not-allowed` when another holds it. */
  readonly leaveRun: (id: string, person: SignedIn) => Promise<Run>
  /** Throws `wrong-state` with how many are left when there are not so many. */
  readonly bendCount: (
    id: string,
    wish: BodyOf<typeof bendCount>,
    person: SignedIn,
  ) => Promise<AnswerOf<typeof bendCount>>
}

export const createRunsService = (db: Db, ports: MakingPorts = makingPorts): RunsService => ({
  listRuns: async (state) => ({ items: await listRuns(db, state) }),

  getRun: (id) => getRun(db, id),

  claimRun: async (id, person) => {
    const { claimed_by: holderId } = await getLockedRun(db, id)
    if (holderId !== null && holderId !== person.id) throw heldByAnother(await getRun(db, id))
    if (await claimRun(db, id, person.id, ports.clock?.now())) await announceRun(db, id)
    return getRun(db, id)
  },

  leaveRun: async (id, person) => {
    const { claimed_by: holderId } = await getLockedRun(db, id)
    if (holderId !== null) {
      if (holderId !== person.id && person.role !== 'manager') {
        throw notAllowed('Only who holds this run, or a manager, can give it back.')
      }
      await releaseClaim(db, id)
      await announceRun(db, id)
    }
    return getRun(db, id)
  },

  bendCount: async (id, { count, length }, person) => {
    const run = await getLockedRun(db, id)
    const queued = await findLockedQueued(db, id, length)
    if (queued.length < count) throw tooFew(run.number, queued.length, length)
    const moved = await movePieces(db, {
      pieceIds: queued.slice(0, count).map((piece) => piece.id),
      from: 'queued',
      to: 'bent',
      person,
      station: 'brake',
      at: ports.clock?.now(),
    })
    return { run: await getRun(db, id), eventIds: moved.map((piece) => piece.eventId) }
  },
})

const announceRun = (db: Db, id: string): Promise<void> =>
  announce(db, { topic: 'runs', entityId: id, companyId: null, audience: 'shop' })

async function getLockedRun(db: Db, id: string) {
  const run = await findLockedRun(db, id)
  if (!run) throw notFound('run')
  return run
}

function heldByAnother({ number, claimedBy }: Run) {
  if (!claimedBy) throw new Error(`Run ${number} is held by nobody.`)
  const when = momentWords(new Date(claimedBy.at))
  return wrongState(`${claimedBy.name} took run ${number} at ${when}.`, { claimedBy })
}

function tooFew(number: number, left: number, length: number | undefined) {
  const which = length === undefined ? '' : ' of this length'
  const are = left === 1 ? 'piece is' : 'pieces are'
  return wrongState(
    left === 0
      ? `Nothing${which} is left to bend in run ${number}.`
      : `Only ${left} ${are} left to bend${which} in run ${number}.`,
    { left },
  )
}
