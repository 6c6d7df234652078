import type { Bounds } from '#shared/geometry/bounds'
import { grow, overlap } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import { distanceToBox, findCrossing } from '#shared/geometry/segment'

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

/** Room kept around text. */
const TEXT_GAP = 2

/** What a line across another line costs. */
const CROSSING = 4

const CLASH = 10_000

const MOST_ROUNDS = 8

const clashes = (a: Candidate, b: Candidate): boolean =>
  a.boxes.some((box) => {
    const kept = grow(box, TEXT_GAP)
    return (
      b.boxes.some((other) => overlap(kept, other)) ||
      b.lines.some((line) => distanceToBox(line, kept) === 0)
    )
  }) ||
  b.boxes.some((box) => {
    const kept = grow(box, TEXT_GAP)
    return a.lines.some((line) => distanceToBox(line, kept) === 0)
  })

const crossings = (a: Candidate, b: Candidate): number => {
  let count = 0
  for (const line of a.lines) {
    for (const other of b.lines) if (findCrossing(line, other) !== undefined) count += 1
  }
  return count
}

const costTogether = (a: Candidate, b: Candidate): number =>
  clashes(a, b) ? CLASH : CROSSING * crossings(a, b)

const costAmong = <C extends Candidate>(
  candidate: C,
  chosen: readonly (C | undefined)[],
  self: number,
  limit: number,
): number => {
  let cost = candidate.cost
  for (let index = 0; index < chosen.length && cost < limit; index += 1) {
    const other = chosen[index]
    if (index !== self && other !== undefined) cost += costTogether(candidate, other)
  }
  return cost
}

const bestAmong = <C extends Candidate>(
  label: Label<C>,
  chosen: readonly (C | undefined)[],
  self: number,
): { readonly candidate: C; readonly cost: number } | undefined => {
  let best: { candidate: C; cost: number } | undefined
  for (const candidate of label.candidates) {
    const limit = best?.cost ?? Infinity
    if (candidate.cost >= limit) continue
    const cost = costAmong(candidate, chosen, self, limit)
    if (cost < limit) best = { candidate, cost }
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
    .map((label, index) => ({ label, index }))
    .sort(
      (a, b) =>
        b.label.weight - a.label.weight ||
        a.label.candidates.length - b.label.candidates.length ||
        a.index - b.index,
    )
  const chosen: (C | undefined)[] = labels.map(() => undefined)
  for (let round = 0; round < MOST_ROUNDS; round += 1) {
    let changed = false
    for (const { label, index } of order) {
      const best = bestAmong(label, chosen, index)?.candidate
      if (best !== chosen[index]) changed = true
      chosen[index] = best
    }
    if (!changed) break
  }
  for (const { label, index } of order.toReversed()) {
    const candidate = chosen[index]
    if (candidate === undefined) continue
    if (costAmong(candidate, chosen, index, CLASH) < CLASH) continue
    const better = bestAmong(label, chosen, index)
    chosen[index] = better !== undefined && better.cost < CLASH ? better.candidate : undefined
  }
  for (const { label, index } of order) {
    if (chosen[index] !== undefined) continue
    const best = bestAmong(label, chosen, index)
    if (best !== undefined && best.cost < CLASH) chosen[index] = best.candidate
  }
  return chosen
}
