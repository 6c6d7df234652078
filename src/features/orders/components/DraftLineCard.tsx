import { useId, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'
import { Notice } from '@/components/Notice'
import type { DraftLine, LinePatch } from '../draft/order-draft'
import { faultAt, lineHasFault, type Fault } from '../form/order-faults'
import { useFaultWords } from '../form/useFaultWords'
import { checkLine, type LineGround } from '../form/check-line'
import { LineBends } from './LineBends'
import { LineFacts } from './LineFacts'
import { LineFields } from './LineFields'
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

const isFilledIn = ({ mark, name, stockId, quantity, length }: DraftLine): boolean =>
  mark !== '' && name !== '' && stockId !== null && quantity !== null && length !== null

/** One line of an order being written: the drawing, what it takes, and its fields when asked for. */
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
  const [open, setOpen] = useState(() => !isFilledIn(line))
  const shown = open || lineHasFault(faults, index)
  const drawingFault = words(faultAt(faults, `lines.${index}.profile`))
  const { check, drawnIn, stock } = checked

  return (
    <article aria-labelledby={id} className="flex flex-col gap-3 border-t-2 border-ink pt-4">
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
          {stock && !shown && <StockName stock={stock} />}
          <LineBends check={check} plans={checked.plans} />
          {drawingFault && <Notice kind="error">{drawingFault}</Notice>}
          {shown && (
            <div id={`${id}-fields`}>
              <LineFields
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
            <div className="-mx-2 flex flex-wrap gap-x-1">
              <Button
                variant="quiet"
                className="px-2!"
                aria-expanded={shown}
                aria-controls={`${id}-fields`}
                onClick={() => setOpen(!shown)}
              >
                {shown ? t('line.close') : t('line.change')}
              </Button>
              <ButtonLink variant="quiet" className="px-2!" to={boardPath}>
                {t('line.editDrawing')}
              </ButtonLink>
              <Button variant="quiet" className="px-2!" onClick={onDuplicate}>
                {t('line.duplicate')}
              </Button>
              <Button variant="quiet" className="px-2!" onClick={onRemove}>
                {t('line.remove')}
              </Button>
            </div>
          )}
        </div>
      </div>
    </article>
  )
}
