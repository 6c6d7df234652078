import { useMemo } from 'react'
import type { Run } from '#shared/runs/runs.contract'
import { picturesOfRun } from '../step-pictures'
import { BendStep } from './BendStep'
import { StripCard } from './StripCard'

interface Props {
  readonly run: Run
  /** 0 is the strip, then one card a hit. */
  readonly card: number
}

/** The bend card of a run, one thing a screen: first the strip, then every hit in its order. */
export function RunCards({ run, card }: Props) {
  const pictures = useMemo(() => picturesOfRun(run), [run])
  const step = run.plan.steps[card - 1]
  const picture = pictures[card - 1]
  return step && picture ? (
    <BendStep key={card} run={run} step={step} picture={picture} number={card} />
  ) : (
    <StripCard run={run} />
  )
}
