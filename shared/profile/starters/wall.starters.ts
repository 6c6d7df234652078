import { ANY_PITCH, bend, closedHem, inches, LEFT, RIGHT, roofBend } from './starter'
import type { StarterDefinition } from './starter'

/** Trim against walls and over them. */
export const WALL_STARTERS = [
  // Apron with a kicked edge on the panels, leg up the wall.
  {
    key: 'headwall',
    kind: 'wall',
    parameters: [inches('wallHeight', 3.5, 2, 12), inches('apronWidth', 5.5, 3, 10)],
    pitch: ANY_PITCH,
    lies: { leg: 3, heading: 90 },
    parts: (value) => ({
      legs: [0.75, value('apronWidth'), value('wallHeight')],
      bends: [bend(-20), roofBend(LEFT, 'headwall')],
      hemA: closedHem(RIGHT),
    }),
  },
  // Flange beside the panels with a hem that turns water back, leg up the wall.
  {
    key: 'sidewall',
    kind: 'wall',
    parameters: [inches('wallHeight', 5, 2, 12), inches('flangeWidth', 4.5, 2, 8)],
    pitch: null,
    lies: { leg: 2, heading: 90 },
    parts: (value) => ({
      legs: [value('flangeWidth'), value('wallHeight')],
      bends: [roofBend(LEFT, 'sidewall')],
      hemA: closedHem(LEFT),
    }),
  },
  // Over the top of a wall: a face with a kicked drip on either side, the outer one deeper.
  {
    key: 'coping',
    kind: 'wall',
    parameters: [inches('wallWidth', 12, 4, 16), inches('faceWidth', 4, 2, 6)],
    pitch: null,
    lies: { leg: 3, heading: 0 },
    parts: (value) => ({
      legs: [0.75, value('faceWidth'), value('wallWidth'), value('faceWidth') - 0.5, 0.75],
      bends: [bend(45), bend(-90), bend(-90), bend(45)],
      hemA: closedHem(RIGHT),
      hemB: closedHem(RIGHT),
    }),
  },
] as const satisfies readonly StarterDefinition[]
