import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { paths } from '@/app/paths'
import { SubNav } from '@/components/SubNav'
import { openOrdersQuery } from '@/features/orders/api/open-orders.queries'
import { isAtCounter, isIncoming } from '@/features/orders/open-orders'
import { useFormats } from '@/lib/format/useFormats'

export function CounterNav() {
  const { t } = useTranslation('counter')
  const { daysUntil } = useFormats()
  const { data: orders } = useQuery(openOrdersQuery())
  return (
    <SubNav
      label={t('nav.name')}
      items={[
        {
          to: paths.counter.incoming(),
          label: t('nav.incoming'),
          count: orders?.filter(isIncoming).length,
          end: true,
        },
        {
          to: paths.counter.handOff(),
          label: t('nav.handOff'),
          count: orders?.filter(isAtCounter).length,
        },
        {
          to: paths.counter.due(),
          label: t('nav.due'),
          count: orders?.filter(({ neededBy }) => daysUntil(neededBy) <= 0).length,
        },
      ]}
    />
  )
}
