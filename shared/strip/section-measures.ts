import { heightOf, widthOf } from '#shared/geometry/bounds'
import { centroidOf } from '#shared/geometry/polyline'
import type { Vector } from '#shared/geometry/vector'
import type { FoldedSection } from '#shared/strip/folded-section'
import type { Inches } from '#shared/units/brands'

export interface SectionMeasures {
  /** The least upright box around the folded piece as it is walked: leg 1 along x. */
  readonly box: { readonly width: Inches; readonly height: Inches }
  /** Of the section's area, in the section's own frame: where a piece balances. */
  readonly centroid: Vector
}

/**
 * How large a folded piece is and where its middle of area lies, in inches. The area is that of the
 * true outline, round bends as chords of at most 5 degrees.
 */
export const sectionMeasures = ({ outline, bounds }: FoldedSection): SectionMeasures => ({
  box: { width: widthOf(bounds), height: heightOf(bounds) },
  centroid: centroidOf(outline),
})
