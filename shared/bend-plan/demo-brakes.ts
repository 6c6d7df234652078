import type { Brake, ToolSet } from './brake.schema'

type Polygon = ToolSet['inner']

const mirrored = (polygon: Polygon): Polygon => polygon.map(([x, y]) => [x, y === 0 ? 0 : -y])

const shopInner: Polygon = [
  [0, 0],
  [-0.75, 0],
  [-5, 2],
  [-12, 3.5],
  [-12, 11],
  [-6, 11],
  [-5.5, 3.17],
]

const shopApron: Polygon = [
  [0, 0],
  [0.75, 0],
  [0.75, -8],
  [0, -8],
]

const bothWays: ToolSet = {
  inner: shopInner,
  outer: mirrored(shopInner),
  apron: shopApron,
}

const weekdays: NonNullable<Brake['hours']>[number]['days'] = ['mon', 'tue', 'wed', 'thu', 'fri']

/** Generic illustrative brakes: no make's values. Speeds, hours, scales and line offsets are invented. */
const upOnly: Brake = {
  name: 'Ten-six folder',
  length: 126,
  maxFold: 140,
  hemAngle: 135,
  hemMin: 0.375,
  hemMax: 1,
  minFlange: 0.375,
  minClamp: 0.5,
  throat: 40,
  opening: 5,
  gauge: { min: 0.4, max: 40 },
  safety: 0.02,
  noseZone: 0.375,
  bigFront: 8,
  hemsFirst: true,
  checkRemoval: true,
  up: {
    inner: shopInner,
    outer: [
      [0, 0],
      [-3, 0],
      [-3, -30],
      [-0.3, -30],
    ],
    apron: shopApron,
  },
  down: null,
  capacity: { steel: 0.04, stainless: 0.025, aluminum: 0.05, copper: 0.032 },
  speeds: { load: 12, hit: 9, roll: 8, endForEnd: 14, both: 20, gaugeMove: 4 },
  hours: [{ days: weekdays, from: '06:30', to: '15:00' }],
  scale: { reads: 'bend', overbend: 'hand' },
  lineOffset: 0.03,
}

const upAndDown: Brake = {
  ...upOnly,
  name: 'Two-way folder',
  up: bothWays,
  down: bothWays,
  capacity: { steel: 0.052, stainless: 0.031, aluminum: 0.063, copper: 0.043 },
  speeds: { load: 12, hit: 6, roll: 8, endForEnd: 14, both: 20, gaugeMove: 2 },
  hours: [
    { days: weekdays, from: '06:00', to: '16:30' },
    { days: ['sat'], from: '07:00', to: '11:00' },
  ],
  scale: { reads: 'included', overbend: 'machine' },
  lineOffset: 0.015,
}

const site: Brake = {
  name: 'Site brake',
  length: 126,
  maxFold: 145,
  hemAngle: 145,
  hemMin: 0.375,
  hemMax: 1,
  minFlange: 0.5,
  minClamp: 0.5,
  throat: 20,
  opening: 1.5,
  gauge: null,
  safety: 0.02,
  noseZone: 0.375,
  bigFront: 8,
  hemsFirst: false,
  checkRemoval: true,
  up: {
    inner: [
      [0, 0],
      [-1, 0],
      [-3, 0.5],
      [-20, 0.8],
      [-20, 6],
      [-5, 6],
      [-4.6, 1.67],
    ],
    outer: [
      [0, 0],
      [-20, 0],
      [-20, -4],
      [-0.2, -4],
    ],
    apron: [
      [0, 0],
      [1, 0],
      [1, -3.5],
      [0, -3.5],
    ],
  },
  down: null,
  capacity: { steel: 0.025, stainless: null, aluminum: 0.032, copper: 0.022 },
  speeds: { load: 20, hit: 12, roll: 10, endForEnd: 18, both: 25, gaugeMove: 0 },
  hours: [{ days: weekdays, from: '07:00', to: '15:30' }],
  scale: { reads: 'included', overbend: 'hand' },
}

/** The three demo brakes by what they can do. */
export const DEMO_BRAKE = { upOnly, upAndDown, site } as const

export const DEMO_BRAKES: readonly Brake[] = [upOnly, upAndDown, site]

/** A demo brake by its name or its key (`upOnly`, `upAndDown`, `site`), upper and lower case alike. */
export const findDemoBrake = (name: string): Brake | undefined => {
  const wanted = name.trim().toLowerCase()
  return (
    DEMO_BRAKES.find((brake) => brake.name.toLowerCase() === wanted) ??
    Object.entries(DEMO_BRAKE).find(([key]) => key.toLowerCase() === wanted)?.[1]
  )
}
