import { useTranslation } from 'react-i18next'
import { useUnits } from '@/features/people/useUnits'
import type { Fault } from './order-faults'

/** A fault in words; undefined for none, as the fields take it. */
export function useFaultWords(): (fault: Fault | undefined) => string | undefined {
  const { t } = useTranslation('orders')
  const { run } = useUnits()
  return (fault) =>
    fault &&
    t(`fault.${fault.code}`, {
      limit: fault.limit === undefined ? '' : run(fault.limit),
      message: fault.message ?? '',
    })
}
