import { useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { TestBendRecord } from '#shared/stock/stock.contract'
import { includedAngle, printAngle } from '#shared/units/angle'
import { printSize } from '#shared/units/print-length'
import { Button } from '@/components/Button'
import { EmptyState } from '@/components/EmptyState'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'
import { WithdrawBendDialog } from './WithdrawBendDialog'

interface Props {
  readonly stockId: string
  readonly bends: readonly TestBendRecord[]
  readonly mayRecord: boolean
}

const column = columnsOf<TestBendRecord>()
const figure = { figure: true, align: 'end' } as const

/** Every test bend of a stock, those that do not count any more included. */
export function TestBendTable({ stockId, bends, mayRecord }: Props) {
  const { t } = useTranslation('stocks')
  const { size, units } = useUnits()
  const { moment } = useFormats()
  const [leaving, setLeaving] = useState<TestBendRecord | null>(null)
  const columns = useMemo(() => {
    const fine = (inches: number) => printSize(inches, units === 'mm' ? 'mm' : 'decimal')
    return column.columns([
      column.accessor('brakeName', { header: t('testBend.brake') }),
      column.accessor(({ stripWidth }) => size(stripWidth, 64), {
        id: 'strip',
        header: t('testBend.stripWidth'),
        meta: figure,
      }),
      column.accessor(({ legA, legB }) => `${size(legA, 64)} + ${size(legB, 64)}`, {
        id: 'legs',
        header: t('testBend.legs'),
        meta: figure,
      }),
      column.accessor(({ turn }) => printAngle(includedAngle(turn)), {
        id: 'angle',
        header: t('testBend.angle'),
        meta: figure,
      }),
      column.accessor(({ thickness }) => fine(thickness), {
        id: 'thickness',
        header: t('testBend.thicknessField'),
        meta: figure,
      }),
      column.accessor(({ insideRadius }) => (insideRadius === null ? '–' : fine(insideRadius)), {
        id: 'radius',
        header: t('testBend.radius'),
        meta: figure,
      }),
      column.display({
        id: 'by',
        header: t('testBend.by'),
        cell: ({ row: { original } }) => (
          <>
            {original.by}, {moment(original.at)}
            {original.note !== '' && <span className="block text-scribe">{original.note}</span>}
          </>
        ),
      }),
      column.display({
        id: 'counts',
        header: t('testBend.counts'),
        cell: ({ row: { original } }) => {
          if (original.withdrawn) {
            const { by, reason } = original.withdrawn
            return <span className="text-scribe">{t('testBend.withdrawn', { by, reason })}</span>
          }
          return mayRecord ? (
            <Button variant="quiet" onClick={() => setLeaving(original)}>
              {t('testBend.withdraw')}
            </Button>
          ) : (
            t('testBend.yes')
          )
        },
      }),
    ])
  }, [t, size, units, moment, mayRecord])
  return (
    <>
      <div className="overflow-x-auto">
        <DataTable
          caption={t('testBend.list')}
          captionHidden
          rows={[...bends]}
          columns={columns}
          rowId={({ id }) => id}
          empty={<EmptyState title={t('testBend.none')} hint={t('testBend.noneHint')} />}
        />
      </div>
      {leaving && (
        <WithdrawBendDialog stockId={stockId} bend={leaving} onClose={() => setLeaving(null)} />
      )}
    </>
  )
}
