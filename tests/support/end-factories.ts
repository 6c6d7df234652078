import type { End, PieceEnds, Tab } from '#shared/ends/end.schema'

export const squareEnd = (tabs: Tab[] = []): End => ({ kind: 'square', tabs })

/** A plumb cut where the piece rises by `slope` degrees from left to right. */
export const plumbEnd = (slope: number, lay = 0): End => ({
  kind: 'miter',
  plane: { plumb: slope },
  lay,
  legs: [],
  tabs: [],
})

export const lapEnd = (length: number, side: 'under' | 'over' = 'under'): End => ({
  kind: 'lap',
  side,
  length,
  tabs: [],
})

/** A piece that rises to the right: cut plumb at the ridge, tabbed at the eave. */
export const gableEnds = (slope = 26.565, tabs: Tab[] = [{ leg: 2, length: 1 }]): PieceEnds => ({
  left: squareEnd(tabs),
  right: plumbEnd(slope),
  lowEnd: 'left',
})
