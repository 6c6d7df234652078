import type { Part } from '#shared/drawing/display-list'
import { degrees, subtract, type Vector } from '#shared/geometry/vector'
import type { Degrees, Inches } from '#shared/units/brands'
import { addCorner, cornersOf, moveCorner, type BoardDocument, type Edge } from './board-document'
import { amend, record, startHistory, undo, redo, type History } from './history'
import { snapCorner, type Neighbor, type SnapGuide } from './snapping'

/** What a press on the empty sheet does: take hold of things, or put down the next corner. */
export type Tool = 'select' | 'draw'

export type Gesture =
  | { readonly kind: 'idle' }
  | {
      readonly kind: 'corner'
      readonly index: number
      /** From the pointer to the corner when it was taken: the corner never jumps to the finger. */
      readonly grip: Vector
      readonly pending: BoardDocument
      readonly guides: readonly SnapGuide[]
    }
  | {
      readonly kind: 'draw'
      readonly edge: Edge
      readonly pending: BoardDocument
      readonly guides: readonly SnapGuide[]
    }

export interface Board {
  readonly history: History<BoardDocument>
  readonly selection: Part | null
  readonly tool: Tool
  readonly gesture: Gesture
  /** The number being typed: its keystrokes are one step of undo together. */
  readonly typing: string | null
}

export interface SnapSettings {
  readonly on: boolean
  readonly step: Inches
  readonly angleStep: Degrees
  /** The job's slope in degrees, where there is a job. */
  readonly pitch: Degrees | null
  readonly reach: Inches
}

export type BoardEvent =
  | { readonly type: 'pressCorner'; readonly index: number; readonly at: Vector }
  | { readonly type: 'pressSheet'; readonly at: Vector; readonly snap: SnapSettings }
  | { readonly type: 'move'; readonly at: Vector; readonly snap: SnapSettings }
  | { readonly type: 'lift' }
  | { readonly type: 'cancel' }
  | { readonly type: 'select'; readonly part: Part | null }
  | { readonly type: 'tool'; readonly tool: Tool }
  /**
   * A finished change: one step of undo. Changes in a row with the same `typing` are keystrokes of
   * one number and make one step.
   */
  | {
      readonly type: 'change'
      readonly document: BoardDocument
      readonly selection?: Part | null
      readonly typing?: string
    }
  | { readonly type: 'undo' }
  | { readonly type: 'redo' }

const IDLE: Gesture = { kind: 'idle' }

export const startBoard = (document: BoardDocument): Board => ({
  history: startHistory(document),
  selection: document.profile === null ? null : { kind: 'leg', leg: 1 },
  tool: document.profile === null ? 'draw' : 'select',
  gesture: IDLE,
  typing: null,
})

/** What is to be seen now: the gesture's half-finished figure, or the document. */
export const shownDocument = ({ gesture, history }: Board): BoardDocument =>
  gesture.kind === 'idle' ? history.present : gesture.pending

/**
 * The drawing board as a state machine: (board, event) -> board. A gesture works on a pending
 * copy; lifting records it as one step, cancelling drops it.
 */
export function nextBoard(board: Board, event: BoardEvent): Board {
  const next = step(board, event)
  const typing = event.type === 'change' ? (event.typing ?? null) : null
  return next.typing === typing ? next : { ...next, typing }
}

