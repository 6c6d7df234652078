import { bend, closedHem, inches, LEFT, RIGHT } from './starter'
import type { StarterDefinition, StarterParameter } from './starter'

/** The angle between two walls as a bevel reads it on the side of the color. */
const CORNER: StarterParameter = {
  key: 'cornerAngle',
  default: 90,
  least: 60,
  most: 150,
  unit: 'degrees',
}

/** Trim on the corners of walls: a face on either side, both edges hemmed behind. */
export const CORNER_STARTERS = [
  {
    key: 'insideCorner',
    kind: 'corner',
    parameters: [inches('faceWidth', 3, 1.5, 8), CORNER],
    pitch: null,
    lies: { evenAbout: 1 },
    parts: (value) => ({
      legs: [value('faceWidth'), value('faceWidth')],
      bends: [bend(LEFT * (180 - value('cornerAngle')))],
      hemA: closedHem(RIGHT),
      hemB: closedHem(RIGHT),
    }),
  },
  {
    key: 'outsideCorner',
    kind: 'corner',
    parameters: [inches('faceWidth', 3, 1.5, 8), CORNER],
    pitch: null,
    lies: { evenAbout: 1 },
    parts: (value) => ({
      legs: [value('faceWidth'), value('faceWidth')],
      bends: [bend(RIGHT * (180 - value('cornerAngle')))],
      hemA: closedHem(RIGHT),
      hemB: closedHem(RIGHT),
    }),
  },
] as const satisfies readonly StarterDefinition[]
