import { amendFirst, answer, ask, release, submit, withdraw } from './acts'
import { DRESSED } from './dressed-stories'
import {
  bend,
  bendByCount,
  bendOneByMistake,
  bringBack,
  bundle,
  claim,
  leave,
  handOver,
  moveTo,
  ofMark,
  spoil,
  takeOneOut,
} from './shop-floor-acts'
import { at, type Story } from './story'

/** Orders that came to the counter and were bent, bundled or handed over by now. */
const MADE: readonly Story[] = [
  // Picked up in one go.
  {
    by: 'maren',
    job: 'harrow',
    poNumber: 'HL-101',
    neededIn: -6,
    notes: 'Front slope first.',
    lines: [
      ['A', 'Eave drip, front', 'eaveDrip', 'kiln', 6, 120],
      ['B', 'Rake, both gables', 'gableRake', 'kiln', 4, 126],
    ],
    steps: [
      at(-10, '14:05', submit),
      at(-10, '15:30', release),
      at(-9, '13:10', bend(1)),
      at(-9, '14:00', bend(2)),
      at(-9, '15:20', bundle('R1', ofMark('A'))),
      at(-9, '15:32', bundle('R2', ofMark('B'))),
      at(-7, '13:25', handOver('Maren Quillfeather', 1, 2)),
    ],
  },
  // Picked up in two goes, a bundle came back in between.
  {
    by: 'tomas',
    job: 'tern',
    poNumber: '7714',
    neededIn: -4,
    notes: '',
    lines: [
      ['W1', 'Parapet cap, north', 'wallCap', 'chalk', 5, 120],
      ['W2', 'Parapet cap, short end', 'wallCap', 'chalk', 2, 84.5],
      ['H', 'Headwall at the stair', 'headwall', 'chalk', 3, 96],
    ],
    steps: [
      at(-10, '16:40', submit),
      at(-9, '13:35', ask('W1 and W2 meet at the corner: which of them laps over the other?')),
      at(-9, '17:50', answer('W1 laps over W2 by 4 in.')),
      at(-9, '19:05', release),
      at(-8, '13:20', bend(1)),
      at(-8, '14:30', bend(2)),
      at(-8, '15:45', bundle('R4', ofMark('W1', 'W2'))),
      at(-8, '15:58', bundle('R5', ofMark('H'))),
      at(-6, '13:40', handOver('Tomás Valdeluna', 1, 2)),
      at(-6, '20:10', bringBack(2, 'Stair wall is not plastered yet; the shop keeps it dry.')),
      at(-3, '14:15', handOver('Tomás Valdeluna', 2)),
    ],
  },
  // One bundle gone, one on the rack.
  {
    by: 'maren',
    job: 'millpond',
    poNumber: 'MP-7',
    neededIn: 1,
    notes: 'Valley metal goes up first, please have it ready early.',
    lines: [
      ['V', 'Valley, both sides', 'wideValley', 'slate', 4, 120],
      ['R', 'Tall rake', 'tallRake', 'slate', 6, 126],
      ['P', 'Ridge', 'ridge', 'slate', 5, 120],
    ],
    steps: [
      at(-8, '13:50', submit),
      at(-8, '17:00', release),
      at(-7, '14:10', bend(1)),
      at(-7, '15:05', bundle('F1', ofMark('V'))),
      at(-5, '13:30', handOver('Maren Quillfeather', 1)),
      at(-5, '14:00', bend(2)),
      at(-4, '13:20', bend(3)),
      at(-4, '15:10', bundle('F2', ofMark('R'))),
      at(-4, '15:30', bundle('R3', ofMark('P'))),
      at(-3, '18:05', moveTo(3, 'R6')),
    ],
  },
  // All on the rack, one piece taken out and put right.
  {
    by: 'tomas',
    job: 'chapel',
    poNumber: '7720',
    neededIn: 1,
    notes: 'Copper: keep the film on, gloves only.',
    lines: [
      ['K1', 'Copper valley', 'bareValley', 'copper', 3, 96],
      ['K2', 'Copper drip, apse', 'bareDrip', 'copper', 8, 60],
    ],
    steps: [
      at(-7, '15:15', submit),
      at(-7, '18:20', release),
      at(-6, '13:15', bend(1)),
      at(-5, '16:30', bend(2, 5)),
      at(-4, '16:10', bend(2)),
      at(-4, '17:40', bundle('R8', ofMark('K1'))),
      at(-4, '17:55', bundle('R8', ofMark('K2'))),
      at(-3, '13:30', takeOneOut(2, 'One of the drips has its hem flattened too far.')),
      at(-3, '14:20', bundle('R9')),
    ],
  },
  // In work and late: a spoiled piece was made again.
  {
    by: 'maren',
    job: 'orchard',
    poNumber: 'OR-22',
    neededIn: -1,
    notes: '',
    lines: [
      ['E', 'Eave drip, garages', 'deepEave', 'barley', 9, 126],
      ['G', 'Rake', 'gableRake', 'barley', 8, 96],
      ['Z', 'Closure', 'openHemClosure', 'barley', 12, 120],
    ],
    steps: [
      at(-6, '14:20', submit),
      at(-6, '16:35', release),
      at(-5, '15:20', bend(1, 6)),
      at(-5, '15:50', spoil(1, 'Kick bent to the wrong side: the piece was end for end.')),
      at(-4, '14:40', bend(1, 3)),
      at(-4, '17:50', leave(1)),
      at(-4, '18:30', bundle('F3', ofMark('E'))),
      at(-2, '13:25', bend(2, 3)),
    ],
  },
  // In work: bent by count, one press taken back.
  {
    by: 'tomas',
    job: 'tern',
    poNumber: '7731',
    neededIn: 2,
    notes: 'Call Tomás when the caps are on the rack.',
    lines: [
      ['C1', 'Fascia cover, street', 'fascia', 'harbor', 7, 120],
      ['C2', 'Fascia cover, yard', 'fascia', 'harbor', 3, 102.25],
      ['S', 'Sidewall', 'sidewall', 'harbor', 6, 120],
    ],
    steps: [
      at(-4, '13:50', submit),
      at(-4, '19:10', release),
      at(-3, '15:00', claim(1)),
      at(-3, '15:40', bendByCount(1, 4)),
      at(-3, '15:55', bendOneByMistake(1, 'Pressed once too often.')),
      at(-3, '16:10', leave(1)),
      at(-2, '14:50', bend(2, 4)),
      at(-2, '15:25', leave(2)),
      at(-2, '15:30', bundle('R10', ofMark('S'))),
    ],
  },
  // A piece spoiled on the rack, its remake still queued.
  {
    by: 'maren',
    job: 'harrow',
    poNumber: 'HL-108',
    neededIn: 3,
    notes: '',
    lines: [
      ['R', 'Ridge, porch', 'slimRidge', 'barley', 5, 126],
      ['S', 'Sidewall at the chimney', 'sidewall', 'kiln', 2, 54],
    ],
    steps: [
      at(-4, '20:05', submit),
      at(-3, '13:15', release),
      at(-3, '17:20', bend(1)),
      at(-2, '16:00', spoil(1, 'Dropped on the way to the rack, dented across the ridge bend.')),
      at(-2, '16:20', leave(1)),
      at(-1, '13:20', bend(2)),
    ],
  },
]

