/**
 * The colors of the product, once: the page's theme, the drawings on screen and the canvas are
 * all made from this table. CSS hex. `bare` is plain metal as a drawing shows it.
 */
export const PALETTE = {
  light: {
    paper: '#F5F5F1',
    sheet: '#FFFFFF',
    ink: '#1B2125',
    scribe: '#55606A',
    rule: '#D5D9D6',
    dye: '#2B3FA6',
    chalk: '#B8341B',
    oxide: '#226B48',
    ochre: '#7A5600',
    edge: '#84908F',
    bare: '#A9B2B5',
    tool: '#DDE1DF',
  },
  dark: {
    paper: '#14181B',
    sheet: '#1C2226',
    ink: '#ECEFED',
    scribe: '#A3AFB8',
    rule: '#323B41',
    dye: '#93A4FF',
    chalk: '#FF8A70',
    oxide: '#6CCB9C',
    ochre: '#E8B84A',
    edge: '#6C7A82',
    bare: '#7E8A91',
    tool: '#2A3238',
  },
} as const

export type ThemeName = keyof typeof PALETTE
export type Token = keyof (typeof PALETTE)['light']
