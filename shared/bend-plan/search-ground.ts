import type { Feasibility } from './feasibility'
import type { FoldGround } from './fold-setup'
import type { OperationCost } from './operation-cost'

/** What the searches share: the piece, its tests, its costs, the bound, the limit. */
export interface SearchGround extends FoldGround {
  readonly feasibility: Feasibility
  readonly cost: OperationCost
  /** Packed lower bound on the bends of a set made before (or, mirrored in time, after) an orientation. */
  readonly lowerBound: (bits: number, orientation: number) => number
  /** Folds a search may look at. */
  readonly nodes: number
  /** Asked before each of them; true ends the search. */
  readonly isOver: () => boolean
}

/** One operation of a sequence, by index of the bend and number of the orientation. */
export interface Operation {
  readonly bend: number
  readonly orientation: number
}