function step(board: Board, event: BoardEvent): Board {
  const { history } = board
  switch (event.type) {
    case 'pressCorner': {
      const corner = cornersOf(history.present)[event.index]
      if (corner === undefined || board.gesture.kind !== 'idle') return board
      return {
        ...board,
        selection: partOfCorner(history.present, event.index),
        gesture: {
          kind: 'corner',
          index: event.index,
          grip: subtract(corner, event.at),
          pending: history.present,
          guides: [],
        },
      }
    }
    case 'pressSheet': {
      if (board.gesture.kind !== 'idle') return board
      if (board.tool === 'select') return { ...board, selection: null }
      const edge = edgeToDraw(board)
      return { ...board, gesture: drawTo(history.present, edge, event.at, event.snap) }
    }
    case 'move': {
      const { gesture } = board
      if (gesture.kind === 'idle') return board
      if (gesture.kind === 'draw') {
        return { ...board, gesture: drawTo(history.present, gesture.edge, event.at, event.snap) }
      }
      const wanted = { x: event.at.x + gesture.grip.x, y: event.at.y + gesture.grip.y }
      const { point, guides } = snapTo(history.present, gesture.index, wanted, event.snap)
      return {
        ...board,
        gesture: { ...gesture, pending: moveCorner(history.present, gesture.index, point), guides },
      }
    }
    case 'lift': {
      const { gesture } = board
      if (gesture.kind === 'idle') return board
      return {
        ...board,
        history: record(history, gesture.pending),
        selection:
          gesture.kind === 'draw' ? partDrawn(gesture.pending, gesture.edge) : board.selection,
        gesture: IDLE,
      }
    }
    case 'cancel':
      return board.gesture.kind === 'idle' ? board : { ...board, gesture: IDLE }
    case 'select':
      return { ...board, selection: event.part }
    case 'tool':
      return { ...board, tool: event.tool, gesture: IDLE }
    case 'change':
      return settle({
        ...board,
        history:
          event.typing !== undefined && event.typing === board.typing
            ? amend(history, event.document)
            : record(history, event.document),
        selection: event.selection === undefined ? board.selection : event.selection,
        gesture: IDLE,
      })
    case 'undo':
      return settle({ ...board, history: undo(history), gesture: IDLE })
    case 'redo':
      return settle({ ...board, history: redo(history), gesture: IDLE })
  }
}

/** A selection never names a part that is no longer there. */
function settle(board: Board): Board {
  const { profile } = board.history.present
  const { selection } = board
  if (profile === null) return { ...board, selection: null, tool: 'draw' }
  if (selection === null) return board
  const there =
    selection.kind === 'leg'
      ? selection.leg <= profile.legs.length
      : selection.kind === 'bend'
        ? selection.bend <= profile.bends.length
        : selection.kind === 'hem'
          ? (selection.edge === 'A' ? profile.hemA : profile.hemB) !== null
          : true
  return there ? board : { ...board, selection: { kind: 'leg', leg: profile.legs.length } }
}

/** A new leg leaves edge B, unless edge A was taken hold of. */
const edgeToDraw = ({ selection }: Board): Edge =>
  selection?.kind === 'edge' && selection.edge === 'A' ? 'A' : 'B'

function drawTo(document: BoardDocument, edge: Edge, at: Vector, snap: SnapSettings): Gesture {
  const added = addCorner(document, edge, at)
  const index = edge === 'A' ? 0 : cornersOf(added).length - 1
  const { point, guides } = snapTo(added, index, at, snap)
  return { kind: 'draw', edge, pending: moveCorner(added, index, point), guides }
}

function snapTo(document: BoardDocument, index: number, at: Vector, snap: SnapSettings) {
  if (!snap.on) return { point: at, guides: [] }
  const corners = cornersOf(document)
  if (corners.length < 2) {
    const onStep = (value: number) => Math.round(value / snap.step) * snap.step
    return { point: { x: onStep(at.x), y: onStep(at.y) }, guides: [] }
  }
  const legs = document.profile?.legs ?? []
  return snapCorner(at, neighborsOf(corners, index), {
    step: snap.step,
    angleStep: snap.angleStep,
    pitch: snap.pitch,
    otherLegs: legs.filter((_, leg) => leg !== index && leg !== index - 1),
    reach: snap.reach,
  })
}

/** The corners beside one, each with the heading of the leg behind it. */
function neighborsOf(corners: readonly Vector[], index: number): Neighbor[] {
  const headingBetween = (from?: Vector, to?: Vector): Degrees | null =>
    from === undefined || to === undefined
      ? null
      : degrees(Math.atan2(to.y - from.y, to.x - from.x))
  const before = corners[index - 1]
  const after = corners[index + 1]
  return [
    ...(before === undefined
      ? []
      : [{ corner: before, legHeading: headingBetween(corners[index - 2], before) }]),
    ...(after === undefined
      ? []
      : [{ corner: after, legHeading: headingBetween(corners[index + 2], after) }]),
  ]
}

/** Corner 0 is edge A, the last one edge B, those between are the bends. */
export function partOfCorner(document: BoardDocument, index: number): Part {
  const last = cornersOf(document).length - 1
  if (index === 0) return { kind: 'edge', edge: 'A' }
  if (index === last) return { kind: 'edge', edge: 'B' }
  return { kind: 'bend', bend: index }
}

/** After drawing, the edge stays in hand, so that the next press goes on from it. */
const partDrawn = (document: BoardDocument, edge: Edge): Part | null =>
  document.profile === null ? null : { kind: 'edge', edge }
