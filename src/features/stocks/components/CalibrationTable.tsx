import { useTranslation } from 'react-i18next'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { FoldFit } from '#shared/stock/stock.contract'
import type { Calibration, Stock } from '#shared/stock/stock.schema'
import { printSize } from '#shared/units/print-length'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { useMay } from '@/features/people/person-context'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'
import { useCalibrateStock } from '../api/test-bends.mutations'

interface Props {
  readonly stock: Stock
  readonly brakes: readonly ShopBrake[]
  readonly fits: readonly FoldFit[]
}

const isInUse = (fit: FoldFit, used: Calibration | undefined): boolean =>
  used?.kFactor === fit.kFactor && used.insideRadius === fit.insideRadius

/** K and inside radius that each brake is reckoned with, where they came from, and what its bends give. */
export function CalibrationTable({ stock, brakes, fits }: Props) {
  const { t } = useTranslation('stocks')
  const { moment } = useFormats()
  const { units, size } = useUnits()
  const mayCalibrate = useMay('stocks.calibrate')
  const calibrate = useCalibrateStock(stock.id)
  const fine = (inches: number) => printSize(inches, units === 'mm' ? 'mm' : 'decimal')

  return (
    <div className="flex flex-col gap-3">
      <div className="overflow-x-auto">
        <table className="data-table">
          <caption className="sr-only">{t('calibration.title')}</caption>
          <thead>
            <tr>
              <th scope="col">{t('calibration.brake')}</th>
              <th scope="col" data-align="end">
                {t('calibration.k')}
              </th>
              <th scope="col" data-align="end">
                {t('calibration.radius')}
              </th>
              <th scope="col">{t('calibration.from')}</th>
              <th scope="col">{t('calibration.fit')}</th>
            </tr>
          </thead>
          <tbody>
            {brakes.map(({ id, brake }) => {
              const used = stock.calibrations.find(({ brakeId }) => brakeId === id)
              const fit = fits.find(({ brakeId }) => brakeId === id)
              const { kFactor, insideRadius } = used ?? stock.sheet
              return (
                <tr key={id}>
                  <th scope="row" className="text-left font-normal">
                    {brake.name}
                  </th>
                  <td data-align="end" className="font-figure">
                    {kFactor.toFixed(3)}
                  </td>
                  <td data-align="end" className="font-figure">
                    {fine(insideRadius)}
                  </td>
                  <td>
                    {used
                      ? t('calibration.fromBends', {
                          count: used.bends,
                          by: used.by,
                          at: moment(used.at),
                        })
                      : t(`kSource.${stock.kSource}`)}
                  </td>
                  <td>
                    <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
                      {fit ? (
                        <span>
                          {t('calibration.fitGives', {
                            count: fit.bends,
                            k: fit.kFactor.toFixed(3),
                            radius: fine(fit.insideRadius),
                            spread: size(fit.spread, 64),
                          })}
                        </span>
                      ) : (
                        <span className="text-scribe">{t('calibration.noFit')}</span>
                      )}
                      {mayCalibrate && fit && !isInUse(fit, used) && (
                        <Button
                          pending={calibrate.isPending}
                          onClick={() =>
                            calibrate.mutate({
                              brakeId: id,
                              fit: { kFactor: fit.kFactor, insideRadius: fit.insideRadius },
                            })
                          }
                        >
                          {t('calibration.use', { brake: brake.name })}
                        </Button>
                      )}
                      {mayCalibrate && used && (
                        <Button
                          variant="quiet"
                          pending={calibrate.isPending}
                          onClick={() => calibrate.mutate({ brakeId: id, fit: null })}
                        >
                          {t('calibration.back', { brake: brake.name })}
                        </Button>
                      )}
                    </div>
                  </td>
                </tr>
              )
            })}
          </tbody>
        </table>
      </div>
      <ErrorNotice error={calibrate.error} />
      <p className="max-w-[70ch] text-small text-scribe">{t('calibration.meaning')}</p>
    </div>
  )
}
