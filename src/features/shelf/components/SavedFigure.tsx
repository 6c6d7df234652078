import { useState, type ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Degrees } from '#shared/units/brands'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Select } from '@/components/Select'
import { LineBends } from '@/features/orders/components/LineBends'
import { LineFacts } from '@/features/orders/components/LineFacts'
import { LineFigure } from '@/features/orders/components/LineFigure'
import { checkLine } from '@/features/orders/form/check-line'
import { useOrderGround } from '@/features/orders/form/useOrderGround'

interface Props {
  /** The same object as long as nothing is changed: its plans are kept by it. */
  readonly profile: Profile
  readonly name: string
  /** Rise in 12 that bends which follow the roof are shown for. */
  readonly pitchRise: number
  /** Where leg 1 heads; absent: to the right. */
  readonly heading?: Degrees
  /** Between the figure and what it takes. */
  readonly children?: ReactNode
}

/** A saved profile as a pair of figures, what it takes in a stock, and which brakes bend it or why not. */
export function SavedFigure({ profile, name, pitchRise, heading, children }: Props) {
  const { t } = useTranslation('shelf')
  const { ground, error, retry } = useOrderGround()
  const [stockId, setStockId] = useState<string | null>(null)
  if (error) return <ErrorState error={error} onRetry={retry} />
  if (!ground) return <LoadingState />
  const stock: Stock | undefined =
    ground.stocks.find(({ id }) => id === stockId) ?? ground.stocks[0]
  if (!stock) return <EmptyState title={t('noStock')} />
  const line = { profile, stockId: stock.id, length: null, ends: null }
  const { profile: shown, check, plans } = checkLine(line, { ...ground, pitchRise })
  return (
    <div className="grid gap-x-10 gap-y-3 lg:grid-cols-[22.5rem_minmax(0,34rem)]">
      <LineFigure
        profile={shown}
        stock={stock}
        strip={check?.strip ?? null}
        name={name}
        heading={heading}
      />
      <div className="flex flex-col gap-4">
        {children}
        <LineFacts strip={check?.strip ?? null} />
        <LineBends check={check} plans={plans} />
        <StockChoice stocks={ground.stocks} value={stock.id} onChange={setStockId} />
      </div>
    </div>
  )
}

interface StockChoiceProps {
  readonly stocks: readonly Stock[]
  readonly value: string
  readonly onChange: (stockId: string) => void
}

function StockChoice({ stocks, value, onChange }: StockChoiceProps) {
  const { t } = useTranslation('shelf')
  const { t: words } = useTranslation('stocks')
  return (
    <Select
      label={t('shownIn')}
      value={value}
      options={stocks.map(({ id, colorName, thicknessName, sheet }) => ({
        value: id,
        label: words('line', {
          color: colorName,
          thickness: thicknessName,
          metal: words(`metal.${sheet.metal}`),
        }),
      }))}
      onChange={(event) => onChange(event.target.value)}
    />
  )
}