/** Orders that no one bends yet. */
const ASKED: readonly Story[] = [
  // Released, whole queue.
  {
    by: 'tomas',
    job: 'chapel',
    poNumber: '7735',
    neededIn: 4,
    notes: '',
    lines: [
      ['P1', 'High-side peak', 'peak', 'slate', 6, 120],
      ['P2', 'High-side peak, vestry', 'peak', 'slate', 2, 72],
      ['H', 'Headwall at the tower', 'headwall', 'slate', 4, 108],
    ],
    steps: [at(-3, '16:30', submit), at(-2, '13:10', release)],
  },
  // Released, amended before.
  {
    by: 'maren',
    job: 'millpond',
    poNumber: 'MP-11',
    neededIn: 5,
    notes: 'Second load.',
    lines: [
      ['D', 'Eave drip', 'deepEave', 'slate', 10, 126],
      ['Z', 'Closure under the ridge', 'closure', 'slate', 10, 120],
    ],
    steps: [at(-3, '19:40', submit), at(-2, '14:30', amendFirst(12)), at(-2, '18:45', release)],
  },
  // Withdrawn by the crew.
  {
    by: 'tomas',
    job: 'tern',
    poNumber: '',
    neededIn: 6,
    notes: '',
    lines: [['X', 'Headwall, bike shed', 'headwall', 'barley', 4, 120]],
    steps: [
      at(-5, '19:30', submit),
      at(-4, '14:15', withdraw('The shed is not built this year.', 'tomas')),
    ],
  },
  // The shop waits for an answer.
  {
    by: 'maren',
    job: 'orchard',
    poNumber: 'OR-25',
    neededIn: 6,
    notes: '',
    lines: [
      ['R1', 'Ridge, garages 2 to 4', 'ridge', 'barley', 6, 126],
      ['R2', 'Ridge, garages 6 to 8', 'ridge', 'barley', 6, 126],
    ],
    steps: [
      at(-2, '15:10', submit),
      at(
        -1,
        '14:05',
        ask('R2: garages 6 to 8 are drawn with a 3 in 12 roof. Is the ridge the same?'),
      ),
    ],
  },
  // Waiting to be checked.
  {
    by: 'tomas',
    job: 'chapel',
    poNumber: '7741',
    neededIn: 7,
    notes: 'Visible from the road: best faces outward.',
    lines: [
      ['G1', 'Rake, west gable', 'gableRake', 'slate', 4, 126],
      ['G2', 'Rake, porch', 'gableRake', 'slate', 2, 63.5],
    ],
    steps: [at(-1, '16:20', submit)],
  },
  {
    by: 'maren',
    job: 'harrow',
    poNumber: 'HL-110',
    neededIn: 5,
    notes: '',
    lines: [
      ['E', 'Eave drip, rear', 'eaveDrip', 'kiln', 6, 120],
      ['Z', 'Closure', 'closure', 'kiln', 6, 120],
    ],
    steps: [at(-1, '19:15', submit)],
  },
]

export const STORIES: readonly Story[] = [...MADE, ...ASKED, ...DRESSED]
