import type { Bundle } from '#shared/bundles/bundles.contract'

/** One place on the rack: what of the order lies there, and how many bundles of others. */
export interface PlanPlace {
  readonly name: string
  /** By the shop's habit of naming: F and a number is a spot on the floor. Common practice, no source. */
  readonly onFloor: boolean
  readonly bundles: readonly Bundle[]
  readonly others: number
}

const parts = (name: string): [string, number] => [
  name.replace(/[0-9]/g, ''),
  Number(name.replace(/[^0-9]/g, '')),
]

/** Bays before the floor, then by letter and number: R2 before R10. */
function byPlace(one: PlanPlace, other: PlanPlace): number {
  const [letters, number] = parts(one.name)
  const [otherLetters, otherNumber] = parts(other.name)
  return (
    Number(one.onFloor) - Number(other.onFloor) ||
    letters.localeCompare(otherLetters) ||
    number - otherNumber
  )
}

/**
 * The places in use, from what lies on the rack: `mine` are the bundles of the order looked at,
 * `rack` all that lie there. A place without a bundle is not known and not shown.
 */
export function rackPlan(mine: readonly Bundle[], rack: readonly Bundle[]): PlanPlace[] {
  const own = new Set(mine.map(({ code }) => code))
  const others = rack.filter(({ code }) => !own.has(code))
  const names = new Set([...mine, ...others].map(({ rackPlace }) => rackPlace))
  return [...names]
    .map((name) => ({
      name,
      onFloor: /^F[0-9]/.test(name),
      bundles: mine.filter(({ rackPlace }) => rackPlace === name),
      others: others.filter(({ rackPlace }) => rackPlace === name).length,
    }))
    .sort(byPlace)
}
