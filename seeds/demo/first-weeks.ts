import { answer, ask, release, submit, withdraw } from './acts'
import { gableEnds } from './dressings'
import { DEMO_JOBS } from './jobs'
import {
  bendRun,
  bringBack,
  bundle,
  handOver,
  moveTo,
  ofMark,
  spoil,
  takeOneOut,
} from './shop-floor-acts'
import { DEMO_STOCKS } from './stocks'
import { at, type Story } from './story'

/** Orders of the first two of three weeks. */
export const FIRST_WEEKS: readonly Story[] = [
  {
    by: 'corin',
    job: 'tannery',
    poNumber: 'PW-3301',
    neededIn: -10,
    notes: 'Gate code at the yard is with the foreman. Bundles under 10 ft 6 only, small truck.',
    lines: [
      ['A', 'Eave drip, courtyard', 'eaveDrip', 'moss', 12, 120],
      ['B', 'Rake, north stair', 'gableRake', 'moss', 4, 98.5],
    ],
    steps: [
      at(-14, '14:10', submit),
      at(-14, '16:30', release),
      at(-13, '13:20', bendRun(1)),
      at(-13, '14:15', bendRun(2, 'oskar')),
      at(-13, '15:10', bundle('R1')),
      at(-11, '13:15', handOver('Corin Fernhollow', 1)),
    ],
  },
  {
    by: 'rosario',
    job: 'mirador',
    poNumber: '118',
    neededIn: -9,
    notes: 'Favor de marcar los atados por fachada: el andamio se mueve una sola vez.',
    lines: [
      ['AL', 'Alero, fachada sur', 'deepEave', 'barley', 8, 126],
      ['CU', 'Cumbrera', 'slimRidge', 'barley', 4, 126],
    ],
    steps: [
      at(-14, '18:25', submit),
      at(-13, '13:40', ask('The ridge is short for both slopes: is the lean-to left out?')),
      at(-13, '17:05', answer('Sí, el cobertizo va después, en otro pedido.')),
      at(-13, '18:10', release),
      at(-12, '14:20', bendRun(1)),
      at(-12, '15:30', bendRun(2)),
      at(-12, '16:10', bundle('F2', ofMark('AL'))),
      at(-12, '16:15', bundle('R2', ofMark('CU'))),
      at(-10, '14:05', handOver('Rosario Vallehondo', 1, 2)),
    ],
  },
  // Fetched in two goes: the valley metal before the roof was ready for the rest.
  {
    by: 'bram',
    job: 'gosling',
    poNumber: 'OG 52',
    neededIn: -7,
    notes: 'Milking parlor. No deliveries before 9, the lane is full of cows.',
    lines: [
      ['V', 'Valley at the parlor', 'wideValley', 'rook', 6, 126],
      ['R', 'Ridge', 'ridge', 'rook', 9, 126],
    ],
    steps: [
      at(-13, '15:20', submit),
      at(-12, '13:05', release),
      at(-12, '17:20', bendRun(1, 'oskar')),
      at(-12, '18:30', bundle('F1', ofMark('V'))),
      at(-11, '14:00', handOver('Bram Oxenthistle', 1)),
      at(-11, '15:10', bendRun(2)),
      at(-11, '16:40', bundle('F1', ofMark('R'))),
      at(-8, '19:20', handOver('Jory Tallowhay', 2)),
    ],
  },
  {
    by: 'petra',
    job: 'harrow',
    poNumber: 'HL-99',
    neededIn: -8,
    notes: 'Dormer, lefts and rights taped apart. Chalk an arrow to the eave end.',
    lines: [
      [
        'D',
        'Rake, dormer',
        'gableRake',
        'kiln',
        4,
        52.25,
        {
          ends: gableEnds(DEMO_JOBS.harrow.pitch_rise),
          hands: { drawn: 'left', left: 2, right: 2 },
        },
      ],
    ],
    goods: [
      {
        kind: 'rivets',
        quantity: 24,
        unit: 'each',
        stockId: DEMO_STOCKS.kiln.id,
        note: '',
      },
    ],
    steps: [
      at(-13, '19:50', submit),
      at(-12, '13:15', release),
      at(-11, '17:30', bendRun(1)),
      at(-11, '18:05', bundle('R3')),
      at(-10, '15:45', handOver('Petra Larkmoor', 1)),
    ],
  },
  // A piece spoiled and made again the same day.
  {
    by: 'corin',
    job: 'nettle',
    poNumber: 'PW-3305',
    neededIn: -7,
    notes: '',
    lines: [
      ['F', 'Fascia cover, street side', 'fascia', 'foxglove', 8, 118],
      ['H', 'Headwall, party wall', 'headwall', 'foxglove', 5, 120],
    ],
    steps: [
      at(-12, '16:00', submit),
      at(-11, '13:10', release),
      at(-10, '13:30', bendRun(1)),
      at(-10, '14:20', spoil(1, 'Film caught in the clamp: scratch along the whole face.')),
      at(-10, '14:40', bendRun(1)),
      at(-10, '16:00', bendRun(2, 'oskar')),
      at(-10, '17:10', bundle('R4', ofMark('F'))),
      at(-10, '17:20', bundle('R5', ofMark('H'))),
      at(-8, '13:35', handOver('Corin Fernhollow', 1, 2)),
    ],
  },
  {
    by: 'tomas',
    job: 'chapel',
    poNumber: '7709',
    neededIn: -6,
    notes: 'Para la sacristía. Yo paso por ellas el viernes.',
    lines: [['P', 'Peak, sacristy', 'peak', 'slate', 3, 96]],
    steps: [
      at(-12, '20:15', submit),
      at(-11, '13:25', release),
      at(-9, '16:20', bendRun(1, 'oskar')),
      at(-9, '17:00', bundle('R6')),
      at(-8, '20:30', handOver('Tomás Valdeluna', 1)),
    ],
  },
  {
    by: 'rosario',
    job: 'molino',
    poNumber: '121',
    neededIn: -5,
    notes: 'Cobre: sin dedos, con guantes. Lo ve el dueño de cerca.',
    lines: [['G', 'Goterón, portal de entrada', 'bareDrip', 'copper', 6, 92]],
    goods: [{ kind: 'sealant', quantity: 3, unit: 'tube', stockId: null, note: 'Neutro.' }],
    steps: [
      at(-11, '19:40', submit),
      at(-10, '13:10', release),
      at(-9, '18:30', bendRun(1)),
      at(-9, '19:10', bundle('R8')),
      at(-7, '14:30', handOver('Rosario Vallehondo', 1)),
    ],
  },
  // Came back once, because the shed had no door to lock it behind.
  {
    by: 'bram',
    job: 'ferry',
    poNumber: 'OG 55',
    neededIn: -3,
    notes: 'Salt air, hence stainless. Nothing galvanized in the bundle, please.',
    lines: [['S', 'Drip along the slip', 'bareDrip', 'stainless', 10, 118]],
    steps: [
      at(-11, '20:20', submit),
      at(-10, '18:40', release),
      at(-8, '15:50', bendRun(1)),
      at(-8, '17:15', bundle('R9')),
      at(-7, '15:30', handOver('Jory Tallowhay', 1)),
      at(-7, '20:05', bringBack(1, 'No lock on the shed yet; keep it until the door hangs.')),
      at(-4, '15:05', handOver('Bram Oxenthistle', 1)),
    ],
  },
  {
    by: 'rosario',
    job: 'mirador',
    poNumber: '122',
    neededIn: -2,
    notes: '',
    lines: [['M', 'Encuentro con muro, cobertizo', 'headwall', 'barley', 4, 108]],
    steps: [
      at(-9, '20:10', submit),
      at(-8, '14:05', withdraw('El cobertizo se queda con lámina vieja.', 'rosario')),
    ],
  },
  // The rakes are on the roof, the ridge waits on the rack.
  {
    by: 'corin',
    job: 'tannery',
    poNumber: 'PW-3308',
    neededIn: 2,
    notes: 'Rakes first. Ridge whenever, we fetch it with the next load.',
    lines: [
      ['K', 'Tall rake, both gables', 'tallRake', 'moss', 8, 110],
      ['R', 'Ridge', 'ridge', 'moss', 7, 120],
    ],
    goods: [
      {
        kind: 'fasteners',
        quantity: 250,
        unit: 'each',
        stockId: DEMO_STOCKS.moss.id,
        note: 'Painted heads.',
      },
    ],
    steps: [
      at(-9, '14:45', submit),
      at(-8, '13:10', release),
      at(-7, '16:10', bendRun(1)),
      at(-7, '17:20', bundle('F4', ofMark('K'))),
      at(-6, '14:10', bendRun(2, 'oskar')),
      at(-6, '15:00', bundle('R1', ofMark('R'))),
      at(-5, '13:50', handOver('Corin Fernhollow', 1)),
      at(-5, '19:30', moveTo(2, 'R11')),
    ],
  },
  // Two bundles gone; one of them came back.
  {
    by: 'bram',
    job: 'gosling',
    poNumber: 'OG 58',
    neededIn: 1,
    notes: 'Calf barn. Same slate as the parlor doors.',
    lines: [
      ['E', 'Eave drip', 'deepEave', 'slate', 8, 126],
      ['H', 'Headwall at the silo', 'headwall', 'slate', 3, 84],
      ['Z', 'Closure', 'closure', 'slate', 8, 120],
    ],
    steps: [
      at(-8, '16:25', submit),
      at(-7, '13:10', release),
      at(-6, '16:00', bendRun(1)),
      at(-6, '17:10', bendRun(2, 'oskar')),
      at(-6, '17:40', bendRun(3, 'oskar')),
      at(-6, '18:10', bundle('F3', ofMark('E'))),
      at(-6, '18:15', bundle('R3', ofMark('H'))),
      at(-6, '18:20', bundle('R4', ofMark('Z'))),
      at(-5, '15:40', handOver('Jory Tallowhay', 1, 3)),
      at(
        -4,
        '13:40',
        bringBack(3, 'Closures are an inch long for the ribs: being checked on site.'),
      ),
    ],
  },
  // Due today, all on the rack.
  {
    by: 'petra',
    job: 'millpond',
    poNumber: 'MP-9',
    neededIn: 0,
    notes: 'Lean-to of the barn. Truck comes right after lunch.',
    lines: [
      ['H', 'Headwall at the barn', 'headwall', 'slate', 6, 108],
      ['G', 'Rake, lean-to', 'gableRake', 'slate', 2, 86.75],
    ],
    steps: [
      at(-6, '15:30', submit),
      at(-5, '13:05', release),
      at(-4, '16:30', bendRun(1, 'oskar')),
      at(-3, '14:30', bendRun(2, 'oskar')),
      at(-3, '15:20', bundle('R7')),
    ],
  },
  // A hem flattened too far was opened up again before it left.
  {
    by: 'rosario',
    job: 'molino',
    poNumber: '125',
    neededIn: 3,
    notes: 'El portal segundo, igual que el primero. Avisar por mensaje cuando esté.',
    lines: [
      ['G', 'Goterón, portal de carga', 'bareDrip', 'copper', 5, 92],
      ['L', 'Limahoya corta', 'bareValley', 'copper', 2, 70],
    ],
    steps: [
      at(-6, '19:35', submit),
      at(-5, '14:15', release),
      at(-4, '18:10', bendRun(1)),
      at(-3, '19:00', bendRun(2)),
      at(-3, '19:30', bundle('R8')),
      at(-2, '13:40', takeOneOut(1, 'Fingerprints on the first drip, wiped before strapping.')),
      at(-2, '14:00', bundle('R8')),
    ],
  },
]
