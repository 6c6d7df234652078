import { ANY_PITCH, bend, closedHem, inches, LEFT, roofBend } from './starter'
import type { StarterDefinition } from './starter'

/** Trim where two slopes run together. */
export const VALLEY_STARTERS = [
  // Two wings with hems that turn water back.
  {
    key: 'valley',
    kind: 'valley',
    parameters: [inches('wingWidth', 10, 5, 14)],
    // Level roofs have no valley.
    pitch: { least: 0.25, most: ANY_PITCH.most },
    lies: { evenAbout: 1 },
    parts: (value) => ({
      legs: [value('wingWidth'), value('wingWidth')],
      bends: [roofBend(LEFT, 'valley')],
      hemA: closedHem(LEFT),
      hemB: closedHem(LEFT),
    }),
  },
  // The same with a rib between the wings that breaks what runs down the steeper or larger side.
  {
    key: 'wValley',
    kind: 'valley',
    parameters: [inches('wingWidth', 10, 5, 14), inches('ribSide', 1.125, 0.75, 2)],
    pitch: ANY_PITCH,
    lies: { evenAbout: 2 },
    parts: (value) => ({
      legs: [value('wingWidth'), value('ribSide'), value('ribSide'), value('wingWidth')],
      bends: [roofBend(LEFT, 'valleyRib'), bend(-90), roofBend(LEFT, 'valleyRib')],
      hemA: closedHem(LEFT),
      hemB: closedHem(LEFT),
    }),
  },
] as const satisfies readonly StarterDefinition[]
