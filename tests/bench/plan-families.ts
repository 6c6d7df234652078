import type { Section } from '#shared/bend-plan/plan.schema'
import { hem, section } from '../support/bend-plan-cases'

/** A fixed sequence of numbers from 0 to 1, so that every run plans the same sections. */
const numbers = (seed: number) => () => {
  seed = (seed * 1_103_515_245 + 12_345) % 2 ** 31
  return seed / 2 ** 31
}

type Next = ReturnType<typeof numbers>

const list = <Item>(length: number, item: (index: number) => Item): Item[] =>
  Array.from({ length }, (_, index) => item(index))

/** Lengths on a grid of eighths. */
const eighths = (next: Next, from: number, to: number): number =>
  from + Math.floor(next() * ((to - from) * 8 + 1)) / 8

const pick = (next: Next, from: readonly number[]): number =>
  from[Math.floor(next() * from.length)] ?? 0

const either = (next: Next): number => (next() < 0.5 ? 1 : -1)

/** Turns of the properties' random sections. */
const ANY_TURN = [15, 30, 45, 60, 72, 90, 108, 120, 135]

/** A section of so many bends; hems, where there are any, come on top. */
export type Family = (next: Next, bends: number) => Section

export const FAMILIES = {
  /** Anything: legs to a foot, any turn to any side, hems on two of five edges. */
  random: (next, bends) =>
    section(
      list(bends + 1, () => eighths(next, 0.375, 12)),
      list(bends, () => either(next) * pick(next, ANY_TURN)),
      {
        ...(next() < 0.4 && { A: hem(next() < 0.5 ? 1 : -1) }),
        ...(next() < 0.4 && { B: hem(next() < 0.5 ? 1 : -1) }),
      },
    ),
  /** Ribs: turns in pairs to either side. */
  panel: (next, bends) =>
    section(
      list(bends + 1, () => eighths(next, 1, 3)),
      list(bends, (i) => (Math.floor(i / 2) % 2 === 0 ? 1 : -1) * pick(next, [45, 60, 75, 90])),
    ),
  /** Treads and risers. */
  stairs: (next, bends) =>
    section(
      list(bends + 1, () => eighths(next, 1, 3)),
      list(bends, (i) => (i % 2 === 0 ? 90 : -90)),
    ),
  /** Corrugations. */
  zigzag: (next, bends) =>
    section(
      list(bends + 1, () => eighths(next, 1, 3)),
      list(bends, (i) => (i % 2 === 0 ? 1 : -1) * pick(next, [30, 45, 60, 90, 120])),
    ),
  /** A round in many small bends. */
  arc: (next, bends) =>
    section(
      list(bends + 1, () => eighths(next, 0.75, 2)),
      list(bends, () => Math.min(30, 300 / bends)),
    ),
  /** Small turns to any side: hardly anything meets anything, so that little is ruled out. */
  gentle: (next, bends) =>
    section(
      list(bends + 1, () => eighths(next, 1, 3)),
      list(bends, (i) => (Math.floor(i / 2) % 2 === 0 ? 1 : -1) * pick(next, [15, 25, 35])),
    ),
} as const satisfies Record<string, Family>

export type FamilyName = keyof typeof FAMILIES

export const FAMILY_NAMES: readonly FamilyName[] = [
  'random',
  'panel',
  'stairs',
  'zigzag',
  'arc',
  'gentle',
]

/** So many sections of a family, the same on every run. */
export const sectionsOf = (name: FamilyName, bends: number, count: number): Section[] => {
  const next = numbers(bends * 100 + FAMILY_NAMES.indexOf(name))
  // The first numbers of neighboring seeds are alike.
  for (let i = 0; i < 10; i++) next()
  return list(count, () => FAMILIES[name](next, bends))
}
