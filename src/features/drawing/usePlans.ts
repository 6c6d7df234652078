import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useDeferredValue, useEffect, useMemo, useState } from 'react'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import { planQuery } from '@/features/plans/api/plans.queries'
import { newKey } from '@/lib/api/idempotency'
import { usePlanProgress } from '@/lib/live/plan-progress'
import {
  checkDrawing,
  planOnBrakes,
  type CheckedPlan,
  type DrawingCheck,
} from './check/check-drawing'

/** How long a drawing rests before the server is asked to confirm it, milliseconds. */
const REST = 600

/** No explanations, and a search that ends early: the answer of a moment, worked out in a frame. */
const WHILE_DRAGGING = { explain: false, nodes: 4000 } as const

export interface Answer {
  readonly check: DrawingCheck | null
  readonly plans: readonly CheckedPlan[]
  /** The server has worked out the same drawing and these are its plans. */
  readonly confirmed: boolean
  /** Folds the server has looked at so far, while a plan takes long; otherwise null. */
  readonly lookedAt: number | null
}

/**
 * The figures of a drawing: worked out here with the server's own code as fast as it is drawn, and
 * confirmed by the server when the drawing rests.
 */
export function useAnswer(
  profile: Profile | null,
  stock: Stock,
  pieceLength: Inches,
  brakes: readonly ShopBrake[],
): Answer {
  const check = useMemo(
    () => (profile === null ? null : checkDrawing(profile, stock, pieceLength)),
    [profile, stock, pieceLength],
  )
  const makeable = check?.strip ? profile : null
  const deferred = useDeferredValue(makeable)
  const own = useMemo(
    () =>
      deferred === null ? [] : planOnBrakes(deferred, stock, pieceLength, brakes, WHILE_DRAGGING),
    [deferred, stock, pieceLength, brakes],
  )

  const rested = useRested(makeable, REST)
  const [progressKey] = useState(newKey)
  const progress = usePlanProgress(progressKey)
  const server = useQuery({
    ...planQuery({ profile: rested ?? EMPTY, stockId: stock.id, pieceLength }, progressKey),
    enabled: rested !== null,
    placeholderData: keepPreviousData,
    retry: false,
  })
  const confirmed =
    rested !== null && rested === makeable && server.isSuccess && !server.isPlaceholderData
  // Without signal the reasons and cures are worked out here, once the drawing rests.
  const alone = server.isError && rested === makeable ? rested : null
  const explained = useMemo(
    () => (alone === null ? null : planOnBrakes(alone, stock, pieceLength, brakes)),
    [alone, stock, pieceLength, brakes],
  )
  const plans = makeable === null ? [] : confirmed ? server.data.brakes : (explained ?? own)
  return { check, plans, confirmed, lookedAt: confirmed ? null : (progress?.nodes ?? null) }
}

const EMPTY: Profile = {
  version: 1,
  legs: [1],
  bends: [],
  hemA: null,
  hemB: null,
  colorSide: 'none',
}

/** The value once it has not changed for a while. */
function useRested<Value>(value: Value, milliseconds: number): Value {
  const [rested, setRested] = useState(value)
  useEffect(() => {
    const timer = setTimeout(() => setRested(value), milliseconds)
    return () => clearTimeout(timer)
  }, [value, milliseconds])
  return rested
}
