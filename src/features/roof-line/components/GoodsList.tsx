import type { Good } from '#shared/roof-line/goods.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { useGoodWords } from '../useGoodWords'

type Shown = Omit<Good, 'quantity'> & { readonly quantity: number | null }

interface Props {
  readonly goods: readonly Shown[]
  readonly stocks: readonly Pick<Stock, 'id' | 'colorName'>[]
}

/** Small goods to be read. */
export function GoodsList({ goods, stocks }: Props) {
  const words = useGoodWords(stocks)
  return (
    <ul className="divide-y divide-rule border-y border-rule">
      {goods.map((good, index) => (
        <li key={index} className="flex flex-wrap items-baseline gap-x-4 py-1.5">
          <span className="min-w-40 flex-1">{words.name(good)}</span>
          <span className="font-figure whitespace-nowrap">{words.amount(good)}</span>
          {good.note !== '' && (
            <span className="basis-full text-small text-scribe">{good.note}</span>
          )}
        </li>
      ))}
    </ul>
  )
}
