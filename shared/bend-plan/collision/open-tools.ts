import { vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import type { Brake, ToolSet } from '../brake.schema'
import { toolOutline } from './outline'
import type { Outline } from './outline'

/** The tools of one direction, opened just beyond the clearance so that clamped sheet is never reported. */
export interface OpenTools {
  readonly inner: Outline
  readonly outer: Outline
  readonly apron: Outline
}

/** Beyond the clearance. Inches. */
const MORE = 0.001

/** From the sheet's centre line to a tool: T/2 + safety. */
export const toolClearance = (thickness: Inches, brake: Brake): Inches =>
  thickness / 2 + brake.safety

const shifted = (polygon: ToolSet['inner'], dx: Inches, dy: Inches): Outline =>
  toolOutline(polygon.map(([x, y]) => vector(x + dx, y + dy)))

export const openTools = (tools: ToolSet, clearance: Inches): OpenTools => {
  const e = clearance + MORE
  return {
    inner: shifted(tools.inner, 0 - e, e),
    outer: shifted(tools.outer, 0, 0 - e),
    apron: shifted(tools.apron, 0, 0 - e),
  }
}
