import { useRef, type Dispatch, type PointerEvent } from 'react'
import type { Part, Point } from '#shared/drawing/display-list'
import type { Board, BoardEvent, SnapSettings } from '../model/board'
import { cornersOf } from '../model/board-document'
import { panBy, toSheet, zoomAbout, type Viewport } from '../model/viewport'
import { findCorner } from './sheet-view'

interface Options {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly viewport: Viewport
  /** Keeps the view where it is from now on, until the drawing is changed from outside. */
  readonly holdView: (view: Viewport) => void
  readonly findPart: (at: Point, reach: number) => Part | undefined
  readonly snap: SnapSettings
}

/** How near a press must be, in pixels: half of the smallest target on the roof. */
const CORNER_REACH = 24
const PART_REACH = 18

/** What the fingers on the sheet are doing, besides the board's own gestures. */
type Fingers =
  | { readonly kind: 'none' }
  | { readonly kind: 'gesture'; readonly pointer: number }
  | {
      readonly kind: 'pan'
      readonly pointer: number
      readonly last: Point
      readonly moved: boolean
    }
  | { readonly kind: 'pinch'; readonly points: ReadonlyMap<number, Point> }

const middle = ([a, b]: readonly Point[]): Point => ({
  x: ((a?.x ?? 0) + (b?.x ?? 0)) / 2,
  y: ((a?.y ?? 0) + (b?.y ?? 0)) / 2,
})
const spread = ([a, b]: readonly Point[]): number =>
  Math.hypot((a?.x ?? 0) - (b?.x ?? 0), (a?.y ?? 0) - (b?.y ?? 0))

/**
 * Turns presses on the canvas into events of the board, and two fingers into zoom and pan. A
 * second finger cancels what the first had begun.
 */
export function useSheetPointers({ board, dispatch, viewport, holdView, findPart, snap }: Options) {
  const fingers = useRef<Fingers>({ kind: 'none' })
  const lastPoints = useRef(new Map<number, Point>())

  const place = (event: PointerEvent<HTMLElement>): Point => {
    const box = event.currentTarget.getBoundingClientRect()
    return { x: event.clientX - box.left, y: event.clientY - box.top }
  }
  const withSnap = (event: PointerEvent): SnapSettings => ({
    ...snap,
    on: snap.on && !event.altKey,
  })

  function onPointerDown(event: PointerEvent<HTMLElement>) {
    if (event.pointerType === 'mouse' && event.button !== 0) return
    event.currentTarget.setPointerCapture(event.pointerId)
    const at = place(event)
    lastPoints.current.set(event.pointerId, at)
    if (lastPoints.current.size > 1) {
      dispatch({ type: 'cancel' })
      holdView(viewport)
      fingers.current = { kind: 'pinch', points: new Map(lastPoints.current) }
      return
    }
    const corner = findCorner(cornersOf(board.history.present), viewport, at, CORNER_REACH)
    const isDrawing = board.tool === 'draw' && board.history.present.profile === null
    if (corner !== null && !isDrawing) {
      holdView(viewport)
      fingers.current = { kind: 'gesture', pointer: event.pointerId }
      dispatch({ type: 'pressCorner', index: corner, at: toSheet(viewport, at) })
      return
    }
    if (board.tool === 'draw') {
      holdView(viewport)
      fingers.current = { kind: 'gesture', pointer: event.pointerId }
      dispatch({ type: 'pressSheet', at: toSheet(viewport, at), snap: withSnap(event) })
      return
    }
    fingers.current = { kind: 'pan', pointer: event.pointerId, last: at, moved: false }
  }

  function onPointerMove(event: PointerEvent<HTMLElement>) {
    if (!lastPoints.current.has(event.pointerId)) return
    const at = place(event)
    lastPoints.current.set(event.pointerId, at)
    const now = fingers.current
    if (now.kind === 'gesture' && now.pointer === event.pointerId) {
      dispatch({ type: 'move', at: toSheet(viewport, at), snap: withSnap(event) })
    } else if (now.kind === 'pan' && now.pointer === event.pointerId) {
      const [dx, dy] = [at.x - now.last.x, at.y - now.last.y]
      // A finger never rests quite still: a small slip is a press, not a pan.
      if (!now.moved && Math.hypot(dx, dy) < 6) return
      holdView(panBy(viewport, dx, dy))
      fingers.current = { ...now, last: at, moved: true }
    } else if (now.kind === 'pinch' && now.points.has(event.pointerId)) {
      const before = [...now.points.values()]
      const after = [...now.points].map(([id, point]) => (id === event.pointerId ? at : point))
      const zoomed = zoomAbout(
        viewport,
        middle(before),
        spread(after) / Math.max(spread(before), 1),
      )
      holdView(
        panBy(zoomed, middle(after).x - middle(before).x, middle(after).y - middle(before).y),
      )
      fingers.current = { kind: 'pinch', points: new Map(now.points).set(event.pointerId, at) }
    }
  }

  function onPointerUp(event: PointerEvent<HTMLElement>) {
    const at = place(event)
    const now = fingers.current
    lastPoints.current.delete(event.pointerId)
    if (now.kind === 'gesture' && now.pointer === event.pointerId) dispatch({ type: 'lift' })
    if (now.kind === 'pan' && now.pointer === event.pointerId && !now.moved) {
      dispatch({ type: 'select', part: findPart(at, PART_REACH) ?? null })
    }
    // After a pinch the finger that stays down does nothing more.
    if (now.kind !== 'pinch' || lastPoints.current.size === 0) fingers.current = { kind: 'none' }
  }

  function onPointerCancel(event: PointerEvent<HTMLElement>) {
    lastPoints.current.delete(event.pointerId)
    fingers.current = { kind: 'none' }
    dispatch({ type: 'cancel' })
  }

  return { onPointerDown, onPointerMove, onPointerUp, onPointerCancel }
}
