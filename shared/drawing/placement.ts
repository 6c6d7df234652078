import { lineMeetsBox, linesCross } from './flat-geometry'

/** One way to set a label: its boxes of text, the lines that go with it, and how good it is. */
export interface Candidate {
  /** minX, minY, maxX, maxY of each box in turn. */
  readonly boxes: readonly number[]
  /** x1, y1, x2, y2 of each line in turn. */
  readonly lines: readonly number[]
  /** 0 is best. */
  readonly cost: number
}

/**
 * Candidates of one kind from the cheapest to the dearest, made when they are asked for: most
 * labels find their place among the first few, and making all of them is what costs. What has been
 * asked for does not come again: a stream is made for one placing.
 */
export interface Stream<C extends Candidate> {
  /** What the next candidate costs; Infinity when there are no more. It never falls. */
  readonly least: number
  /** Goes on to the next: a candidate that costs `least`, or undefined where there is no room. */
  next(): C | undefined
}

/** `weight` says who gives way: a lighter label is left out before a heavier one. */
export interface Label<C extends Candidate> {
  readonly weight: number
  readonly streams: readonly Stream<C>[]
}

/** Candidates that are there already. */
export const streamOf = <C extends Candidate>(candidates: readonly C[]): Stream<C> => {
  const sorted = candidates.toSorted((a, b) => a.cost - b.cost)
  let rank = 0
  return {
    get least() {
      return sorted[rank]?.cost ?? Infinity
    },
    next: () => sorted[rank++],
  }
}

/** Streams that are only begun when something as dear as `least` is asked for; none costs less. */
export class Later<C extends Candidate> implements Stream<C> {
  private streams: readonly Stream<C>[] | undefined

  constructor(
    public least: number,
    private readonly make: () => readonly Stream<C>[],
  ) {}

  next(): C | undefined {
    if (this.streams === undefined) {
      this.streams = this.make()
      this.least = Math.max(this.least, this.cheapest()?.least ?? Infinity)
      return undefined
    }
    const candidate = this.cheapest()?.next()
    this.least = this.cheapest()?.least ?? Infinity
    return candidate
  }

  private cheapest(): Stream<C> | undefined {
    let best: Stream<C> | undefined
    for (const stream of this.streams ?? []) {
      if (stream.least < (best?.least ?? Infinity)) best = stream
    }
    return best
  }
}

/** Room between text and the lines of other labels; the slashes of dimensions reach into it. */
const LINE_GAP = 3

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

/** A box around all of a candidate with the room it needs: minX, minY, maxX, maxY. */
const pushRoom = (rooms: number[], { boxes, lines }: Candidate): void => {
  let minX = Infinity
  let minY = Infinity
  let maxX = -Infinity
  let maxY = -Infinity
  for (let at = 0; at < boxes.length; at += 4) {
    const top = boxes[at + 1] ?? 0
    const bottom = boxes[at + 3] ?? 0
    const aside = SIDE_GAP * (bottom - top)
    minX = Math.min(minX, (boxes[at] ?? 0) - aside)
    maxX = Math.max(maxX, (boxes[at + 2] ?? 0) + aside)
    minY = Math.min(minY, top - LINE_GAP)
    maxY = Math.max(maxY, bottom + LINE_GAP)
  }
  for (let at = 0; at < lines.length; at += 2) {
    const x = lines[at] ?? 0
    const y = lines[at + 1] ?? 0
    minX = Math.min(minX, x)
    maxX = Math.max(maxX, x)
    minY = Math.min(minY, y)
    maxY = Math.max(maxY, y)
  }
  rooms.push(minX - LINE_GAP, minY - LINE_GAP, maxX + LINE_GAP, maxY + LINE_GAP)
}

/** A label's candidates from the cheapest to the dearest, made as far as they are asked for. */
class Options<C extends Candidate> {
  readonly ready: C[] = []
  /** Four numbers for each candidate that is ready. */
  readonly rooms: number[] = []
  private readonly streams: readonly Stream<C>[]
  private readonly begins: readonly number[]

  constructor(streams: readonly Stream<C>[]) {
    this.streams = streams.toSorted((a, b) => a.least - b.least)
    this.begins = this.streams.map((stream) => stream.least)
  }

