import { useMemo, useState } from 'react'
import type { ClosedEnds } from '#shared/ends/close-ends'
import type { EndOfPiece } from '#shared/ends/folded-end'
import {
  closingWith,
  likeliest,
  neighborsOf,
  type EndedLine,
  type Neighbor,
} from './model/neighbors'

export interface Met {
  /** Every end that could meet this one. */
  readonly neighbors: readonly Neighbor[]
  readonly met: Neighbor | null
  /** How it closes with the one that it meets. */
  readonly closed: ClosedEnds | null
  readonly choose: (id: string) => void
}

/** Which end meets this one: the one that was chosen, until then the one that closes best. */
export function useNeighbor(own: EndOfPiece | null, lines: readonly EndedLine[]): Met {
  const [chosen, setChosen] = useState<string | null>(null)
  return useMemo(() => {
    if (own?.end.kind !== 'miter')
      return { neighbors: [], met: null, closed: null, choose: setChosen }
    const neighbors = neighborsOf(own.side, lines)
    const met =
      chosen === ''
        ? null
        : (neighbors.find(({ id }) => id === chosen) ?? likeliest(own, neighbors))
    return { neighbors, met, closed: met && closingWith(own, met), choose: setChosen }
  }, [own, lines, chosen])
}
