import type { Sheet, Stock } from '#shared/stock/stock.schema'

/** What is known of a stock's sheet, and what a shop learned of it on its brakes. */
export type CalibratedSheet = Pick<Stock, 'sheet' | 'calibrations'>

/**
 * The sheet as it bends on a brake: with K and inside radius of the calibration of that brake where
 * there is one in use, else the stock's own.
 */
export function sheetOn({ sheet, calibrations }: CalibratedSheet, brakeId: string): Sheet {
  const calibration = calibrations.find((each) => each.brakeId === brakeId)
  if (!calibration) return sheet
  const { kFactor, insideRadius } = calibration
  return { ...sheet, kFactor, insideRadius }
}

/**
 * The stock as it is bent on a brake: its sheet is that of `sheetOn`, and of the calibrations the
 * one that it is by is left. To be frozen with what is made of it: where its K comes from can be
 * read back, and asking for the sheet on that brake gives the same sheet again.
 */
export const stockOn = (stock: Stock, brakeId: string): Stock => ({
  ...stock,
  sheet: sheetOn(stock, brakeId),
  calibrations: stock.calibrations.filter((each) => each.brakeId === brakeId),
})
