import type { Bounds } from '#shared/geometry/bounds'
import { grow, heightOf, overlap, union } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import { boxOfSegment, crosses, meetsBox } from '#shared/geometry/segment'

/** One way to set a label: its boxes of text, the lines that go with it, and how good it is. */
export interface Candidate {
  readonly boxes: readonly Bounds[]
  readonly lines: readonly Segment[]
  /** 0 is best. */
  readonly cost: number
}

/** `weight` says who gives way: a lighter label is left out before a heavier one. */
export interface Label<C extends Candidate> {
  readonly weight: number
  readonly candidates: readonly C[]
}

/** Room between text and the lines of other labels. */
const LINE_GAP = 2

/**
 * Room between texts side by side, in parts of a line's height: over two characters, so that "2"
 * and "1/2" never read as 2 1/2.
 */
const SIDE_GAP = 1.4

/** What a line across another line costs. */
const CROSSING = 4

const CLASH = 10_000

const MOST_ROUNDS = 8

/** Only the best candidates of a label are looked at. */
const MOST_CANDIDATES = 90

interface Prepared<C extends Candidate> {
  readonly candidate: C
  readonly cost: number
  /** Text with the room that other text leaves to it. */
  readonly textRoom: readonly Bounds[]
  /** Text with the room that other labels' lines leave to it. */
  readonly lineRoom: readonly Bounds[]
  /** Around all of it. */
  readonly around: Bounds
}

const prepare = <C extends Candidate>(candidate: C): Prepared<C> => {
  const textRoom = candidate.boxes.map((box) => ({
    minX: box.minX - SIDE_GAP * heightOf(box),
    maxX: box.maxX + SIDE_GAP * heightOf(box),
    minY: box.minY - LINE_GAP,
    maxY: box.maxY + LINE_GAP,
  }))
  const everything = [...textRoom, ...candidate.lines.map(boxOfSegment)]
  return {
    candidate,
    cost: candidate.cost,
    textRoom,
    lineRoom: candidate.boxes.map((box) => grow(box, LINE_GAP)),
    around: grow(everything.reduce(union), LINE_GAP),
  }
}

const linesEnter = (lines: readonly Segment[], rooms: readonly Bounds[]): boolean =>
  rooms.some((room) => lines.some((line) => meetsBox(line, room)))

const clash = (a: Prepared<Candidate>, b: Prepared<Candidate>): boolean =>
  a.textRoom.some((room) => b.candidate.boxes.some((box) => overlap(room, box))) ||
  linesEnter(b.candidate.lines, a.lineRoom) ||
  linesEnter(a.candidate.lines, b.lineRoom)

const crossings = (a: Candidate, b: Candidate): number => {
  let count = 0
  for (const line of a.lines) {
    for (const other of b.lines) if (crosses(line, other)) count += 1
  }
  return count
}

const costTogether = (a: Prepared<Candidate>, b: Prepared<Candidate>): number => {
  if (!overlap(a.around, b.around)) return 0
  return clash(a, b) ? CLASH : CROSSING * crossings(a.candidate, b.candidate)
}

type Choice<C extends Candidate> = (Prepared<C> | undefined)[]

const costAmong = <C extends Candidate>(
  option: Prepared<C>,
  chosen: Choice<C>,
  self: number,
  limit: number,
): number => {
  let cost = option.cost
  for (let index = 0; index < chosen.length && cost < limit; index += 1) {
    const other = chosen[index]
    if (index !== self && other !== undefined) cost += costTogether(option, other)
  }
  return cost
}

/** The options are sorted by their own cost, so the search ends where that exceeds the best. */
const bestAmong = <C extends Candidate>(
  options: readonly Prepared<C>[],
  chosen: Choice<C>,
  self: number,
): { readonly option: Prepared<C>; readonly cost: number } | undefined => {
  let best: { option: Prepared<C>; cost: number } | undefined
  for (const option of options) {
    const limit = best?.cost ?? Infinity
    if (option.cost >= limit) break
    const cost = costAmong(option, chosen, self, limit)
    if (cost < limit) best = { option, cost }
  }
  return best
}

/**
 * Chooses one candidate for each label so that no text touches another text or another label's
 * lines. Starts with the heaviest labels, then lets each label choose again among the others until
 * nothing changes; what still clashes is left out, lightest first (undefined in the answer).
 * Deterministic: ties go to the earlier label and the earlier candidate.
 */
export const placeLabels = <C extends Candidate>(
  labels: readonly Label<C>[],
): (C | undefined)[] => {
  const order = labels
    .map((label, index) => ({
      index,
      weight: label.weight,
      options: label.candidates
        .toSorted((a, b) => a.cost - b.cost)
        .slice(0, MOST_CANDIDATES)
        .map(prepare),
    }))
    .sort((a, b) => b.weight - a.weight || a.options.length - b.options.length || a.index - b.index)
  const chosen: Choice<C> = labels.map(() => undefined)
  for (let round = 0; round < MOST_ROUNDS; round += 1) {
    let changed = false
    for (const { options, index } of order) {
      const best = bestAmong(options, chosen, index)?.option
      if (best !== chosen[index]) changed = true
      chosen[index] = best
    }
    if (!changed) break
  }
  for (const { options, index } of order.toReversed()) {
    const option = chosen[index]
    if (option === undefined || costAmong(option, chosen, index, CLASH) < CLASH) continue
    const better = bestAmong(options, chosen, index)
    chosen[index] = better !== undefined && better.cost < CLASH ? better.option : undefined
  }
  for (const { options, index } of order) {
    if (chosen[index] !== undefined) continue
    const best = bestAmong(options, chosen, index)
    if (best !== undefined && best.cost < CLASH) chosen[index] = best.option
  }
  return chosen.map((option) => option?.candidate)
}
