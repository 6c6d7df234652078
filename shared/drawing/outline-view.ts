import type { StripLayout, StripPoint } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Inches } from '#shared/units/brands'
import type { Point } from './display-list'

/** A stretch of the strip as it is shown: what lies between two windows is broken out. */
export interface StripWindow {
  readonly from: Inches
  readonly to: Inches
  /** Where `from` lies in the frame. */
  readonly x: number
}

/** How the strip lies in the frame: along it to the right, edge A below, edge B above. */
export interface OutlineView {
  /** Pixels an inch, both ways. */
  readonly scale: number
  readonly windows: readonly StripWindow[]
  /** Edge A and edge B in the frame. */
  readonly yA: number
  readonly yB: number
  readonly text: number
}

/** Free room around the strip in pixels. */
export interface Room {
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
}

export interface Frame {
  readonly width: number
  readonly height: number
}

/** The smallest share of the frame that the strip is drawn in, whatever stands around it. */
const LEAST_SHARE = 0.3

const spaceFor = (frame: number, before: number, after: number): number =>
  Math.max(frame - before - after, frame * LEAST_SHARE)

/** Where a space begins when its rooms had to give way. */
const beginOf = (frame: number, before: number, after: number, space: number): number => {
  const rest = frame - space
  const wanted = before + after
  return wanted === 0 ? rest / 2 : (rest * before) / wanted
}

/** How far an end's work reaches into the blank. Inches from its square end. */
export const depthOfEnd = (layout: StripLayout, side: Side): Inches => {
  const end = layout[side]
  const inward = (point: StripPoint): Inches =>
    side === 'left' ? point.along : layout.blankLength - point.along
  return Math.max(
    0,
    ...end.marks.map((mark) => mark.along),
    ...end.openings.map((opening) => opening.length),
    ...[
      ...end.cutAways.flat(),
      ...end.tabs.flatMap((tab) => tab.polygon),
      ...end.slits.flatMap((slit) => [slit.from, slit.to]),
    ].map(inward),
  )
}

const view = (
  layout: StripLayout,
  frame: Frame,
  room: Room,
  text: number,
  scale: number,
  windowsAt: (x: number, width: number) => StripWindow[],
): OutlineView => {
  const across = spaceFor(frame.width, room.left, room.right)
  const down = spaceFor(frame.height, room.top, room.bottom)
  const tall = layout.stripWidth * scale
  const yB = beginOf(frame.height, room.top, room.bottom, down) + (down - tall) / 2
  return {
    scale,
    text,
    windows: windowsAt(beginOf(frame.width, room.left, room.right, across), across),
    yB,
    yA: yB + tall,
  }
}

/** How much of the strip is kept beside an end's work, in strip widths. */
const STUB = 0.5

/** The free room in a break, in parts of the type size; at most a quarter of the width. */
const BREAK = 2.4

/** The whole strip, to scale both ways; a long one is broken in its plain middle. */
export const wholeView = (
  layout: StripLayout,
  frame: Frame,
  room: Room,
  text: number,
): OutlineView => {
  const { blankLength, stripWidth } = layout
  const across = spaceFor(frame.width, room.left, room.right)
  const down = spaceFor(frame.height, room.top, room.bottom)
  const byWidth = down / stripWidth
  const left = depthOfEnd(layout, 'left') + STUB * stripWidth
  const right = depthOfEnd(layout, 'right') + STUB * stripWidth
  const gap = Math.min(BREAK * text, across / 4)
  const broken = Math.min(byWidth, (across - gap) / (left + right))
  const whole = Math.min(byWidth, across / blankLength)
  if (whole >= broken || left + right >= blankLength) {
    return view(layout, frame, room, text, whole, (x, width) => [
      { from: 0, to: blankLength, x: x + (width - blankLength * whole) / 2 },
    ])
  }
  const shown = Math.min((across - gap) / broken, MOST_SHOWN * blankLength)
  const more = Math.max(0, shown - left - right) / 2
  const drawn = (left + right + 2 * more) * broken + gap
  return view(layout, frame, room, text, broken, (x, width) => {
    const begin = x + (width - drawn) / 2
    return [
      { from: 0, to: left + more, x: begin },
      {
        from: blankLength - right - more,
        to: blankLength,
        x: begin + (left + more) * broken + gap,
      },
    ]
  })
}

/** Of a broken strip at most this much is shown. */
const MOST_SHOWN = 0.95

/** No end is drawn longer than its work and this many strip widths. */
const LONGEST_STUB = 0.75

/** One end, to scale both ways. */
export const endView = (
  layout: StripLayout,
  side: Side,
  frame: Frame,
  room: Room,
  text: number,
): OutlineView => {
  const { blankLength, stripWidth } = layout
  const across = spaceFor(frame.width, room.left, room.right)
  const down = spaceFor(frame.height, room.top, room.bottom)
  const depth = depthOfEnd(layout, side)
  const least = Math.min(blankLength, depth + STUB * stripWidth)
  const scale = Math.min(down / stripWidth, across / least)
  const shown = Math.min(blankLength, depth + LONGEST_STUB * stripWidth, across / scale)
  return view(layout, frame, room, text, scale, (x, width) => {
    const begin = x + (width - shown * scale) / 2
    return side === 'left'
      ? [{ from: 0, to: shown, x: begin }]
      : [{ from: blankLength - shown, to: blankLength, x: begin }]
  })
}

export const xIn = (view: OutlineView, window: StripWindow, along: Inches): number =>
  window.x + (along - window.from) * view.scale

export const yOf = (view: OutlineView, at: Inches): number => view.yA - at * view.scale

/** The frame's point of a place in a window of the strip. */
export const toFrame = (view: OutlineView, window: StripWindow, point: StripPoint): Point => ({
  x: xIn(view, window, point.along),
  y: yOf(view, point.at),
})

/** The window that shows an end. */
export const windowOf = (view: OutlineView, side: Side): StripWindow => {
  const window = side === 'left' ? view.windows[0] : view.windows.at(-1)
  if (window === undefined) throw new RangeError('A view without a window shows nothing.')
  return window
}
