import { useState } from 'react'
import { findStarterRefusal, type Starter, type StarterParameters } from '#shared/profile/starters'
import type { StarterParameterKey } from '#shared/profile/starters/starter'

type Entered = Readonly<Partial<Record<StarterParameterKey, number | null>>>

export interface StarterValues {
  /** As entered; null while what stands there cannot be read. */
  readonly valueOf: (key: StarterParameterKey) => number | null
  readonly enter: (key: StarterParameterKey, value: number | null) => void
  /** What the figure shows: the last values that can be taken, all together. */
  readonly taken: StarterParameters
  /** True while what is entered is what is taken. */
  readonly isSound: boolean
}

/** The parameters of a starter as a person sets them, beginning with their defaults. */
export function useStarterValues(starter: Starter): StarterValues {
  const [entered, setEntered] = useState<Entered>({})
  const [taken, setTaken] = useState<StarterParameters>({})
  const [isSound, setIsSound] = useState(true)

  function enter(key: StarterParameterKey, value: number | null) {
    const next: Entered = { ...entered, [key]: value }
    setEntered(next)
    const sound = soundValues(starter, next)
    setIsSound(sound !== null)
    if (sound) setTaken(sound)
  }

  const valueOf = (key: StarterParameterKey): number | null => {
    const value = entered[key]
    if (value !== undefined) return value
    return starter.parameters.find((known) => known.key === key)?.default ?? null
  }
  return { valueOf, enter, taken, isSound }
}

/** Null as soon as one of them cannot be taken. */
export function soundValues({ parameters }: Starter, entered: Entered): StarterParameters | null {
  const given: Partial<Record<StarterParameterKey, number>> = {}
  for (const parameter of parameters) {
    const value = entered[parameter.key]
    if (value === undefined) continue
    if (value === null || findStarterRefusal(parameter, value)) return null
    given[parameter.key] = value
  }
  return given
}
