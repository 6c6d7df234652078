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
 *
 * One class for all kinds, because the engine looks at thousands of them for a figure.
 */
export class Stream<C extends Candidate> {
  constructor(
    /** What the next candidate costs; Infinity when there are no more. It never falls. */
    public least: number,
    /** Goes on to the next: a candidate that costs `least`, or undefined where there is no room. */
    private readonly advance: (stream: Stream<C>) => C | undefined,
  ) {}

  next(): C | undefined {
    return this.advance(this)
  }
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
  return new Stream(sorted[0]?.cost ?? Infinity, (stream) => {
    const candidate = sorted[rank]
    rank += 1
    stream.least = sorted[rank]?.cost ?? Infinity
    return candidate
  })
}

/** Streams that are only begun when something as dear as `least` is asked for; none costs less. */
export const later = <C extends Candidate>(
  least: number,
  make: () => readonly Stream<C>[],
): Stream<C> => {
  let streams: readonly Stream<C>[] | undefined
  let cheapest: Stream<C> | undefined
  return new Stream(least, (all) => {
    const candidate = cheapest?.next()
    streams ??= make()
    let next = Infinity
    for (const stream of streams) {
      if (stream.least < next) {
        next = stream.least
        cheapest = stream
      }
    }
    all.least = Math.max(all.least, next)
    return candidate
  })
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
  /** Around the rooms of all that are ready: what happens elsewhere changes nothing for them. */
  minX = Infinity
  minY = Infinity
  maxX = -Infinity
  maxY = -Infinity
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
      this.take(candidate)
    }
    return this.ready[rank]
  }

  private take(candidate: C): void {
    const { rooms } = this
    const at = rooms.length
    this.ready.push(candidate)
    pushRoom(rooms, candidate)
    this.minX = Math.min(this.minX, rooms[at] ?? Infinity)
    this.minY = Math.min(this.minY, rooms[at + 1] ?? Infinity)
    this.maxX = Math.max(this.maxX, rooms[at + 2] ?? -Infinity)
    this.maxY = Math.max(this.maxY, rooms[at + 3] ?? -Infinity)
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

const clash = (a: Candidate, b: Candidate): boolean =>
  textsTouch(a.boxes, b.boxes) || linesEnter(b.lines, a.boxes) || linesEnter(a.lines, b.boxes)

/** What stands where: a candidate for each label that has one, and the rooms they take. */
class Choice<C extends Candidate> {
  readonly chosen: (C | undefined)[]
  private readonly rooms: Float64Array
  /** The neighbors of the candidate that is being looked at. */
  private readonly near: Int32Array
  /** Labels near which something has changed since they chose. */
  private readonly isStale: boolean[]

  constructor(private readonly all: readonly Options<C>[]) {
    this.chosen = all.map(() => undefined)
    this.rooms = new Float64Array(all.length * 4)
    this.near = new Int32Array(all.length)
    this.isStale = all.map(() => true)
  }

  set(index: number, rank: number | undefined): void {
    const options = this.all[index]
    const candidate = rank === undefined ? undefined : options?.ready[rank]
    if (candidate === this.chosen[index]) return
    if (this.chosen[index] !== undefined) this.wake(index)
    this.chosen[index] = candidate
    if (candidate === undefined || rank === undefined) return
    for (let side = 0; side < 4; side += 1) {
      this.rooms[index * 4 + side] = options?.rooms[rank * 4 + side] ?? 0
    }
    this.wake(index)
  }

  /** All that could stand where this label stands must choose again. */
  private wake(index: number): void {
    const { rooms, all, isStale } = this
    const minX = rooms[index * 4] ?? 0
    const minY = rooms[index * 4 + 1] ?? 0
    const maxX = rooms[index * 4 + 2] ?? 0
    const maxY = rooms[index * 4 + 3] ?? 0
    for (let other = 0; other < all.length; other += 1) {
      const field = all[other]
      if (field === undefined || other === index) continue
      if (maxX <= field.minX || field.maxX <= minX) continue
      if (maxY <= field.minY || field.maxY <= minY) continue
      isStale[other] = true
    }
  }

  /** Lets a label choose among the others; false where nothing near it has changed since it did. */
  choose(index: number): boolean {
    if (this.isStale[index] !== true) return false
    this.isStale[index] = false
    this.set(index, this.bestOf(index)?.rank)
    return true
  }

  /** A candidate's cost among all the others, as far as it is below the limit. */
  costOf(self: number, rank: number, limit: number): number {
    const options = this.all[self]
    const candidate = options?.ready[rank]
    if (options === undefined || candidate === undefined) return Infinity
    const minX = options.rooms[rank * 4] ?? 0
    const minY = options.rooms[rank * 4 + 1] ?? 0
    const maxX = options.rooms[rank * 4 + 2] ?? 0
    const maxY = options.rooms[rank * 4 + 3] ?? 0
    const { rooms, chosen, near } = this
    let { cost } = candidate
    let count = 0
    for (let index = 0; index < chosen.length; index += 1) {
      const other = chosen[index]
      if (other === undefined || index === self) continue
      if (maxX <= (rooms[index * 4] ?? 0) || (rooms[index * 4 + 2] ?? 0) <= minX) continue
      if (maxY <= (rooms[index * 4 + 1] ?? 0) || (rooms[index * 4 + 3] ?? 0) <= minY) continue
      if (clash(candidate, other)) {
        cost += CLASH
        if (cost >= limit) return cost
      } else {
        near[count] = index
        count += 1
      }
    }
    // Crossings are counted last: most candidates are turned down by a clash.
    for (let at = 0; at < count && cost < limit; at += 1) {
      const other = chosen[near[at] ?? 0]
      if (other !== undefined) cost += CROSSING * crossings(candidate.lines, other.lines)
    }
    return cost
  }

  /** The labels that a candidate would lie on. */
  clashesOf(self: number, rank: number): number[] {
    const candidate = this.all[self]?.ready[rank]
    return this.chosen.flatMap((other, index) =>
      index !== self && other && candidate && clash(candidate, other) ? index : [],
    )
  }

  /** The options come by their own cost, so the search ends where that exceeds the best. */
  bestOf(self: number): { rank: number; cost: number } | undefined {
    const options = this.all[self]
    let best = -1
    let least = Infinity
    for (let rank = 0; ; rank += 1) {
      const option = options?.at(rank, least)
      if (option === undefined || option.cost >= least) break
      const cost = this.costOf(self, rank, least)
      if (cost >= least) continue
      best = rank
      least = cost
    }
    return best < 0 ? undefined : { rank: best, cost: least }
  }

  /**
   * Gives a label that found no room the best place that only one other label holds, if that one
   * can go elsewhere.
   */
  makeRoom(self: number): void {
    const options = this.all[self]
    for (let rank = 0; options?.at(rank, Infinity) !== undefined; rank += 1) {
      const [other, ...others] = this.clashesOf(self, rank)
      if (other === undefined || others.length > 0) continue
      this.set(self, rank)
      const elsewhere = this.bestOf(other)
      if (elsewhere !== undefined && elsewhere.cost < CLASH) {
        this.set(other, elsewhere.rank)
        return
      }
      this.set(self, undefined)
    }
  }
}

/**
 * Chooses one candidate for each label so that no text touches another text or another label's
 * lines. Starts with the heaviest labels, then lets each label choose again among the others until
 * nothing changes; what still clashes is left out, lightest first (undefined in the answer), unless
 * another label can make room for it. Deterministic: ties go to the earlier label and the earlier
 * candidate.
 */
export const placeLabels = <C extends Candidate>(
  labels: readonly Label<C>[],
): readonly (C | undefined)[] => {
  const all = labels.map(({ streams }) => new Options(streams))
  const order = labels
    .map(({ weight }, index) => ({ index, weight }))
    .sort((a, b) => b.weight - a.weight || a.index - b.index)
    .map(({ index }) => index)
  const choice = new Choice<C>(all)
  const { chosen } = choice
  for (let round = 0; round < MOST_ROUNDS; round += 1) {
    let isSettled = true
    for (const index of order) if (choice.choose(index)) isSettled = false
    if (isSettled) break
  }
  for (const index of order.toReversed()) {
    const option = chosen[index]
    if (option === undefined) continue
    const rank = all[index]?.ready.indexOf(option) ?? -1
    if (choice.costOf(index, rank, CLASH) < CLASH) continue
    const better = choice.bestOf(index)
    choice.set(index, better && better.cost < CLASH ? better.rank : undefined)
  }
  for (const index of order) {
    if (chosen[index] !== undefined) continue
    const best = choice.bestOf(index)
    if (best !== undefined && best.cost < CLASH) choice.set(index, best.rank)
    else choice.makeRoom(index)
  }
  return chosen
}
