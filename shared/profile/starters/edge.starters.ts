import { ANY_PITCH, bend, closedHem, inches, LEFT, RIGHT, roofBend } from './starter'
import type { StarterDefinition } from './starter'

/** Trim along the edges of a roof. */
export const EDGE_STARTERS = [
  // Roof flange, plumb face, kick.
  {
    key: 'eaveDrip',
    kind: 'edge',
    parameters: [inches('faceWidth', 2.5, 1.5, 8)],
    pitch: ANY_PITCH,
    lies: { leg: 2, heading: -90 },
    parts: (value) => ({
      legs: [4.5, value('faceWidth'), 0.75],
      bends: [roofBend(RIGHT, 'eave'), bend(30)],
      hemB: closedHem(RIGHT),
    }),
  },
  // Roof flange, face over the rake board, kick.
  {
    key: 'gableRake',
    kind: 'edge',
    parameters: [inches('faceWidth', 5.5, 2, 10)],
    pitch: null,
    lies: { leg: 1, heading: 0 },
    parts: (value) => ({
      legs: [3.5, value('faceWidth'), 0.75],
      bends: [roofBend(RIGHT, 'gable'), bend(40)],
      hemB: closedHem(RIGHT),
    }),
  },
  // Front lip turned in over the water with its hem below, front, bottom, and a back that stands
  // higher, so that water spills over the front. The color is on the outside.
  {
    key: 'boxGutter',
    kind: 'edge',
    parameters: [inches('faceWidth', 4.5, 3, 7), inches('bottomWidth', 5, 3, 8)],
    pitch: null,
    lies: { leg: 2, heading: -90 },
    parts: (value) => ({
      legs: [0.75, value('faceWidth'), value('bottomWidth'), value('faceWidth') + 1],
      bends: [bend(90), bend(90), bend(90)],
      hemA: closedHem(LEFT),
      colorSide: 'right',
    }),
  },
] as const satisfies readonly StarterDefinition[]
