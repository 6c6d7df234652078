import { isAtMost } from '#shared/geometry/tolerance'
import { applyEdit } from '#shared/profile/edits'
import type { PlanCure, PlanReason } from '../plan.schema'
import type { PlanRequest } from '../plan-request'
import { canBend } from './can-bend'
import { laddersFor } from './cure-ladders'
import type { CureStep, Ladder } from './cure-ladders'
import type { CureSubject } from './cure-subject'

const MOST_CURES = 6

/** Changed pieces that are planned again, the folds each may ask about, and all of them together. */
const MOST_TRIES = 60
const NODES = 600
const MOST_FOLDS = 10_000

/** Reasons whose changes are tried: those nearest to bending come first. */
const MOST_REASONS = 4

const nameOf = ({ code, bend, leg }: CureStep): string => `${code} ${bend} ${leg}`

/** Two reasons may ask for the same change; the ladder of the nearer reason stands. */
const distinctLadders = (ladders: readonly Ladder[]): Ladder[] => {
  const known = new Map<string, Ladder>()
  for (const ladder of ladders) {
    const [first] = ladder
    if (first !== undefined && !known.has(nameOf(first))) known.set(nameOf(first), ladder)
  }
  return [...known.values()]
}

/** Searches of this request end at the limits of one try and of all tries together. */
const limited = (request: PlanRequest): PlanRequest => {
  let folds = 0
  return {
    ...request,
    limits: {
      nodes: NODES,
      isOver: () => (folds += 1) > MOST_FOLDS || request.limits?.isOver?.() === true,
    },
  }
}

/** The piece is too long and nothing else: pieces as long as the brake. */
const shorterPieces = (request: PlanRequest): PlanCure[] => {
  const { brake, pieceLength } = request
  if (isAtMost(pieceLength, brake.length)) return []
  return canBend({ ...limited(request), pieceLength: brake.length })
    ? [{ code: 'shortenPiece', bend: null, leg: null, value: brake.length, edit: null }]
    : []
}

/**
 * Single changes after which the planner bends the piece on this brake, each planned again before it is
 * named; the smallest change first, at most six, one of a kind. None may be found: feasibility is not
 * monotone in a length or an angle, so nothing is promised that was not solved.
 *
 * The work is bounded by numbers of tries and folds, never by time, so that the same request finds the
 * same cures everywhere. A cure that is overlooked for it is not said to be impossible.
 */
export const findCures = (
  request: PlanRequest,
  reasons: readonly PlanReason[],
  subject: CureSubject,
): PlanCure[] => {
  if (reasons.some(({ code }) => code === 'length')) return shorterPieces(request)
  const ladders = distinctLadders(
    reasons
      .filter(({ bend }) => bend !== null)
      .slice(0, MOST_REASONS)
      .flatMap((reason) => laddersFor(subject.profile, reason)),
  )
  const steps = ladders
    .flatMap((ladder, place) => ladder.map((step) => ({ step, place })))
    .sort((a, b) => a.step.size - b.step.size || a.place - b.place)
  const asked = limited(request)
  const done = new Set<number>()
  const cures: PlanCure[] = []
  let tries = 0
  for (const { step, place } of steps) {
    if (cures.length === MOST_CURES || tries === MOST_TRIES) break
    if (done.has(place)) continue
    const section = subject.findSection(applyEdit(subject.profile, step.edit))
    if (section === undefined) continue
    tries += 1
    if (!canBend({ ...asked, section })) continue
    done.add(place)
    const { code, bend, leg, value, edit } = step
    cures.push({ code, bend, leg, value, edit: subject.hasEdits ? edit : null })
  }
  return cures
}
