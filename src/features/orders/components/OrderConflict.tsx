import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Order } from '#shared/orders/order.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { Button } from '@/components/Button'
import { ProfileThumb } from '@/features/drawing/figure/ProfileThumb'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'
import type { OrderDraft } from '../draft/order-draft'
import { compareOrders } from '../form/compare-orders'
import { StockName } from './StockName'

interface Props {
  readonly draft: OrderDraft
  readonly order: Order
  readonly stocks: readonly Stock[]
  readonly onKeepMine: () => void
  readonly onTakeTheirs: () => void
}

/** The order was changed while it was being amended here: both versions beside each other. */
export function OrderConflict({ draft, order, stocks, onKeepMine, onTakeTheirs }: Props) {
  const { t } = useTranslation('orders')
  const { day, moment } = useFormats()
  const difference = compareOrders(draft, order)
  const last = order.events.at(-1)
  const none = <span className="text-scribe">{t('conflict.none')}</span>
  return (
    <section aria-labelledby="conflict" className="flex flex-col gap-4">
      <h2 id="conflict" className="text-title font-bold text-chalk">
        {t('conflict.title')}
      </h2>
      <p>
        {last && `${t(`event.${last.kind}`, { name: last.by })}, ${moment(last.at)}. `}
        {t('conflict.meaning')}
      </p>
      <div role="table" aria-label={t('conflict.table')} className="border-t-2 border-ink">
        <div role="row" className="grid grid-cols-2 gap-4 border-b border-rule py-2 font-bold">
          <span role="columnheader">{t('conflict.mine')}</span>
          <span role="columnheader">{t('conflict.theirs')}</span>
        </div>
        <Row
          label={t('form.neededBy')}
          differs={difference.neededBy}
          mine={draft.neededBy === '' ? none : day(draft.neededBy)}
          theirs={day(order.neededBy)}
        />
        <Row
          label={t('form.poNumber')}
          differs={difference.poNumber}
          mine={draft.poNumber || none}
          theirs={order.poNumber || none}
        />
        <Row
          label={t('form.notes')}
          differs={difference.notes}
          mine={draft.notes || none}
          theirs={order.notes || none}
        />
        {difference.lines.map(({ mine, theirs, differs }) => (
          <Row
            key={mine?.key ?? theirs?.id}
            label={t('conflict.line', { mark: mine?.mark ?? theirs?.mark ?? '' })}
            differs={differs}
            mine={
              mine ? (
                <LineCell {...mine} stock={stocks.find(({ id }) => id === mine.stockId)} />
              ) : (
                none
              )
            }
            theirs={theirs ? <LineCell {...theirs} /> : none}
          />
        ))}
      </div>
      <div className="grid grid-cols-2 gap-4">
        <Button onClick={onKeepMine}>{t('conflict.keepMine')}</Button>
        <Button onClick={onTakeTheirs}>{t('conflict.takeTheirs')}</Button>
      </div>
    </section>
  )
}

interface RowProps {
  readonly label: string
  readonly differs: boolean
  readonly mine: ReactNode
  readonly theirs: ReactNode
}

function Row({ label, differs, mine, theirs }: RowProps) {
  const { t } = useTranslation('orders')
  return (
    <div role="row" className="border-b border-rule py-2">
      <p role="rowheader" className="text-small text-scribe">
        {label}
        {differs && <span className="font-semibold text-chalk"> · {t('conflict.differs')}</span>}
      </p>
      <div className="grid grid-cols-2 gap-4" role="presentation">
        <div role="cell">{mine}</div>
        <div role="cell">{theirs}</div>
      </div>
    </div>
  )
}

interface LineCellProps {
  readonly name: string
  readonly profile: Profile
  readonly stock: Stock | undefined
  readonly quantity: number | null
  readonly length: number | null
}

function LineCell({ name, profile, stock, quantity, length }: LineCellProps) {
  const { run } = useUnits()
  return (
    <>
      <span className="block">{name}</span>
      {stock && (
        <ProfileThumb
          profile={profile}
          stock={stock}
          title={name}
          width={160}
          height={96}
          className="h-auto max-w-full"
        />
      )}
      <span className="block font-figure text-small">
        {quantity ?? '?'} × {length === null ? '?' : run(length)}
      </span>
      {stock && (
        <span className="text-small">
          <StockName stock={stock} />
        </span>
      )}
    </>
  )
}
