import { useId } from 'react'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { ShelfCard } from './ShelfCard'

interface Props {
  readonly title: string
  /** Under a heading of its own kind. */
  readonly within?: boolean
  readonly items: readonly ShelfProfile[]
  readonly stock: Stock
  readonly pitchRise: number | null
  readonly pathOf: (item: ShelfProfile) => string
}

export function ShelfWall({ title, within = false, items, stock, pitchRise, pathOf }: Props) {
  const id = useId()
  const Heading = within ? 'h3' : 'h2'
  return (
    <section aria-labelledby={id}>
      <Heading id={id} className={within ? 'mb-2 text-scribe' : 'mb-2 font-bold'}>
        {title}
      </Heading>
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
