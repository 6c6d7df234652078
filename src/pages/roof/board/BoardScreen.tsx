import { useEffect, useRef, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useNavigate, useSearchParams } from 'react-router-dom'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { Job } from '#shared/jobs/jobs.contract'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { paths } from '@/app/paths'
import { EmptyState } from '@/components/EmptyState'
import { ActionButton } from '@/features/drawing/panels/ActionButton'
import { DrawingBoard } from '@/features/drawing/DrawingBoard'
import { completeEnds } from '@/features/ends/model/draft-end'
import { useBoard } from '@/features/drawing/useBoard'
import { nextMark, PLAIN_LINE } from '@/features/orders/draft/order-draft'
import type { OrderDraftHandle } from '@/features/orders/draft/useOrderDraft'
import { useQuote } from '@/features/prices/useQuote'
import { StockSelect } from '@/features/stocks/StockSelect'
import { newKey } from '@/lib/api/idempotency'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import type { DrawingStart } from './drawing-start'
import { GirthNotice } from './GirthNotice'
import { ShelfButton } from './ShelfButton'

interface Props {
  readonly start: DrawingStart
  readonly draft: OrderDraftHandle
  readonly job: Job
  readonly stocks: readonly Stock[]
  readonly brakes: readonly ShopBrake[]
  /** The order whose amendment is drawn; null for a new order. */
  readonly orderId: string | null
}

/** The length a new line begins with, inches: what most brakes and trucks take. Common practice, no source. */
const USUAL_LENGTH = 120

export function BoardScreen({ start, draft, job, stocks, brakes, orderId }: Props) {
  const { t } = useTranslation('board')
  const { t: starterName } = useTranslation('starters')
  const navigate = useNavigate()
  const { board, dispatch } = useBoard(start.document)
  const { profile } = board.history.present

  const firstStock = draft.draft.lines.at(-1)?.stockId ?? stocks[0]?.id ?? null
  const [stockId, setStockId] = useState(start.line?.stockId ?? firstStock)
  const stock = stocks.find(({ id }) => id === stockId) ?? stocks[0]

  const shelfName = start.shelfProfile
    ? start.shelfProfile.starterKey === null
      ? start.shelfProfile.name
      : starterName(`${start.shelfProfile.starterKey}.name`)
    : null
  const line = useDrawnLine({
    start,
    draft,
    profile,
    stockId: stock?.id ?? null,
    name: shelfName ?? t('newName'),
  })

  const quote = useQuote()
  const pieceLength = line?.length ?? USUAL_LENGTH
  const priceOf = (drawn: Profile) => {
    const ends = line?.ends ? completeEnds(line.ends) : null
    if (!stock || (line?.ends && !ends)) return null
    return quote({
      profile: drawn,
      stockId: stock.id,
      quantity: line?.quantity ?? 1,
      length: pieceLength,
      ends,
    })
  }
  const pitch = `${job.pitchRise}/12`
  const frame = {
    title: line?.name ?? shelfName ?? t('title'),
    subtitle: `${job.name} ${pitch}${line ? ` · ${draft.kept ? t('kept') : t('notKept')}` : ''}`,
    back: { to: paths.roof.job(job.id), label: t('back') },
  }
  if (!stock) {
    return (
      <PlaceFrame {...frame}>
        <EmptyState title={t('noStock')} />
      </PlaceFrame>
    )
  }

  const toOrder = orderId === null ? paths.roof.newOrder(job.id) : paths.roof.amendOrder(orderId)
  return (
    <PlaceFrame
      {...frame}
      fill
      actions={
        <>
          <ActionButton action="undo" board={board} dispatch={dispatch} />
          <ActionButton action="redo" board={board} dispatch={dispatch} />
        </>
      }
    >
      <DrawingBoard
        board={board}
        dispatch={dispatch}
        stock={stock}
        stockSelect={<StockSelect stocks={stocks} value={stock.id} onChange={setStockId} />}
        pieceLength={pieceLength}
        priceOf={priceOf}
        brakes={brakes}
        pitchRise={job.pitchRise}
        finish={{ label: t('finish'), onPress: () => void navigate(toOrder) }}
        toolsEnd={
          <ShelfButton
            profile={profile}
            companyId={job.company.id}
            suggestedName={line?.name ?? shelfName ?? ''}
          />
        }
        notice={
          profile &&
          line !== null &&
          line.statedGirth !== null && (
            <GirthNotice
              profile={profile}
              stated={line.statedGirth}
              selected={board.selection}
              onProfile={(next) =>
                dispatch({ type: 'change', document: { ...board.history.present, profile: next } })
              }
            />
          )
        }
      />
    </PlaceFrame>
  )
}

interface DrawnLine {
  readonly start: DrawingStart
  readonly draft: OrderDraftHandle
  readonly profile: Profile | null
  readonly stockId: string | null
  readonly name: string
}

/**
 * Keeps the drawing in the draft of the order as it is drawn: from the first leg on it has a line
 * of its own, and the address names it, so that a reload opens the same drawing.
 */
function useDrawnLine({ start, draft, profile, stockId, name }: DrawnLine) {
  const [search, setSearch] = useSearchParams()
  const [key] = useState(() => start.line?.key ?? newKey())
  const line = draft.draft.lines.find((known) => known.key === key) ?? null
  const written = useRef<{ profile: Profile | null; stockId: string | null } | null>(
    start.line ? { profile: start.line.profile, stockId: start.line.stockId } : null,
  )

  useEffect(() => {
    if (profile === null) return
    if (written.current?.profile === profile && written.current.stockId === stockId) return
    written.current = { profile, stockId }
    if (line) {
      draft.updateLine(key, { profile, stockId })
    } else {
      const mark = nextMark(draft.draft)
      draft.addLine({ ...PLAIN_LINE, key, mark, name, profile, stockId, length: USUAL_LENGTH })
    }
    if (search.get('line') !== key) {
      const next = new URLSearchParams(search)
      next.delete('shelf')
      next.delete('set')
      next.set('line', key)
      setSearch(next, { replace: true })
    }
  }, [profile, stockId, line, draft, key, name, search, setSearch])

  return line
}