  /** The candidate of a rank from 0; undefined when there are no more for less than `limit`. */
  at(rank: number, limit: number): C | undefined {
    while (this.ready.length <= rank && this.ready.length < MOST_CANDIDATES) {
      const stream = this.cheapest(limit)
      if (stream === undefined) return undefined
      const candidate = stream.next()
      if (candidate === undefined) continue
      this.ready.push(candidate)
      pushRoom(this.rooms, candidate)
    }
    return this.ready[rank]
  }

  private cheapest(limit: number): Stream<C> | undefined {
    let best: Stream<C> | undefined
    let least = limit
    for (let index = 0; index < this.streams.length; index += 1) {
      if ((this.begins[index] ?? Infinity) >= least) break
      const stream = this.streams[index]
      if (stream === undefined || stream.least >= least) continue
      best = stream
      least = stream.least
    }
    return best
  }
}

const textsTouch = (a: readonly number[], b: readonly number[]): boolean => {
  for (let i = 0; i < a.length; i += 4) {
    const top = a[i + 1] ?? 0
    const bottom = a[i + 3] ?? 0
    for (let j = 0; j < b.length; j += 4) {
      const otherTop = b[j + 1] ?? 0
      const otherBottom = b[j + 3] ?? 0
      if (top - LINE_GAP >= otherBottom || otherTop >= bottom + LINE_GAP) continue
      const aside = SIDE_GAP * Math.max(bottom - top, otherBottom - otherTop)
      if ((a[i] ?? 0) - aside < (b[j + 2] ?? 0) && (b[j] ?? 0) < (a[i + 2] ?? 0) + aside)
        return true
    }
  }
  return false
}

const linesEnter = (lines: readonly number[], boxes: readonly number[]): boolean => {
  for (let i = 0; i < lines.length; i += 4) {
    for (let j = 0; j < boxes.length; j += 4) {
      const isIn = lineMeetsBox(
        lines[i] ?? 0,
        lines[i + 1] ?? 0,
        lines[i + 2] ?? 0,
        lines[i + 3] ?? 0,
        (boxes[j] ?? 0) - LINE_GAP,
        (boxes[j + 1] ?? 0) - LINE_GAP,
        (boxes[j + 2] ?? 0) + LINE_GAP,
        (boxes[j + 3] ?? 0) + LINE_GAP,
      )
      if (isIn) return true
    }
  }
  return false
}

const crossings = (a: readonly number[], b: readonly number[]): number => {
  let count = 0
  for (let i = 0; i < a.length; i += 4) {
    for (let j = 0; j < b.length; j += 4) {
      const doCross = linesCross(
        a[i] ?? 0,
        a[i + 1] ?? 0,
        a[i + 2] ?? 0,
        a[i + 3] ?? 0,
        b[j] ?? 0,
        b[j + 1] ?? 0,
        b[j + 2] ?? 0,
        b[j + 3] ?? 0,
      )
      if (doCross) count += 1
    }
  }
  return count
}

const costTogether = (a: Candidate, b: Candidate): number => {
  const isClash =
    textsTouch(a.boxes, b.boxes) || linesEnter(b.lines, a.boxes) || linesEnter(a.lines, b.boxes)
  return isClash ? CLASH : CROSSING * crossings(a.lines, b.lines)
}

interface Ordered<C extends Candidate> {
  readonly index: number
  readonly weight: number
  readonly options: Options<C>
}

/** What stands where: a candidate for each label that has one, and the rooms they take. */
class Choice<C extends Candidate> {
  readonly chosen: (C | undefined)[]
  private readonly rooms: Float64Array

  constructor(count: number) {
    this.chosen = Array.from({ length: count }, () => undefined)
    this.rooms = new Float64Array(count * 4)
  }

  set(index: number, options: Options<C>, rank: number | undefined): void {
    this.chosen[index] = rank === undefined ? undefined : options.ready[rank]
    if (rank === undefined) return
    for (let side = 0; side < 4; side += 1) {
      this.rooms[index * 4 + side] = options.rooms[rank * 4 + side] ?? 0
    }
  }

