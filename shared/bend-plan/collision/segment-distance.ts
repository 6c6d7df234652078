/** Square of the distance of the point (x, y) from the segment a b. */
export const pointSquare = (
  x: number,
  y: number,
  ax: number,
  ay: number,
  bx: number,
  by: number,
): number => {
  const dx = bx - ax
  const dy = by - ay
  const square = dx * dx + dy * dy
  const t = square === 0 ? 0 : ((x - ax) * dx + (y - ay) * dy) / square
  const at = t < 0 ? 0 : t > 1 ? 1 : t
  const offX = x - ax - at * dx
  const offY = y - ay - at * dy
  return offX * offX + offY * offY
}

/**
 * Square of the distance between the segments a b and c d; 0 where they cross. Otherwise an end point
 * of one is nearest.
 */
export const segmentSquare = (
  ax: number,
  ay: number,
  bx: number,
  by: number,
  cx: number,
  cy: number,
  dx: number,
  dy: number,
): number => {
  const c1 = (bx - ax) * (cy - ay) - (by - ay) * (cx - ax)
  const c2 = (bx - ax) * (dy - ay) - (by - ay) * (dx - ax)
  if ((c1 > 0 && c2 < 0) || (c1 < 0 && c2 > 0)) {
    const d1 = (dx - cx) * (ay - cy) - (dy - cy) * (ax - cx)
    const d2 = (dx - cx) * (by - cy) - (dy - cy) * (bx - cx)
    if ((d1 > 0 && d2 < 0) || (d1 < 0 && d2 > 0)) return 0
  }
  return Math.min(
    pointSquare(ax, ay, cx, cy, dx, dy),
    pointSquare(bx, by, cx, cy, dx, dy),
    pointSquare(cx, cy, ax, ay, bx, by),
    pointSquare(dx, dy, ax, ay, bx, by),
  )
}

/** Whether the boxes about the segments a b and c d are further apart than a clearance: then they are. */
export const areFarApart = (
  ax: number,
  ay: number,
  bx: number,
  by: number,
  cx: number,
  cy: number,
  dx: number,
  dy: number,
  clearance: number,
): boolean =>
  (ax < bx ? ax : bx) > (cx > dx ? cx : dx) + clearance ||
  (ax > bx ? ax : bx) < (cx < dx ? cx : dx) - clearance ||
  (ay < by ? ay : by) > (cy > dy ? cy : dy) + clearance ||
  (ay > by ? ay : by) < (cy < dy ? cy : dy) - clearance
