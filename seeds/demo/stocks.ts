import type { StockInsert } from '#server/db/tables/stocks'

/*
 * Thickness: steel by the Galvanized Sheet Gauge (24 ga 0.0276 in., 26 ga 0.0217 in.), aluminum by
 * its decimal, copper by ounce (16 oz 0.0216 in., Copper Development Association, Architecture
 * Design Handbook, table 1.1.3). Density in lb/in³: steel 0.2836 (Gere, Mechanics of Materials),
 * aluminum sheet 0.098 (Elements of Metric Gear Technology, table 18-10), copper 0.322 (Copper
 * Development Association, table 1.1A).
 *
 * Inside radius: steel 1 mm, the least that DIN 6935 allows below 1 mm of thickness; painted
 * aluminum one thickness, that of a 2T bend (ASTM D4145); copper one thickness, common practice, no
 * source. K: Machinery's Handbook, 31st edition, p. 1421, equation 33 (half-hard copper, soft
 * steel, aluminum at 90 degrees: 0.64 T + 1.57 R), which is K = 0.408. Springback: 90 / k - 90 with
 * the factors of Tabellenbuch Metall for r/s from 1 to 1.6, steel and aluminum 0.99, copper 0.98.
 *
 * Widths are those of 48 in. coil and 36 in. copper sheet, lengths what the shop's brakes take:
 * common practice, no source.
 *
 * Stainless, type 304: thickness of 26 ga and density from memory; K by DIN 6935, half of
 * 0.65 + 0.5 lg(r/s); springback 90 / 0.975 - 90, the factor from memory.
 *
 * The T-bend ratings of the paints are invented for the demo, as the paints are: one of them is too
 * brittle for a closed hem.
 */
const STEEL = {
  metal: 'steel',
  painted: true,
  inside_radius: 0.0394,
  k_factor: 0.408,
  density: 0.2836,
  springback_per_90: 0.9,
  widest_strip: 48,
  longest_piece: 126,
  k_source: 'handbookHard',
  paint_t_bend: 0,
  alloy: null,
} as const

const ALUMINUM = {
  ...STEEL,
  metal: 'aluminum',
  density: 0.098,
  alloy: '3105-H25',
} as const

const steel24 = { ...STEEL, thickness_name: '24 ga', thickness: 0.0276 }
const steel26 = { ...STEEL, thickness_name: '26 ga', thickness: 0.0217 }

export const DEMO_STOCKS = {
  kiln: {
    ...steel24,
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73301',
    position: 1,
    color_name: 'Kiln 4',
    color_hex: '#8a3b2c',
  },
  slate: {
    ...steel24,
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73302',
    position: 2,
    color_name: 'Slate 12',
    color_hex: '#4a5560',
  },
  barley: {
    ...steel26,
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73303',
    position: 3,
    color_name: 'Barley 2',
    color_hex: '#cdb98a',
  },
  harbor: {
    ...ALUMINUM,
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73304',
    position: 4,
    thickness_name: '.032',
    thickness: 0.032,
    inside_radius: 0.032,
    color_name: 'Harbor 7',
    color_hex: '#2f5d73',
  },
  chalk: {
    ...ALUMINUM,
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73305',
    position: 5,
    thickness_name: '.040',
    thickness: 0.04,
    inside_radius: 0.04,
    color_name: 'Chalk 1',
    paint_t_bend: 2,
    color_hex: '#e9e6dc',
  },
  copper: {
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73306',
    position: 6,
    metal: 'copper',
    thickness_name: '16 oz',
    color_name: 'Bare',
    color_hex: '#b4683f',
    painted: false,
    thickness: 0.0216,
    inside_radius: 0.0216,
    k_factor: 0.408,
    density: 0.322,
    springback_per_90: 1.84,
    widest_strip: 36,
    longest_piece: 120,
    k_source: 'handbookHard',
    paint_t_bend: null,
    alloy: 'C110',
  },
  moss: {
    ...steel24,
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73307',
    position: 7,
    color_name: 'Moss 9',
    color_hex: '#4d5b3f',
  },
  rook: {
    ...steel26,
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73308',
    position: 8,
    color_name: 'Rook 3',
    color_hex: '#2f3236',
  },
  foxglove: {
    ...ALUMINUM,
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73309',
    position: 9,
    thickness_name: '.032',
    thickness: 0.032,
    inside_radius: 0.032,
    color_name: 'Foxglove 6',
    color_hex: '#7a4a63',
  },
  stainless: {
    id: 'c4e9d1b6-0f4d-4f6b-9b1e-5a60c2d73310',
    position: 10,
    metal: 'stainless',
    thickness_name: '26 ga',
    color_name: 'Mill',
    color_hex: '#b9bdbf',
    painted: false,
    thickness: 0.0188,
    inside_radius: 0.0394,
    k_factor: 0.405,
    density: 0.289,
    springback_per_90: 2.3,
    widest_strip: 36,
    longest_piece: 120,
    k_source: 'din6935',
    paint_t_bend: null,
    alloy: '304',
  },
} as const satisfies Record<string, StockInsert>

export type DemoStock = keyof typeof DEMO_STOCKS
