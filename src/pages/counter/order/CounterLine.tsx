import { useId } from 'react'
import { useTranslation } from 'react-i18next'
import type { OrderLine } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { PlanDetails } from '@/features/drawing/plan/PlanDetails'
import { BendsLine } from '@/features/orders/components/LineBends'
import { LineEnds } from '@/features/orders/components/LineEnds'
import { LineFacts } from '@/features/orders/components/LineFacts'
import { LineFigure } from '@/features/orders/components/LineFigure'
import { LineHead } from '@/features/orders/components/LineHead'
import { OverrideNote } from '@/features/orders/components/OverrideNote'
import { PieceCodes } from '@/features/orders/components/PieceCodes'
import { LineReasons } from '@/features/orders/components/RefusedLines'
import { GirthDifference } from '@/features/orders/components/StatedGirth'
import { LinePriceView } from '@/features/prices/components/LinePriceView'
import { StockName } from '@/features/orders/components/StockName'

/** A line as it is checked at the counter: the drawing beside what it takes and what bends it. */
export function CounterLine({
  line,
  sheetPath,
}: {
  readonly line: OrderLine
  readonly sheetPath: string
}) {
  const { t } = useTranslation('drawing')
  const { t: say } = useTranslation('orders')
  const id = useId()
  const { bendsOn, stock, strip, quantity, pieces } = line
  const bends = bendsOn.length > 0
  return (
    <article
      id={`line-${line.id}`}
      aria-labelledby={id}
      className={`flex scroll-mt-4 flex-col gap-4 border-t-2 pt-4 ${bends ? 'border-ink' : 'border-chalk'}`}
    >
      <LineHead
        id={id}
        mark={line.mark}
        name={line.name}
        quantity={quantity}
        hands={line.hands}
        length={line.length}
      />
      <div className="grid gap-x-10 gap-y-3 md:grid-cols-[22.5rem_minmax(0,1fr)]">
        <LineFigure profile={line.profile} stock={stock} strip={strip} name={line.name} />
        <div className="flex flex-col gap-3">
          <StockName stock={stock} />
          <LineFacts strip={strip} pieceWeight={line.pieceWeight} quantity={quantity} />
          <LinePriceView quote={line} />
          <GirthDifference profile={line.profile} stated={line.statedGirth} />
          <LineEnds ends={line.ends} />
          <BendsLine
            good={bends}
            words={
              bends ? t('answer.bendsOn', { brakes: bendsOn.join(', ') }) : t('answer.bendsNowhere')
            }
          >
            {!bends && (
              <div className="mt-1 text-ink">
                <LineReasons line={line} />
              </div>
            )}
          </BendsLine>
          <ButtonLink variant="quiet" className="-mx-1.5 self-start px-1.5!" to={sheetPath}>
            {say('line.sheet')}
          </ButtonLink>
          {line.override && <OverrideNote override={line.override} />}
          {pieces.length === 0 && (
            <PlanDetails profile={line.profile} stock={stock} pieceLength={line.length} />
          )}
        </div>
      </div>
      {pieces.length > 0 && (
        <PieceCodes line={line} piecePath={(code) => paths.piece('counter', code)} />
      )}
    </article>
  )
}
