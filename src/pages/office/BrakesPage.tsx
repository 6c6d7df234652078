import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import { printAngle } from '#shared/units/angle'
import { EmptyState } from '@/components/EmptyState'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { brakesQuery } from '@/features/brakes/api/brakes.queries'
import { useUnits } from '@/features/people/useUnits'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'

const column = columnsOf<ShopBrake>()

const figure = { figure: true, align: 'end' } as const

export function BrakesPage() {
  const { t } = useTranslation('office')
  const { run, size } = useUnits()
  const { data, error, refetch } = useQuery(brakesQuery())
  const columns = useMemo(
    () =>
      column.columns([
        column.accessor(({ brake }) => brake.name, { id: 'name', header: t('brakes.name') }),
        column.accessor(({ brake }) => t(brake.down ? 'brakes.bothWays' : 'brakes.upOnly'), {
          id: 'folds',
          header: t('brakes.folds'),
        }),
        column.accessor(({ brake }) => run(brake.length), {
          id: 'length',
          header: t('brakes.length'),
          meta: figure,
        }),
        column.accessor(({ brake }) => printAngle(brake.maxFold), {
          id: 'maxFold',
          header: t('brakes.maxFold'),
          meta: figure,
        }),
        column.accessor(({ brake }) => size(brake.minFlange), {
          id: 'minFlange',
          header: t('brakes.minFlange'),
          meta: figure,
        }),
        column.accessor(({ brake }) => size(brake.minClamp), {
          id: 'minClamp',
          header: t('brakes.minClamp'),
          meta: figure,
        }),
        column.accessor(({ brake }) => `${size(brake.hemMin)} – ${size(brake.hemMax)}`, {
          id: 'hems',
          header: t('brakes.hems'),
          meta: figure,
        }),
        column.accessor(({ brake }) => size(brake.throat), {
          id: 'throat',
          header: t('brakes.throat'),
          meta: figure,
        }),
        column.accessor(
          ({ brake: { gauge } }) =>
            gauge ? `${size(gauge.min)} – ${size(gauge.max)}` : t('brakes.noGauge'),
          { id: 'gauge', header: t('brakes.gauge'), meta: figure },
        ),
      ]),
    [t, run, size],
  )
  return (
    <PlaceFrame title={t('brakes.title')} subtitle={t('brakes.meaning')} nav={<OfficeNav />}>
      <DataTable
        caption={t('brakes.title')}
        captionHidden
        rows={data?.items}
        columns={columns}
        rowId={({ id }) => id}
        error={error}
        onRetry={() => void refetch()}
        empty={<EmptyState title={t('brakes.empty')} hint={t('brakes.emptyHint')} />}
      />
    </PlaceFrame>
  )
}
