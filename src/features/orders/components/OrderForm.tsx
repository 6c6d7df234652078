import { Fragment, useEffect, useRef, useState, type ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { Notice } from '@/components/Notice'
import { GoodsSection } from '@/features/roof-line/components/GoodsSection'
import { linesOfRoofLine } from '@/features/roof-line/model/use-pieces'
import { newKey } from '@/lib/api/idempotency'
import { nextMark, type DraftLine } from '../draft/order-draft'
import type { OrderDraftHandle } from '../draft/useOrderDraft'
import { checkLine, type LineGround } from '../form/check-line'
import { faultAt, faultsElsewhere } from '../form/order-faults'
import { useFaultWords } from '../form/useFaultWords'
import type { OrderFormState } from '../form/useOrderForm'
import { DeliveryNotice } from './DeliveryNotice'
import { DraftLineCard } from './DraftLineCard'
import { DraftTroubles } from './DraftTroubles'
import { OrderCaution } from './OrderCaution'
import { OrderFields } from './OrderFields'
import { OrderReview } from './OrderReview'

interface Props {
  readonly id: string
  readonly handle: OrderDraftHandle
  readonly state: OrderFormState
  readonly ground: LineGround
  readonly boardPath: (lineKey: string) => string
  readonly arrivedAt: { readonly to: string; readonly label: string }
  readonly question?: string
  /** How more lines are added: links to board and shelf. */
  readonly more: ReactNode
  readonly onDrop: () => void
  readonly onSendAnother?: () => void
}

interface Removed {
  readonly line: DraftLine
  readonly at: number
}

interface Covered {
  /** The line that the first pieces of the roof line were put into. */
  readonly key: string
  readonly before: readonly DraftLine[]
  /** It can be taken back for as long as nothing else was changed since. */
  readonly after: readonly DraftLine[]
}

/** The very same items, one by one. */
const isUnchanged = (after: readonly unknown[], now: readonly unknown[]): boolean =>
  after.length === now.length && after.every((item, index) => item === now[index])

/** An order being written or amended: its lines, what belongs to the whole, and the last look. */
export function OrderForm({
  id,
  handle,
  state,
  ground,
  boardPath,
  arrivedAt,
  question,
  more,
  onDrop,
  onSendAnother,
}: Props) {
  const { t } = useTranslation('orders')
  const words = useFaultWords()
  const { draft } = handle
  const { faults, delivery, presses } = state
  const form = useRef<HTMLFormElement>(null)
  const [removed, setRemoved] = useState<Removed | null>(null)
  const [covered, setCovered] = useState<Covered | null>(null)
  const linesFault = words(faultAt(faults, 'lines'))
  const checked = draft.lines.map((line) => ({ line, answer: checkLine(line, ground) }))
  const ended = checked.flatMap(({ line, answer: { profile, drawnIn } }) =>
    drawnIn ? [{ ...line, profile, sheet: drawnIn.sheet }] : [],
  )
  const counted = checked.flatMap(({ line, answer: { stock, check } }) =>
    stock && check?.strip ? [{ line, stock, girth: check.strip.girth }] : [],
  )

  // A press that found something missing leads to the first of it.
  useEffect(() => {
    if (presses === 0) return
    const first = form.current?.querySelector<HTMLElement>('[aria-invalid="true"], [role="alert"]')
    first?.scrollIntoView({ block: 'center' })
    first?.focus({ preventScroll: true })
  }, [presses])

  return (
    <form
      id={id}
      ref={form}
      noValidate
      className="flex flex-col gap-6"
      onSubmit={(event) => {
        event.preventDefault()
        if (!draft.sending) state.submit()
      }}
    >
      <DraftTroubles {...handle} />
      <DeliveryNotice
        sending={draft.sending}
        delivery={delivery}
        elsewhere={faultsElsewhere(faults, draft)}
        arrivedAt={arrivedAt}
        onStop={state.stop}
        onDrop={onDrop}
        onSendAnother={onSendAnother}
      />
      {draft.lines.map((line, index) => (
        <Fragment key={line.key}>
          <DraftLineCard
            line={line}
            index={index}
            lines={draft.lines}
            ended={ended}
            ground={ground}
            faults={faults}
            disabled={draft.sending}
            boardPath={boardPath(line.key)}
            onChange={(patch) => handle.updateLine(line.key, patch)}
            onCover={(lines) => {
              const [first = line] = linesOfRoofLine(line, draft.lines)
              setCovered({ key: first.key, before: draft.lines, after: lines })
              handle.setLines(lines)
            }}
            onDuplicate={() =>
              // A copy covers nothing yet: it would be replaced with the roof line it was copied from.
              handle.addLine(
                { ...line, key: newKey(), mark: nextMark(draft), covers: null },
                index + 1,
              )
            }
            onRemove={() => {
              setRemoved({ line, at: index })
              handle.removeLine(line.key)
            }}
          />
          {covered?.key === line.key && isUnchanged(covered.after, draft.lines) && (
            <Notice kind="info">
              <span className="flex flex-wrap items-center justify-between gap-3">
                {t('line.covered')}
                <Button
                  onClick={() => {
                    handle.setLines(covered.before)
                    setCovered(null)
                  }}
                >
                  {t('line.coveredUndo')}
                </Button>
              </span>
            </Notice>
          )}
        </Fragment>
      ))}
      {removed && (
        <Notice kind="info">
          <span className="flex flex-wrap items-center justify-between gap-3">
            {t('line.removed', { mark: removed.line.mark, name: removed.line.name })}
            <Button
              onClick={() => {
                handle.addLine(removed.line, removed.at)
                setRemoved(null)
              }}
            >
              {t('line.undo')}
            </Button>
          </span>
        </Notice>
      )}
      {linesFault && <Notice kind="error">{linesFault}</Notice>}
      {!draft.sending && <div className="flex flex-wrap gap-3">{more}</div>}
      <GoodsSection
        goods={draft.goods}
        lines={counted}
        stocks={ground.stocks}
        faults={faults}
        disabled={draft.sending}
        onChange={handle.setGoods}
      />
      <div className="flex max-w-[59rem] flex-col gap-6 border-t-2 border-ink pt-4">
        <OrderFields
          draft={draft}
          today={state.today}
          faults={faults}
          disabled={draft.sending}
          question={question}
          onChange={handle.setFields}
        />
        <OrderReview draft={draft} ground={ground} />
        <OrderCaution />
      </div>
    </form>
  )
}
