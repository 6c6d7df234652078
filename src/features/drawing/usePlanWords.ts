import { useTranslation } from 'react-i18next'
import type { Plan, PlanCheck, PlanCure, PlanReason, PlanStep } from '#shared/bend-plan/plan.schema'
import { reasonText } from '#shared/bend-plan/reason-text'
import type { Fold } from '#shared/strip/strip.schema'
import { printAngle } from '#shared/units/angle'
import { printSize } from '#shared/units/print-length'
import { usePerson } from '@/features/people/person-context'

/** A plan in words: which fold, why not, what would cure it, how each hit is made. */
export function usePlanWords() {
  const { t } = useTranslation('plan')
  const { units } = usePerson()

  const fold = (bend: Fold): string =>
    typeof bend === 'number' ? t('fold.bend', { number: bend }) : t(`fold.${bend}`)

  const inches = (value: number) => printSize(value, units, 32)

  function reason(given: PlanReason): string {
    const { key, unit, overlap } = reasonText(given)
    const print = (value: number | null) =>
      value === null || unit === null
        ? ''
        : unit === 'degrees'
          ? printAngle(value)
          : thickness(given, value)
    return t(`reason.${key}`, {
      bend: given.bend === null ? '' : fold(given.bend),
      found: print(given.found),
      limit: print(given.limit),
      overlap: overlap === null ? '' : inches(overlap),
      edge: given.edge ?? '',
    })
  }

  /** A sheet's thickness is read in thousandths, everything else off a tape. */
  const thickness = ({ code }: PlanReason, value: number) =>
    code === 'thickness' ? printSize(value, units === 'mm' ? 'mm' : 'decimal') : inches(value)

  const reasons = ({ reasons: given }: Plan): string[] => given.map(reason)

  const cure = ({ code, bend, leg, value }: PlanCure): string =>
    t(`cure.${code}`, {
      bend: bend === null ? '' : fold(bend),
      leg: leg ?? '',
      value:
        value === null
          ? ''
          : code === 'openAngle'
            ? printAngle(180 - Math.abs(value))
            : inches(value),
    })

  const checks = (made: readonly PlanCheck[]): string =>
    t('checksMade', { checks: made.map((check) => t(`check.${check}`)).join(', ') })

  const gauge = ({ restsOn }: PlanStep): string =>
    restsOn === null ? t('noGauge') : t(`restsOn.${restsOn}`)

  return { fold, reason, reasons, cure, checks, gauge }
}