  /** A candidate's cost among all the others, as far as it is below the limit. */
  costOf(options: Options<C>, rank: number, self: number, limit: number): number {
    const candidate = options.ready[rank]
    if (candidate === undefined) return Infinity
    const minX = options.rooms[rank * 4] ?? 0
    const minY = options.rooms[rank * 4 + 1] ?? 0
    const maxX = options.rooms[rank * 4 + 2] ?? 0
    const maxY = options.rooms[rank * 4 + 3] ?? 0
    const { rooms, chosen } = this
    let { cost } = candidate
    for (let index = 0; index < chosen.length && cost < limit; index += 1) {
      const other = chosen[index]
      if (other === undefined || index === self) continue
      if (maxX <= (rooms[index * 4] ?? 0) || (rooms[index * 4 + 2] ?? 0) <= minX) continue
      if (maxY <= (rooms[index * 4 + 1] ?? 0) || (rooms[index * 4 + 3] ?? 0) <= minY) continue
      cost += costTogether(candidate, other)
    }
    return cost
  }

  /** The labels that a candidate would lie on. */
  clashesOf(options: Options<C>, rank: number, self: number): number[] {
    const candidate = options.ready[rank]
    return this.chosen.flatMap((other, index) =>
      index !== self && other && candidate && costTogether(candidate, other) >= CLASH ? index : [],
    )
  }

  /** The options come by their own cost, so the search ends where that exceeds the best. */
  bestOf(options: Options<C>, self: number): { rank: number; cost: number } | undefined {
    let best = -1
    let least = Infinity
    for (let rank = 0; ; rank += 1) {
      const option = options.at(rank, least)
      if (option === undefined || option.cost >= least) break
      const cost = this.costOf(options, rank, self, least)
      if (cost >= least) continue
      best = rank
      least = cost
    }
    return best < 0 ? undefined : { rank: best, cost: least }
  }
}

/**
 * Chooses one candidate for each label so that no text touches another text or another label's
 * lines. Starts with the heaviest labels, then lets each label choose again among the others until
 * nothing changes; what still clashes is left out, lightest first (undefined in the answer).
 * Deterministic: ties go to the earlier label and the earlier candidate.
 */
export const placeLabels = <C extends Candidate>(
  labels: readonly Label<C>[],
): readonly (C | undefined)[] => {
  const order: Ordered<C>[] = labels
    .map(({ weight, streams }, index) => ({ index, weight, options: new Options(streams) }))
    .sort((a, b) => b.weight - a.weight || a.index - b.index)
  const choice = new Choice<C>(labels.length)
  const { chosen } = choice
  // How many labels in a row have kept their choice.
  let settled = 0
  for (let step = 0; step < MOST_ROUNDS * order.length && settled < order.length; step += 1) {
    const label = order[step % order.length]
    if (label === undefined) break
    const before = chosen[label.index]
    choice.set(label.index, label.options, choice.bestOf(label.options, label.index)?.rank)
    settled = chosen[label.index] === before ? settled + 1 : 1
  }
  for (const { options, index } of order.toReversed()) {
    const option = chosen[index]
    if (option === undefined) continue
    const rank = options.ready.indexOf(option)
    if (choice.costOf(options, rank, index, CLASH) < CLASH) continue
    const better = choice.bestOf(options, index)
    choice.set(index, options, better && better.cost < CLASH ? better.rank : undefined)
  }
  for (const { options, index } of order) {
    if (chosen[index] !== undefined) continue
    const best = choice.bestOf(options, index)
    if (best !== undefined && best.cost < CLASH) choice.set(index, options, best.rank)
    else makeRoom(choice, order, options, index)
  }
  return chosen
}

/**
 * Gives a label that found no room the best place that only one other label holds, if that one can
 * go elsewhere.
 */
const makeRoom = <C extends Candidate>(
  choice: Choice<C>,
  order: readonly Ordered<C>[],
  options: Options<C>,
  index: number,
): void => {
  for (let rank = 0; options.at(rank, Infinity) !== undefined; rank += 1) {
    const inTheWay = choice.clashesOf(options, rank, index)
    const other = order.find((label) => label.index === inTheWay[0])
    if (inTheWay.length !== 1 || other === undefined) continue
    choice.set(index, options, rank)
    const elsewhere = choice.bestOf(other.options, other.index)
    if (elsewhere !== undefined && elsewhere.cost < CLASH) {
      choice.set(other.index, other.options, elsewhere.rank)
      return
    }
    choice.set(index, options, undefined)
  }
}
