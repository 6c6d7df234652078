import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { Stock } from '#shared/stock/stock.schema'
import { printSize } from '#shared/units/print-length'
import { paths } from '@/app/paths'
import { ColorChip } from '@/components/ColorChip'
import { EmptyState } from '@/components/EmptyState'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { useUnits } from '@/features/people/useUnits'
import { stocksQuery } from '@/features/stocks/api/stocks.queries'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'

const column = columnsOf<Stock>()

const figure = { figure: true, align: 'end' } as const

export function StocksPage() {
  const { t } = useTranslation('office')
  const { run, size } = useUnits()
  const { data, error, refetch } = useQuery(stocksQuery())
  const columns = useMemo(() => {
    /** Sheets are measured in thousandths, not read off a tape; a tenth of a millimeter is too coarse. */
    const fine = (inches: number) => printSize(inches, 'decimal')
    return column.columns([
      column.display({
        id: 'color',
        header: t('stocks.color'),
        cell: ({ row: { original } }) => (
          <ColorChip hex={original.colorHex} name={original.colorName} />
        ),
      }),
      column.accessor(({ sheet }) => t(`stocks:metal.${sheet.metal}`), {
        id: 'metal',
        header: t('stocks.metal'),
      }),
      column.accessor('thicknessName', { header: t('stocks.name'), meta: { figure: true } }),
      column.accessor(({ sheet }) => fine(sheet.thickness), {
        id: 'thickness',
        header: t('stocks.thickness'),
        meta: figure,
      }),
      column.accessor(({ sheet }) => fine(sheet.insideRadius), {
        id: 'insideRadius',
        header: t('stocks.insideRadius'),
        meta: figure,
      }),
      column.accessor(({ sheet }) => sheet.kFactor.toString(), {
        id: 'kFactor',
        header: t('stocks.kFactor'),
        meta: figure,
      }),
      column.accessor(
        ({ kSource, calibrations }) =>
          calibrations.length > 0
            ? t('stocks.shopBends', { count: calibrations.length })
            : t(`stocks:kSource.${kSource}`),
        { id: 'kSource', header: t('stocks.kSource') },
      ),
      column.accessor(({ sheet }) => `${sheet.springbackPer90}°`, {
        id: 'springback',
        header: t('stocks.springback'),
        meta: figure,
      }),
      column.accessor(({ widestStrip }) => size(widestStrip), {
        id: 'widest',
        header: t('stocks.widest'),
        meta: figure,
      }),
      column.accessor(({ longestPiece }) => run(longestPiece), {
        id: 'longest',
        header: t('stocks.longest'),
        meta: figure,
      }),
    ])
  }, [t, run, size])
  return (
    <PlaceFrame title={t('stocks.title')} subtitle={t('stocks.meaning')} nav={<OfficeNav />}>
      <DataTable
        caption={t('stocks.title')}
        captionHidden
        rows={data?.items}
        columns={columns}
        rowId={({ id }) => id}
        rowLink={({ id }) => paths.office.stock(id)}
        error={error}
        onRetry={() => void refetch()}
        empty={<EmptyState title={t('stocks.empty')} hint={t('stocks.emptyHint')} />}
      />
    </PlaceFrame>
  )
}
