import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { GOOD_KINDS, type GoodKind, type GoodUnit } from '#shared/roof-line/goods.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { Button } from '@/components/Button'
import { Notice } from '@/components/Notice'
import { Select } from '@/components/Select'
import type { DraftGood } from '@/features/orders/draft/order-draft'
import { faultAt, type Fault } from '@/features/orders/form/order-faults'
import { useFaultWords } from '@/features/orders/form/useFaultWords'
import { newKey } from '@/lib/api/idempotency'
import type { CountedLine } from '../model/count-goods'
import { withCounted } from '../model/count-goods'
import { CountGoods } from './CountGoods'
import { GoodRow } from './GoodRow'

interface Props {
  readonly goods: readonly DraftGood[]
  readonly lines: readonly CountedLine[]
  readonly stocks: readonly Stock[]
  readonly faults: readonly Fault[]
  readonly disabled: boolean
  readonly onChange: (goods: readonly DraftGood[]) => void
}

interface Undo {
  readonly before: readonly DraftGood[]
  readonly after: readonly DraftGood[]
}

const UNIT_OF: Record<GoodKind, GoodUnit> = {
  fasteners: 'each',
  butylTape: 'foot',
  closures: 'each',
  rivets: 'each',
  sealant: 'tube',
  touchUpPaint: 'bottle',
}

/** The small goods of an order: counted from its lines, changed, added or taken out by hand. */
export function GoodsSection({ goods, lines, stocks, faults, disabled, onChange }: Props) {
  const { t } = useTranslation('goods')
  const words = useFaultWords()
  const [counting, setCounting] = useState(false)
  const [undo, setUndo] = useState<Undo | null>(null)
  // For as long as nothing else was changed since.
  const canUndo =
    undo?.after.length === goods.length && undo.after.every((good, index) => good === goods[index])
  const error = words(faultAt(faults, 'goods'))

  function change(next: readonly DraftGood[]) {
    setUndo({ before: goods, after: next })
    onChange(next)
  }

  return (
    <section
      aria-label={t('title')}
      className="flex max-w-[59rem] flex-col gap-3 border-t-2 border-ink pt-4"
    >
      <h3 className="font-bold">{t('title')}</h3>
      {goods.length === 0 && <p className="text-scribe">{t('none')}</p>}
      {goods.length > 0 && (
        <ul className="grid gap-x-10 divide-y divide-rule border-y border-rule lg:grid-cols-2 lg:divide-y-0">
          {goods.map((good, index) => (
            <GoodRow
              key={good.key}
              good={good}
              stocks={stocks}
              disabled={disabled}
              errors={{
                quantity: words(faultAt(faults, `goods.${index}.quantity`)),
                note: words(faultAt(faults, `goods.${index}.note`)),
                stockId: words(faultAt(faults, `goods.${index}.stockId`)),
              }}
              onChange={(changed) =>
                onChange(goods.map((each) => (each.key === good.key ? changed : each)))
              }
              onRemove={() => change(goods.filter(({ key }) => key !== good.key))}
            />
          ))}
        </ul>
      )}
      {error && <Notice kind="error">{error}</Notice>}
      {undo && canUndo && !disabled && (
        <Button
          className="self-start"
          onClick={() => {
            onChange(undo.before)
            setUndo(null)
          }}
        >
          {t('undo')}
        </Button>
      )}
      {!disabled && (
        <div className="flex flex-wrap items-end gap-3">
          <Select
            label={t('add')}
            className="min-w-48"
            placeholder={t('addChoose')}
            value=""
            options={GOOD_KINDS.map((kind) => ({ value: kind, label: t(`kind.${kind}`) }))}
            onChange={(event) => {
              const kind = GOOD_KINDS.find((known) => known === event.target.value)
              if (!kind) return
              const good: DraftGood = {
                key: newKey(),
                kind,
                quantity: 1,
                unit: UNIT_OF[kind],
                stockId: null,
                note: '',
              }
              onChange([...goods, good])
            }}
          />
          <Button aria-expanded={counting} onClick={() => setCounting(!counting)}>
            {counting ? t('countClose') : t('count')}
          </Button>
        </div>
      )}
      {counting && !disabled && (
        <CountGoods
          lines={lines}
          stocks={stocks}
          onUse={(counted) => {
            change(withCounted(goods, counted, newKey))
            setCounting(false)
          }}
        />
      )}
    </section>
  )
}
