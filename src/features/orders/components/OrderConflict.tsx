import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Order } from '#shared/orders/order.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { Button } from '@/components/Button'
import { ProfileThumb } from '@/features/drawing/figure/ProfileThumb'
import { useEndWords } from '@/features/ends/useEndWords'
import { useUnits } from '@/features/people/useUnits'
import { GoodsList } from '@/features/roof-line/components/GoodsList'
import { useFormats } from '@/lib/format/useFormats'
import type { DraftLine, OrderDraft } from '../draft/order-draft'
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
      <table className="w-full table-fixed border-t-2 border-ink">
        <caption className="sr-only">{t('conflict.table')}</caption>
        <thead>
          <tr className="border-b border-rule text-left">
            <th scope="col" className="py-2 pr-4">
              {t('conflict.mine')}
            </th>
            <th scope="col" className="py-2">
              {t('conflict.theirs')}
            </th>
          </tr>
        </thead>
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
                <LineCell line={mine} stock={stocks.find(({ id }) => id === mine.stockId)} />
              ) : (
                none
              )
            }
            theirs={theirs ? <LineCell line={theirs} stock={theirs.stock} /> : none}
          />
        ))}
        {(draft.goods.length > 0 || order.goods.length > 0) && (
          <Row
            label={t('goods:title')}
            differs={difference.goods}
            mine={draft.goods.length > 0 ? <GoodsList goods={draft.goods} stocks={stocks} /> : none}
            theirs={
              order.goods.length > 0 ? <GoodsList goods={order.goods} stocks={stocks} /> : none
            }
          />
        )}
      </table>
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
    <tbody className="border-b border-rule align-top">
      <tr>
        <th
          scope="rowgroup"
          colSpan={2}
          className="pt-2 text-left text-small font-normal text-scribe"
        >
          {label}
          {differs && <span className="font-semibold text-chalk"> · {t('conflict.differs')}</span>}
        </th>
      </tr>
      <tr>
        <td className="pr-4 pb-2">{mine}</td>
        <td className="pb-2">{theirs}</td>
      </tr>
    </tbody>
  )
}

interface LineCellProps {
  readonly line: Pick<
    DraftLine,
    'name' | 'profile' | 'quantity' | 'length' | 'ends' | 'hands' | 'statedGirth'
  >
  readonly stock: Stock | undefined
}

function LineCell({ line, stock }: LineCellProps) {
  const { t } = useTranslation('orders')
  const { run, size } = useUnits()
  const words = useEndWords()
  const { name, profile, quantity, length, ends, hands, statedGirth } = line
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
        {hands && ` · ${words.hands(hands)}`}
      </span>
      {ends && (
        <span className="block text-small">
          {words.ends(ends)}
          {ends.lowEnd !== null && ` · ${words.run(ends.lowEnd)}`}
        </span>
      )}
      {statedGirth !== null && (
        <span className="block text-small">
          {t('girth.stated', { girth: size(statedGirth, 32) })}
        </span>
      )}
      {stock && (
        <span className="text-small">
          <StockName stock={stock} />
        </span>
      )}
    </>
  )
}
