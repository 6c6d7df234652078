import { useId, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'
import { Notice } from '@/components/Notice'
import type { DraftLine, LinePatch } from '../draft/order-draft'
import { faultAt, type Fault } from '../form/order-faults'
import { useFaultWords } from '../form/useFaultWords'
import { checkLine, type LineGround } from '../form/check-line'
import { LineBends } from './LineBends'
import { LineFacts } from './LineFacts'
import { LineAmounts, LineNames } from './LineFields'
import { LineFigure } from './LineFigure'
import { LineHead } from './LineHead'
import { StockName } from './StockName'

interface Props {
  readonly line: DraftLine
  readonly index: number
  readonly ground: LineGround
  readonly faults: readonly Fault[]
  /** While the order is on its way. */
  readonly disabled: boolean
  readonly boardPath: string
  readonly onChange: (patch: LinePatch) => void
  readonly onDuplicate: () => void
  readonly onRemove: () => void
}

const isNamed = ({ mark, name, stockId }: DraftLine): boolean =>
  mark !== '' && name !== '' && stockId !== null

/** One line of an order being written: the drawing, what it takes, how many and how long. */
export function DraftLineCard({
  line,
  index,
  ground,
  faults,
  disabled,
  boardPath,
  onChange,
  onDuplicate,
  onRemove,
}: Props) {
  const { t } = useTranslation('orders')
  const words = useFaultWords()
  const id = useId()
  const checked = checkLine(line, ground)
  // Fields that stood open stay so while they are typed into.
  const [open, setOpen] = useState(() => !isNamed(line))
  const shown =
    open || ['mark', 'name', 'stockId'].some((field) => faultAt(faults, `lines.${index}.${field}`))
  const drawingFault = words(faultAt(faults, `lines.${index}.profile`))
  const { check, drawnIn, stock } = checked

  return (
    <article
      aria-labelledby={id}
      className="flex max-w-[59rem] flex-col gap-3 border-t-2 border-ink pt-4"
    >
      <LineHead
        id={id}
        mark={line.mark}
        name={line.name}
        quantity={line.quantity}
        length={line.length}
      />
      <div className="grid gap-x-10 gap-y-3 lg:grid-cols-[22.5rem_minmax(0,34rem)]">
        {drawnIn && (
          <LineFigure
            profile={checked.profile}
            stock={drawnIn}
            strip={check?.strip ?? null}
            name={line.name}
          />
        )}
        <div className="flex flex-col gap-3">
          <LineFacts
            strip={check?.strip ?? null}
            pieceWeight={line.length === null ? null : (check?.weight ?? null)}
            quantity={line.quantity}
          />
          <LineBends check={check} plans={checked.plans} />
          {drawingFault && <Notice kind="error">{drawingFault}</Notice>}
          {stock && <StockName stock={stock} />}
          <LineAmounts
            line={line}
            index={index}
            faults={faults}
            disabled={disabled}
            onChange={onChange}
          />
          {shown && (
            <div id={`${id}-names`}>
              <LineNames
                line={line}
                index={index}
                stocks={ground.stocks}
                faults={faults}
                disabled={disabled}
                onChange={(patch) => {
                  setOpen(true)
                  onChange(patch)
                }}
              />
            </div>
          )}
          {!disabled && (
            <div className="-mx-1.5 flex flex-wrap">
              <Button
                variant="quiet"
                className="px-1.5!"
                aria-expanded={shown}
                aria-controls={`${id}-names`}
                onClick={() => setOpen(!shown)}
              >
                {shown ? t('line.close') : t('line.change')}
              </Button>
              <ButtonLink variant="quiet" className="px-1.5!" to={boardPath}>
                {t('line.editDrawing')}
              </ButtonLink>
              <Button variant="quiet" className="px-1.5!" onClick={onDuplicate}>
                {t('line.duplicate')}
              </Button>
              <Button variant="quiet" className="px-1.5!" onClick={onRemove}>
                {t('line.remove')}
              </Button>
            </div>
          )}
        </div>
      </div>
    </article>
  )
}
