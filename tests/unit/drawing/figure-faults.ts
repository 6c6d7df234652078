import type { DisplayItem, DisplayList, PathShape, Role } from '#shared/drawing/display-list'
import { boxOfText } from '#shared/drawing/text-box'
import type { Bounds } from '#shared/geometry/bounds'
import { boundsOf, boxAround, grow, heightOf, holds, overlap } from '#shared/geometry/bounds'
import { segmentsOf } from '#shared/geometry/polyline'
import { distanceBetween, distanceToBox, meetsBox } from '#shared/geometry/segment'

const METAL: readonly Role[] = ['metal', 'paint', 'paintEdge', 'bare']

/** The box that an item fills, strokes included. */
export const extentOf = (item: DisplayItem): Bounds => {
  switch (item.kind) {
    case 'path':
      return grow(boundsOf(item.points), item.width / 2)
    case 'circle':
      return boxAround(item.center, 2 * item.radius + item.width, 2 * item.radius + item.width)
    case 'text':
      return boxOfText(item)
  }
}

const isPath = (item: DisplayItem): item is PathShape => item.kind === 'path'

/** Boxes that must stay free: texts, and the circles around the letters of the edges. */
const labelBoxes = (display: DisplayList): { name: string; box: Bounds }[] =>
  display.items.flatMap((item, index) => {
    const isLettered = display.items[index - 1]?.kind === 'circle'
    if (item.kind === 'text' && !isLettered) return [{ name: item.text, box: boxOfText(item) }]
    return item.kind === 'circle' ? [{ name: 'letter', box: extentOf(item) }] : []
  })

const textBoxes = (display: DisplayList): { name: string; box: Bounds }[] =>
  display.items.flatMap((item) =>
    item.kind === 'text' ? [{ name: item.text, box: boxOfText(item) }] : [],
  )

const stack = (display: DisplayList, roles: readonly Role[]) =>
  display.items
    .filter(isPath)
    .filter((item) => roles.includes(item.role))
    .flatMap((item) => segmentsOf(item.points).map((line) => ({ line, half: item.width / 2 })))

/** Everything that look and feel forbids, in words; empty when the drawing is sound. */
export const figureFaults = (display: DisplayList): string[] => {
  const faults: string[] = []
  const labels = labelBoxes(display)
  labels.forEach((a, index) => {
    for (const b of labels.slice(index + 1)) {
      if (overlap(a.box, b.box)) faults.push(`${a.name} lies on ${b.name}`)
      const gap = Math.max(a.box.minX - b.box.maxX, b.box.minX - a.box.maxX)
      const isOneLine = a.box.minY < b.box.maxY && b.box.minY < a.box.maxY
      if (isOneLine && gap >= 0 && gap < heightOf(a.box)) {
        faults.push(`${a.name} reads together with ${b.name}`)
      }
    }
  })
  const metal = stack(display, METAL)
  for (const { name, box } of labels) {
    if (metal.some(({ line, half }) => distanceToBox(line, box) < half)) {
      faults.push(`${name} touches the metal`)
    }
  }
  const leads = stack(display, ['dimension', 'edge'])
  for (const { name, box } of textBoxes(display)) {
    if (leads.some(({ line }) => meetsBox(line, grow(box, -0.01)))) {
      faults.push(`${name} lies on a line`)
    }
  }
  for (const dimension of stack(display, ['dimension'])) {
    if (metal.some(({ line, half }) => distanceBetween(line, dimension.line) < half)) {
      faults.push('a dimension line touches the metal')
    }
  }
  const frame = { minX: 0, minY: 0, maxX: display.width, maxY: display.height }
  for (const item of display.items) {
    if (!holds(frame, extentOf(item))) faults.push(`${item.role} ${item.kind} leaves the frame`)
  }
  return faults
}
