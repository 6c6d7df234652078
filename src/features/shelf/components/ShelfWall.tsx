import { useId } from 'react'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { ShelfCard } from './ShelfCard'

interface Props {
  readonly title: string
  readonly items: readonly ShelfProfile[]
  readonly stock: Stock
  readonly pitchRise: number | null
  readonly pathOf: (item: ShelfProfile) => string
}

export function ShelfWall({ title, items, stock, pitchRise, pathOf }: Props) {
  const id = useId()
  return (
    <section aria-labelledby={id}>
      <h2 id={id} className="mb-2 font-bold">
        {title}
      </h2>
      <ul className="grid grid-cols-2 gap-2 sm:grid-cols-3 lg:grid-cols-5 xl:grid-cols-6">
        {items.map((item) => (
          <ShelfCard
            key={item.id}
            item={item}
            to={pathOf(item)}
            stock={stock}
            pitchRise={pitchRise}
          />
        ))}
      </ul>
    </section>
  )
}
