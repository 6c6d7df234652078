import { describe, expect, it } from 'vitest'
import { sheetOn, stockOn } from '#shared/stock/sheet-on'
import type { Stock } from '#shared/stock/stock.schema'
import { STEEL } from '../../support/arbitrary-profile'
import { calibrationOf } from '../../support/shop-factories'

const stock: Stock = {
  id: 'stock',
  thicknessName: '24 ga',
  colorName: 'Kiln 4',
  colorHex: '#8a3b2c',
  painted: true,
  widestStrip: 48,
  longestPiece: 126,
  sheet: STEEL,
  kSource: 'handbookHard',
  paintTBend: null,
  alloy: null,
  calibrations: [calibrationOf('long', 0.44, 0.045), calibrationOf('short', 0.38, 0.02)],
}

describe('the sheet on a brake', () => {
  it('has K and radius that were measured there, and all else of the stock', () => {
    expect(sheetOn(stock, 'short')).toEqual({ ...STEEL, kFactor: 0.38, insideRadius: 0.02 })
  })

  it('is the stock’s own where nothing was measured', () => {
    expect(sheetOn(stock, 'other')).toEqual(STEEL)
    expect(sheetOn({ ...stock, calibrations: [] }, 'long')).toEqual(STEEL)
  })

  it('is kept with the calibration it is by, and is the same when asked for again', () => {
    const frozen = stockOn(stock, 'long')
    expect(frozen.calibrations.map(({ brakeId }) => brakeId)).toEqual(['long'])
    expect(frozen.sheet).toEqual(sheetOn(stock, 'long'))
    expect(stockOn(frozen, 'long')).toEqual(frozen)
    expect(stockOn(stock, 'other')).toEqual({ ...stock, calibrations: [] })
  })
})
