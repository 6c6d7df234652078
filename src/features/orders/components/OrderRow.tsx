import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import { orderNumber, type OrderState, type OrderSummary } from '#shared/orders/order.schema'
import { useFormats } from '@/lib/format/useFormats'
import { OrderStateWord } from './OrderStateWord'
import { PieceProgress } from './PieceProgress'

/** Nothing can be picked up yet: a day that has passed is a delay. */
const UNFINISHED: readonly OrderState[] = ['submitted', 'question', 'released', 'inWork']

interface Props {
  readonly order: OrderSummary
  readonly to: string
  /** Whose order: for those who see more than one company's. */
  readonly withCompany?: boolean
  /** Left out on the page of the job itself. */
  readonly withJob?: boolean
}

/** An order in a list: the whole row leads to it. */
export function OrderRow({ order, to, withCompany = false, withJob = true }: Props) {
  const { t } = useTranslation('orders')
  const { day, daysUntil, count } = useFormats()
  const { number, job, company, state, neededBy, poNumber, pieceCount, progress } = order
  const late = UNFINISHED.includes(state) && daysUntil(neededBy) < 0
  const facts = [
    t('row.pieces', { count: pieceCount, shown: count(pieceCount) }),
    ...(poNumber === '' ? [] : [t('row.po', { number: poNumber })]),
  ]
  return (
    <li className="relative flex flex-col gap-1.5 border-b border-rule py-3 hover:bg-ink/5">
      <div className="flex flex-wrap items-center justify-between gap-x-4">
        <Link to={to} className="font-semibold after:absolute after:inset-0">
          <span className="font-figure">{orderNumber(number)}</span>
          {withJob && <span className="ml-3">{job.name}</span>}
        </Link>
        <OrderStateWord state={state} />
      </div>
      <p className="text-small text-scribe">
        <span className={late ? 'font-semibold text-chalk' : ''}>
          {t(late ? 'row.late' : 'row.needed', { day: day(neededBy) })}
        </span>
        {[...facts, ...(withCompany ? [company.name] : [])].map((fact) => ` · ${fact}`)}
      </p>
      <PieceProgress progress={progress} compact />
    </li>
  )
}
