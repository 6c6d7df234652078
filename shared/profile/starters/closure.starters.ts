import { radians } from '#shared/geometry/vector'
import type { Degrees, Inches } from '#shared/units/brands'
import { tapeStep } from '#shared/units/tape-step'
import { bend, closedHem, inches, RIGHT } from './starter'
import type { StarterDefinition } from './starter'

/** How far the sides of a hat lean: with square sides no brake of ours lets go of it. */
const HAT_LEAN: Degrees = 60

/** The side of a hat for its height, to the next sixteenth of a tape. */
const hatSide = (height: Inches): Inches =>
  tapeStep(height / Math.sin(radians(HAT_LEAN)), 'up', 'fraction')

/** Trim that fills and holds between panels and what lies below or above them. */
export const CLOSURE_STARTERS = [
  // Flange on the roof, web, flange under the cover.
  {
    key: 'zClosure',
    kind: 'closure',
    parameters: [inches('ribHeight', 2, 0.75, 4)],
    pitch: null,
    lies: { leg: 1, heading: 0 },
    parts: (value) => ({
      legs: [1.25, value('ribHeight'), 1.25],
      bends: [bend(90), bend(-90)],
    }),
  },
  // Flange behind, web past the edge of the panel, lip over its face with the hem inside.
  {
    key: 'jTrim',
    kind: 'closure',
    parameters: [inches('ribHeight', 1.25, 0.75, 3), inches('flangeWidth', 1.5, 1, 4)],
    pitch: null,
    lies: { leg: 1, heading: -90 },
    parts: (value) => ({
      legs: [value('flangeWidth'), value('ribHeight'), 1],
      bends: [bend(-90), bend(-90)],
      hemB: closedHem(RIGHT),
    }),
  },
  // Two flanges, leaning sides, and the top that carries.
  {
    key: 'hat',
    kind: 'closure',
    parameters: [inches('ribHeight', 0.875, 0.75, 3), inches('topWidth', 1.5, 1, 4)],
    pitch: null,
    lies: { leg: 1, heading: 0 },
    parts: (value) => {
      const side = hatSide(value('ribHeight'))
      return {
        legs: [1, side, value('topWidth'), side, 1],
        bends: [bend(HAT_LEAN), bend(0 - HAT_LEAN), bend(0 - HAT_LEAN), bend(HAT_LEAN)],
      }
    },
  },
] as const satisfies readonly StarterDefinition[]
