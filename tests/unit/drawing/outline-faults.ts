import type { DisplayItem, DisplayList, PathShape, Role } from '#shared/drawing/display-list'
import { boxOfText } from '#shared/drawing/text-box'
import type { Bounds } from '#shared/geometry/bounds'
import { grow, holds, overlap } from '#shared/geometry/bounds'
import { segmentsOf } from '#shared/geometry/polyline'
import { meetsBox } from '#shared/geometry/segment'
import { extentOf } from './figure-faults'

/** What is drawn of the strip itself. */
const STRIP: readonly Role[] = [
  'outline',
  'crease',
  'cutAway',
  'slit',
  'tabFold',
  'tabHatch',
  'hemHatch',
  'opening',
  'ghost',
]

const isPath = (item: DisplayItem): item is PathShape => item.kind === 'path'

/** Texts, and the circles round the letters of the edges in place of their letters. */
const labelBoxes = ({ items }: DisplayList): { name: string; box: Bounds }[] =>
  items.flatMap((item, index) => {
    const before = items[index - 1]
    const isLettered = before?.kind === 'circle' && before.role === 'edge'
    if (item.kind === 'text' && !isLettered) return [{ name: item.text, box: boxOfText(item) }]
    return item.kind === 'circle' && item.role === 'edge'
      ? [{ name: 'letter', box: extentOf(item) }]
      : []
  })

/** Figures on each other, on a line of the strip or of another figure, or beyond the frame, in words. */
export const outlineFaults = (display: DisplayList): string[] => {
  const labels = labelBoxes(display)
  const paths = display.items.filter(isPath)
  const frame = { minX: 0, minY: 0, maxX: display.width, maxY: display.height }
  const lines = (roles: readonly Role[]) =>
    paths
      .filter(({ role, filled }) => roles.includes(role) && !filled)
      .flatMap((shape) => segmentsOf(shape.points, shape.closed))
  const strip = lines(STRIP)
  const dimensions = lines(['dimension'])
  return [
    ...labels.flatMap(({ name, box }, index) => [
      ...labels
        .slice(index + 1)
        .filter((other) => overlap(other.box, box))
        .map((other) => `${name} lies on ${other.name}`),
      ...(strip.some((line) => meetsBox(line, grow(box, -0.01)))
        ? [`${name} lies on the strip`]
        : []),
      ...(dimensions.some((line) => meetsBox(line, grow(box, -0.01)))
        ? [`${name} lies on a dimension line`]
        : []),
    ]),
    ...display.items
      .filter((item) => !holds(frame, extentOf(item)))
      .map((item) => `${item.role} ${item.kind} leaves the frame`),
  ]
}
