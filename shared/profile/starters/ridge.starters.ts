import { pitchAngle } from '#shared/units/angle'
import { ANY_PITCH, bend, closedHem, inches, LEFT, RIGHT, roofBend } from './starter'
import type { StarterDefinition } from './starter'

/** Trim where a slope ends at the top or changes. */
export const RIDGE_STARTERS = [
  // Two wings with edges kicked down on the panels.
  {
    key: 'ridge',
    kind: 'ridge',
    parameters: [inches('wingWidth', 6.5, 3, 12)],
    // Level roofs have no ridge.
    pitch: { least: 0.25, most: ANY_PITCH.most },
    lies: { evenAbout: 2 },
    parts: (value) => ({
      legs: [0.75, value('wingWidth'), value('wingWidth'), 0.75],
      bends: [bend(-30), roofBend(RIGHT, 'ridge'), bend(-30)],
      hemA: closedHem(RIGHT),
      hemB: closedHem(RIGHT),
    }),
  },
  // Roof wing over the top of a single slope, plumb face, kick.
  {
    key: 'highSidePeak',
    kind: 'ridge',
    parameters: [inches('faceWidth', 4.5, 2, 10)],
    pitch: ANY_PITCH,
    lies: { leg: 2, heading: -90 },
    parts: (value) => ({
      legs: [6, value('faceWidth'), 0.75],
      bends: [roofBend(RIGHT, 'highSidePeak'), bend(40)],
      hemB: closedHem(RIGHT),
    }),
  },
  // Apron with a kicked edge on the panels below, leg under those of the steeper roof above.
  {
    key: 'transition',
    kind: 'ridge',
    parameters: [
      inches('apronWidth', 5.5, 3, 10),
      { key: 'steeperBy', default: 4, least: 1, most: 12, unit: 'rise' },
    ],
    pitch: ANY_PITCH,
    lies: { upSlope: 2 },
    parts: (value, rise) => ({
      legs: [0.75, value('apronWidth'), 5],
      bends: [bend(-20), roofBend(LEFT, 'transition', pitchAngle(rise + value('steeperBy')))],
      hemA: closedHem(RIGHT),
    }),
  },
] as const satisfies readonly StarterDefinition[]
