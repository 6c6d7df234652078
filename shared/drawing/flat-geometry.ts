/*
 * Segments and boxes as bare numbers. Placing the labels of one figure asks these questions many
 * thousand times; an object for each point would cost more than the answer.
 */

/** True when the segment has a point in the box, its border included (separating axes). */
export const lineMeetsBox = (
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
): boolean => {
  if ((x1 < minX && x2 < minX) || (x1 > maxX && x2 > maxX)) return false
  if ((y1 < minY && y2 < minY) || (y1 > maxY && y2 > maxY)) return false
  const dx = x2 - x1
  const dy = y2 - y1
  const a = dx * (minY - y1) - dy * (minX - x1)
  const b = dx * (minY - y1) - dy * (maxX - x1)
  const c = dx * (maxY - y1) - dy * (maxX - x1)
  const d = dx * (maxY - y1) - dy * (minX - x1)
  return !((a > 0 && b > 0 && c > 0 && d > 0) || (a < 0 && b < 0 && c < 0 && d < 0))
}

/** True when two segments cross at a point inside both. */
export const linesCross = (
  ax: number,
  ay: number,
  bx: number,
  by: number,
  cx: number,
  cy: number,
  dx: number,
  dy: number,
): boolean => {
  const c = (bx - ax) * (cy - ay) - (by - ay) * (cx - ax)
  const d = (bx - ax) * (dy - ay) - (by - ay) * (dx - ax)
  if (c * d >= 0) return false
  const a = (dx - cx) * (ay - cy) - (dy - cy) * (ax - cx)
  const b = (dx - cx) * (by - cy) - (dy - cy) * (bx - cx)
  return a * b < 0
}

/** The square of the distance between a point and a segment. */
export const pointToLine = (
  x: number,
  y: number,
  x1: number,
  y1: number,
  x2: number,
  y2: number,
): number => {
  const dx = x2 - x1
  const dy = y2 - y1
  const squared = dx * dx + dy * dy
  const along = squared === 0 ? 0 : ((x - x1) * dx + (y - y1) * dy) / squared
  const part = along < 0 ? 0 : along > 1 ? 1 : along
  const awayX = x - x1 - part * dx
  const awayY = y - y1 - part * dy
  return awayX * awayX + awayY * awayY
}

/** True when two segments come nearer than `reach` to each other. */
export const linesNear = (
  ax: number,
  ay: number,
  bx: number,
  by: number,
  cx: number,
  cy: number,
  dx: number,
  dy: number,
  reach: number,
): boolean => {
  const squared = reach * reach
  return (
    pointToLine(cx, cy, ax, ay, bx, by) < squared ||
    pointToLine(dx, dy, ax, ay, bx, by) < squared ||
    pointToLine(ax, ay, cx, cy, dx, dy) < squared ||
    pointToLine(bx, by, cx, cy, dx, dy) < squared ||
    linesCross(ax, ay, bx, by, cx, cy, dx, dy)
  )
}

/** The square of the distance between a point and a box. */
const pointToBox = (
  x: number,
  y: number,
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
): number => {
  const awayX = x < minX ? minX - x : x > maxX ? x - maxX : 0
  const awayY = y < minY ? minY - y : y > maxY ? y - maxY : 0
  return awayX * awayX + awayY * awayY
}

/** True when a segment comes nearer than `reach` to a box. */
export const lineNearBox = (
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  minX: number,
  minY: number,
  maxX: number,
  maxY: number,
  reach: number,
): boolean => {
  const squared = reach * reach
  return (
    pointToBox(x1, y1, minX, minY, maxX, maxY) < squared ||
    pointToBox(x2, y2, minX, minY, maxX, maxY) < squared ||
    pointToLine(minX, minY, x1, y1, x2, y2) < squared ||
    pointToLine(maxX, minY, x1, y1, x2, y2) < squared ||
    pointToLine(maxX, maxY, x1, y1, x2, y2) < squared ||
    pointToLine(minX, maxY, x1, y1, x2, y2) < squared ||
    lineMeetsBox(x1, y1, x2, y2, minX, minY, maxX, maxY)
  )
}
