import { isLess } from '#shared/geometry/tolerance'
import { weightPerSquareFoot } from '#shared/metal/densities'
import type { GaugeRow } from '#shared/metal/gauge-table'
import { COPPER_ROWS, GAUGE_ROWS } from '#shared/metal/gauge-table'
import type { Metal } from '#shared/stock/stock.schema'
import { sheetSchema } from '#shared/stock/stock.schema'
import type { Inches, Pounds } from '#shared/units/brands'
import { parseLength } from '#shared/units/parse-length'

/** The gauges that the trade counts in; a metal has its own. */
export const GAUGE_SYSTEMS = [
  'usStandard',
  'manufacturersStandard',
  'galvanized',
  'stainless',
  'brownSharpe',
] as const

export type GaugeSystem = (typeof GAUGE_SYSTEMS)[number]

/** Whether a steel sheet's thickness counts a zinc coating; prepainted trim steel does. */
export type SteelFinish = 'galvanized' | 'uncoated'

export interface NominalThickness {
  readonly thickness: Inches
  /** What a sheet of the name may measure; null where the tables used here set no limit. */
  readonly least: Inches | null
  readonly most: Inches | null
  /** As the catalogs list it; by density where they list none. */
  readonly poundsPerSquareFoot: Pounds
}

/** Ounces that a zinc coating adds to a square foot, both faces: the step between the tables. */
const ZINC_OUNCES = 2.5

const nominalOf = (system: GaugeSystem, row: GaugeRow): NominalThickness => {
  const open = { least: null, most: null }
  switch (system) {
    case 'usStandard':
      return { ...open, thickness: row.ounces / 640, poundsPerSquareFoot: row.ounces / 16 }
    case 'manufacturersStandard':
      return {
        ...open,
        thickness: row.manufacturersStandard,
        poundsPerSquareFoot: row.ounces / 16,
      }
    case 'galvanized':
      return {
        thickness: row.galvanized,
        least: row.galvanizedLeast,
        most: row.galvanizedMost,
        poundsPerSquareFoot: (row.ounces + ZINC_OUNCES) / 16,
      }
    case 'stainless':
      return {
        ...open,
        thickness: row.stainless,
        poundsPerSquareFoot: weightPerSquareFoot('stainless', row.stainless),
      }
    case 'brownSharpe':
      return {
        ...open,
        thickness: row.brownSharpe,
        poundsPerSquareFoot: weightPerSquareFoot('aluminum', row.brownSharpe),
      }
  }
}

/** A gauge of 16 to 30; null where the system lists no such gauge. */
export const findGauge = (system: GaugeSystem, gauge: number): NominalThickness | null => {
  const row = GAUGE_ROWS.find((one) => one.gauge === gauge)
  return row === undefined ? null : nominalOf(system, row)
}

/** Copper by ounces per square foot; null where no such sheet is listed. */
export const findCopper = (ounces: number): NominalThickness | null => {
  const row = COPPER_ROWS.find((one) => one.ounces === ounces)
  return row === undefined
    ? null
    : { thickness: row.nominal, least: row.least, most: null, poundsPerSquareFoot: ounces / 16 }
}

const systemOf = (metal: Metal, finish: SteelFinish): GaugeSystem | null => {
  switch (metal) {
    case 'steel':
      return finish === 'galvanized' ? 'galvanized' : 'manufacturersStandard'
    case 'stainless':
      return 'stainless'
    case 'aluminum':
      return 'brownSharpe'
    case 'copper':
    case 'zinc':
      return null
  }
}

export const THICKNESS_REFUSALS = [
  /** Not read as a gauge, ounces or a length at all. */
  'notAThickness',
  /** The metal is not counted that way: gauge for copper or zinc, ounces for all but copper. */
  'notOfThisMetal',
  /** Counted that way, but not listed. */
  'notListed',
  /** A length beyond any sheet. */
  'tooThick',
] as const

