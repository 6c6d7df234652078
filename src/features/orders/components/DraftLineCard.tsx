import { useId, useState } from 'react'
import { Notice } from '@/components/Notice'
import { EndsPanel } from '@/features/ends/components/EndsPanel'
import type { EndedLine } from '@/features/ends/model/neighbors'
import { LinePriceView } from '@/features/prices/components/LinePriceView'
import { useQuote } from '@/features/prices/useQuote'
import { RoofLinePanel } from '@/features/roof-line/components/RoofLinePanel'
import type { DraftLine, LinePatch } from '../draft/order-draft'
import { checkLine, UNTIL_ENTERED, type LineGround } from '../form/check-line'
import { lineToPrice } from '../form/line-to-price'
import { faultAt, type Fault } from '../form/order-faults'
import { useFaultWords } from '../form/useFaultWords'
import { LineBends } from './LineBends'
import { LineEnds } from './LineEnds'
import { LineFacts } from './LineFacts'
import { LineAmounts, LineNames } from './LineFields'
import { LineFigure } from './LineFigure'
import { LineHead } from './LineHead'
import { LineTools, type LinePanel } from './LineTools'
import { GirthCure, GirthDifference } from './StatedGirth'
import { StockName } from './StockName'

interface Props {
  readonly line: DraftLine
  readonly index: number
  /** All lines of the order: some cover one roof line together, others meet at their ends. */
  readonly lines: readonly DraftLine[]
  readonly ended: readonly EndedLine[]
  readonly ground: LineGround
  readonly faults: readonly Fault[]
  /** While the order is on its way. */
  readonly disabled: boolean
  readonly boardPath: string
  readonly onChange: (patch: LinePatch) => void
  readonly onCover: (lines: DraftLine[]) => void
  readonly onDuplicate: () => void
  readonly onRemove: () => void
}

const isNamed = ({ mark, name, stockId }: DraftLine): boolean =>
  mark !== '' && name !== '' && stockId !== null

const NAME_FIELDS = ['mark', 'name', 'stockId', 'statedGirth']

/** One line of an order being written: the drawing, what it takes, how many, how long, how it ends. */
export function DraftLineCard({
  line,
  index,
  lines,
  ended,
  ground,
  faults,
  disabled,
  boardPath,
  onChange,
  onCover,
  onDuplicate,
  onRemove,
}: Props) {
  const words = useFaultWords()
  const id = useId()
  const checked = checkLine(line, ground)
  const quote = useQuote()
  // Fields that stood open stay so while they are typed into.
  const [panel, setPanel] = useState<LinePanel | null>(() => (isNamed(line) ? null : 'names'))
  const faultOf = (field: string) => words(faultAt(faults, `lines.${index}.${field}`))
  const namesWanted = NAME_FIELDS.some((field) => faultOf(field) !== undefined)
  const namesShown = panel === 'names' || namesWanted
  const { check, drawnIn, stock } = checked
  const drawingFault = faultOf('profile')
  const endsFault = faultOf('ends')

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
        hands={line.hands}
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
          <LinePriceView quote={quote(lineToPrice(line, checked))} />
          <LineBends check={check} plans={checked.plans} />
          {drawingFault && <Notice kind="error">{drawingFault}</Notice>}
          {stock && <StockName stock={stock} />}
          <GirthDifference profile={line.profile} stated={line.statedGirth} />
          <GirthCure
            profile={line.profile}
            stated={line.statedGirth}
            disabled={disabled}
            onProfile={(profile) => onChange({ profile })}
          />
          <LineEnds ends={line.ends} />
          {endsFault && <Notice kind="error">{endsFault}</Notice>}
          <LineAmounts
            line={line}
            index={index}
            faults={faults}
            disabled={disabled}
            onChange={onChange}
          />
        </div>
      </div>
      {!disabled && (
        <LineTools
          id={`${id}-panel`}
          open={panel}
          namesOpen={namesShown}
          canDress={check?.strip !== undefined && check?.strip !== null}
          boardPath={boardPath}
          onOpen={setPanel}
          onDuplicate={onDuplicate}
          onRemove={onRemove}
        />
      )}
      {(panel !== null || namesShown) && (
        <div id={`${id}-panel`} className="flex flex-col gap-6 border-t border-rule pt-4">
          {namesShown && (
            <div className="max-w-xl">
              <LineNames
                line={line}
                index={index}
                stocks={ground.stocks}
                faults={faults}
                disabled={disabled}
                onChange={(patch) => {
                  setPanel('names')
                  onChange(patch)
                }}
              />
            </div>
          )}
          {panel === 'ends' && drawnIn && check?.strip && (
            <EndsPanel
              lineKey={line.key}
              mark={line.mark}
              profile={checked.profile}
              stock={drawnIn}
              strip={check.strip}
              pieceLength={line.length ?? UNTIL_ENTERED}
              ends={line.ends}
              hands={line.hands}
              quantity={line.quantity}
              check={checked.ends}
              pitchRise={ground.pitchRise}
              lines={ended}
              disabled={disabled}
              onEnds={(ends) => onChange({ ends })}
              onHands={onChange}
            />
          )}
          {panel === 'roofLine' && drawnIn && (
            <RoofLinePanel
              line={line}
              lines={lines}
              stock={drawnIn}
              checked={checked}
              ground={ground}
              disabled={disabled}
              onUse={(covered) => {
                setPanel(null)
                onCover(covered)
              }}
            />
          )}
        </div>
      )}
    </article>
  )
}
