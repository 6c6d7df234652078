/*
 * Thickness of sheet by gauge, 16 to 30, in inches.
 *
 * US Standard: 15 U.S.C. 206, ounces per square foot; the law's thickness is ounces / 640.
 * Manufacturers' Standard (uncoated steel): pounds per square foot / 41.82; also Machinery's
 * Handbook, 31st ed., p. 1453, table 20. Galvanized: coating included, as is what is ordered
 * (ASTM A924); the limits are those of ASTM A653 as tabulated by SMACNA. Stainless and aluminum
 * (Brown & Sharpe): same page of the handbook.
 *
 * The greatest thickness of 25 ga galvanized is printed as 0.0287, which breaks the table's own
 * pattern (nominal + 0.003 below 25 ga, + 0.004 above); it is taken for a misprint and left out.
 */
export interface GaugeRow {
  readonly gauge: number
  /** Ounces per square foot of the US Standard gauge. */
  readonly ounces: number
  readonly manufacturersStandard: number
  readonly galvanized: number
  readonly galvanizedLeast: number
  readonly galvanizedMost: number | null
  readonly stainless: number
  readonly brownSharpe: number
}

type Row = readonly [number, number, number, number, number, number | null, number, number]

const ROWS: readonly Row[] = [
  [16, 40, 0.0598, 0.0635, 0.0575, 0.0695, 0.0625, 0.0508],
  [17, 36, 0.0538, 0.0575, 0.0525, 0.0625, 0.0562, 0.0453],
  [18, 32, 0.0478, 0.0516, 0.0466, 0.0566, 0.05, 0.0403],
  [19, 28, 0.0418, 0.0456, 0.0406, 0.0506, 0.0437, 0.0359],
  [20, 24, 0.0359, 0.0396, 0.0356, 0.0436, 0.0375, 0.032],
  [21, 22, 0.0329, 0.0366, 0.0326, 0.0406, 0.0344, 0.0285],
  [22, 20, 0.0299, 0.0336, 0.0296, 0.0376, 0.0312, 0.0253],
  [23, 18, 0.0269, 0.0306, 0.0266, 0.0346, 0.0281, 0.0226],
  [24, 16, 0.0239, 0.0276, 0.0236, 0.0316, 0.025, 0.0201],
  [25, 14, 0.0209, 0.0247, 0.0217, null, 0.0219, 0.0179],
  [26, 12, 0.0179, 0.0217, 0.0187, 0.0247, 0.0187, 0.0159],
  [27, 11, 0.0164, 0.0202, 0.0172, 0.0232, 0.0172, 0.0142],
  [28, 10, 0.0149, 0.0187, 0.0157, 0.0217, 0.0156, 0.0126],
  [29, 9, 0.0135, 0.0172, 0.0142, 0.0202, 0.0141, 0.0113],
  [30, 8, 0.012, 0.0157, 0.0127, 0.0187, 0.0125, 0.01],
]

export const GAUGE_ROWS: readonly GaugeRow[] = ROWS.map(
  ([gauge, ounces, msg, galvanized, galvanizedLeast, galvanizedMost, stainless, brownSharpe]) => ({
    gauge,
    ounces,
    manufacturersStandard: msg,
    galvanized,
    galvanizedLeast,
    galvanizedMost,
    stainless,
    brownSharpe,
  }),
)

/**
 * Copper sheet by ounces per square foot: nominal and least thickness in inches. Copper
 * Development Association, Architecture Design Handbook, table 1.1.3 (ASTM B370).
 */
export const COPPER_ROWS: readonly {
  readonly ounces: number
  readonly nominal: number
  readonly least: number
}[] = [
  { ounces: 6, nominal: 0.0081, least: 0.0071 },
  { ounces: 8, nominal: 0.0108, least: 0.0097 },
  { ounces: 10, nominal: 0.0135, least: 0.0124 },
  { ounces: 12, nominal: 0.0162, least: 0.015 },
  { ounces: 16, nominal: 0.0216, least: 0.0204 },
  { ounces: 20, nominal: 0.027, least: 0.0258 },
  { ounces: 24, nominal: 0.0323, least: 0.0308 },
  { ounces: 32, nominal: 0.0431, least: 0.0411 },
  { ounces: 48, nominal: 0.0646, least: 0.0621 },
]
