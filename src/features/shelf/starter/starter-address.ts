import { findStarterRefusal, type Starter, type StarterParameters } from '#shared/profile/starters'

/**
 * What is set of a starter as it stands in the board's address, `wallHeight:8,apronWidth:6`;
 * undefined where all has its default.
 */
export function printParameters(
  { parameters }: Starter,
  given: StarterParameters,
): string | undefined {
  const set = parameters.flatMap(({ key, default: usual }) => {
    const value = given[key]
    return value === undefined || value === usual ? [] : [`${key}:${value}`]
  })
  return set.length === 0 ? undefined : set.join(',')
}

/** Null for a parameter that the starter does not have, and for a value that it cannot take. */
export function parseParameters({ parameters }: Starter, text: string): StarterParameters | null {
  const given: Record<string, number> = {}
  for (const part of text.split(',')) {
    const [key, value] = part.split(':')
    const parameter = parameters.find((known) => known.key === key)
    const number = value === undefined || value.trim() === '' ? NaN : Number(value)
    if (!parameter || findStarterRefusal(parameter, number)) return null
    given[parameter.key] = number
  }
  return given
}