export type ThicknessResult =
  | { readonly ok: true; readonly nominal: NominalThickness }
  | {
      readonly ok: false
      readonly code: (typeof THICKNESS_REFUSALS)[number]
      /** Names that may have been meant, ready to be typed instead. */
      readonly cures: readonly string[]
    }

export interface NamedThickness {
  readonly metal: Metal
  /** Counts for steel by gauge only. */
  readonly finish: SteelFinish
  /** `24 ga`, `16 oz`, `.032`, `0.7 mm`: as in `thicknessName` of a stock. */
  readonly name: string
}

const GAUGE = /^(\d+) ?(?:ga\.?|gauge)$/i
const OUNCES = /^(\d+) ?(?:oz\.?|ounces?)$/i

const copperNames = (): string[] => COPPER_ROWS.map(({ ounces }) => `${ounces} oz`)
const gaugeNames = (): string[] => GAUGE_ROWS.map(({ gauge }) => `${gauge} ga`)

/** The names that a metal's sheets are listed under; zinc goes by its thickness alone. */
export const listedNames = (metal: Metal): string[] =>
  metal === 'copper' ? copperNames() : metal === 'zinc' ? [] : gaugeNames()

const refused = (
  code: (typeof THICKNESS_REFUSALS)[number],
  cures: readonly string[],
): ThicknessResult => ({ ok: false, code, cures })

const listed = (nominal: NominalThickness | null, metal: Metal): ThicknessResult =>
  nominal === null ? refused('notListed', listedNames(metal)) : { ok: true, nominal }

/** A thickness by its own measure: `.032`, `1/32`, `0.7 mm`. A bare number is in inches. */
const byMeasure = (metal: Metal, name: string): ThicknessResult => {
  const length = parseLength(name, 'inches')
  if (!length.ok) return refused('notAThickness', length.cures)
  if (length.inches <= 0) return refused('notAThickness', [])
  if (!sheetSchema.shape.thickness.safeParse(length.inches).success) {
    // `24` alone is 24 inches; whoever types it means the gauge.
    return refused(
      'tooThick',
      listedNames(metal).filter((one) => one.split(' ', 1)[0] === name),
    )
  }
  return {
    ok: true,
    nominal: {
      thickness: length.inches,
      least: null,
      most: null,
      poundsPerSquareFoot: weightPerSquareFoot(metal, length.inches),
    },
  }
}

/**
 * The nominal thickness in inches that the trade's name for a sheet stands for, with its limits
 * and its pounds per square foot. One gauge is another thickness in every metal. Never throws.
 */
export const nominalThickness = ({ metal, finish, name }: NamedThickness): ThicknessResult => {
  const plain = name.trim()
  const gauge = GAUGE.exec(plain)?.[1]
  if (gauge !== undefined) {
    const system = systemOf(metal, finish)
    return system === null
      ? refused('notOfThisMetal', listedNames(metal))
      : listed(findGauge(system, Number(gauge)), metal)
  }
  const ounces = OUNCES.exec(plain)?.[1]
  if (ounces !== undefined) {
    return metal === 'copper'
      ? listed(findCopper(Number(ounces)), metal)
      : refused('notOfThisMetal', listedNames(metal))
  }
  return byMeasure(metal, plain)
}

/** `noLimits`: nothing to judge by. */
export type ThicknessVerdict = 'within' | 'tooThin' | 'tooThick' | 'noLimits'

/**
 * Judges a thickness measured in inches, coating included and paint not, against the limits of
 * the sheet's name. Copper has a least thickness only and is never found too thick. Throws
 * RangeError where `measured` is not a positive number.
 */
export const judgeThickness = (
  { least, most }: Pick<NominalThickness, 'least' | 'most'>,
  measured: Inches,
): ThicknessVerdict => {
  if (!(measured > 0 && Number.isFinite(measured))) {
    throw new RangeError(`The measured thickness must be over 0 in., not ${measured}.`)
  }
  if (least !== null && isLess(measured, least)) return 'tooThin'
  if (most !== null && isLess(most, measured)) return 'tooThick'
  return least === null && most === null ? 'noLimits' : 'within'
}
