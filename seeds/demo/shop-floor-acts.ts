import { RUNS } from '#server/db/tables/runs'
import type { Bundle, BundlePiece } from '#shared/bundles/bundles.contract'
import type { Run } from '#shared/runs/runs.contract'
import { DEMO_PEOPLE, type DemoPerson } from './people'
import { demoSignature } from './signature'
import type { Act, Told } from './story'

const { wren, ines } = DEMO_PEOPLE

const minutesAfter = (moment: Date, minutes: number): Date =>
  new Date(moment.getTime() + minutes * 60_000)

/** The order's runs in the order of their numbers; `place` counts from 1. */
async function getRun({ shop, getOrder }: Told, place: number): Promise<Run> {
  const { id } = await getOrder()
  const ids = await shop.db(RUNS).where({ order_id: id }).orderBy('number').pluck('id')
  const runId: unknown = ids[place - 1]
  if (typeof runId !== 'string') throw new RangeError(`The order has no run ${place}.`)
  return shop.runs.getRun(runId)
}

export const claim =
  (place: number): Act =>
  async (told) => {
    const run = await getRun(told, place)
    await told.shop.runs.claimRun(run.id, wren)
  }

/** Gives a run that is not finished back to the queue. */
export const leave =
  (place: number, by: DemoPerson = 'wren'): Act =>
  async (told) => {
    const run = await getRun(told, place)
    await told.shop.runs.leaveRun(run.id, DEMO_PEOPLE[by])
  }

/** Takes the run if need be and bends so many of its pieces, or all that are queued, one by one. */
export const bend =
  (place: number, count?: number): Act =>
  async (told) => {
    const run = await getRun(told, place)
    if (!run.claimedBy) await told.shop.runs.claimRun(run.id, wren)
    const queued = run.pieces.filter((piece) => piece.state === 'queued')
    const begun = told.shop.clock.now()
    for (const [index, piece] of queued.slice(0, count).entries()) {
      told.shop.setTime(minutesAfter(begun, 4 + 2 * index))
      await told.shop.pieces.bendPiece(piece.code, run.id, wren)
    }
  }

/** Takes the run and bends so many of its pieces, or all, by count. */
export const bendRun =
  (place: number, by: DemoPerson = 'wren', count?: number): Act =>
  async (told) => {
    const { id, pieces } = await getRun(told, place)
    const queued = pieces.filter((piece) => piece.state === 'queued').length
    await told.shop.runs.claimRun(id, DEMO_PEOPLE[by])
    await told.shop.runs.bendCount(id, { count: count ?? queued }, DEMO_PEOPLE[by])
  }

/** Presses the count instead of scanning. */
export const bendByCount =
  (place: number, count: number): Act =>
  async (told) => {
    const run = await getRun(told, place)
    await told.shop.runs.bendCount(run.id, { count }, wren)
  }

/** One press too many, taken back. */
export const bendOneByMistake =
  (place: number, reason: string): Act =>
  async (told) => {
    const run = await getRun(told, place)
    const { eventIds } = await told.shop.runs.bendCount(run.id, { count: 1 }, wren)
    told.shop.setTime(minutesAfter(told.shop.clock.now(), 1))
    await told.shop.pieces.undoMoves({ eventIds, reason }, wren)
  }

/** Spoils the last bent piece of a run; its remake queues. */
export const spoil =
  (place: number, reason: string): Act =>
  async (told) => {
    const run = await getRun(told, place)
    const piece = run.pieces.findLast((candidate) => candidate.state === 'bent')
    if (!piece) throw new Error(`Run ${run.number} has no bent piece.`)
    await told.shop.pieces.scrapPiece(piece.code, reason, wren)
  }

/** Straps loose pieces of the order together, all of them unless some are chosen. */
export const bundle =
  (rackPlace: string, choose: (loose: BundlePiece[]) => BundlePiece[] = (loose) => loose): Act =>
  async ({ shop, getOrder }) => {
    const { id } = await getOrder()
    const { work } = await shop.bundles.getRack()
    const loose = work.find((candidate) => candidate.orderId === id)?.loose ?? []
    const pieceCodes = choose(loose).map((piece) => piece.code)
    await shop.bundles.createBundle({ orderId: id, pieceCodes, rackPlace }, wren)
  }

export const ofMark =
  (...marks: string[]) =>
  (loose: BundlePiece[]): BundlePiece[] =>
    loose.filter((piece) => marks.includes(piece.mark))

export const moveTo =
  (number: number, rackPlace: string): Act =>
  async (told) => {
    const found = await getBundle(told, number)
    await told.shop.bundles.moveBundle(found.id, { rackPlace })
  }

/** Opens a bundle to take its first piece out. */
export const takeOneOut =
  (number: number, reason: string): Act =>
  async (told) => {
    const { id, pieces } = await getBundle(told, number)
    const pieceCodes = pieces.slice(0, 1).map((piece) => piece.code)
    await told.shop.bundles.openBundle(id, { pieceCodes, reason }, wren)
  }

export const handOver =
  (receivedBy: string, ...numbers: number[]): Act =>
  async ({ shop, getOrder }) => {
    const { id, number } = await getOrder()
    const sheet = await shop.handOff.getHandOffSheet(id)
    const bundles = sheet.bundles.filter((candidate) => numbers.includes(candidate.number))
    const bundleCodes = bundles.map((candidate) => candidate.code)
    const signature = demoSignature(number % 5)
    await shop.handOff.handOff(id, { bundleCodes, receivedBy, signature }, ines)
  }

export const bringBack =
  (number: number, reason: string): Act =>
  async (told) => {
    const found = await getBundle(told, number)
    await told.shop.handOff.returnBundle(found.id, reason, ines)
  }

async function getBundle({ shop, getOrder }: Told, number: number): Promise<Bundle> {
  const { id } = await getOrder()
  const { bundles } = await shop.handOff.getHandOffSheet(id)
  const found = bundles.find((candidate) => candidate.number === number)
  if (!found) throw new RangeError(`The order has no bundle ${number}.`)
  return found
}
