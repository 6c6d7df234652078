import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { Link, useParams } from 'react-router-dom'
import type { Place } from '#shared/access/permissions'
import { orderNumber } from '#shared/orders/order.schema'
import type { Piece } from '#shared/pieces/pieces.contract'
import { paths } from '@/app/paths'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { LabelHistory } from '@/features/labels/components/LabelHistory'
import { PrintLabels } from '@/features/labels/components/PrintLabels'
import { useUnits } from '@/features/people/useUnits'
import { pieceQuery } from '@/features/pieces/api/pieces.queries'
import { PieceHistory } from '@/features/pieces/components/PieceHistory'
import { PieceStateWord } from '@/features/pieces/components/PieceStateWord'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { usePlace } from '@/pages/shell/place-context'

/** The page of its order in the places that have one. */
const ORDER_PATHS: Partial<Record<Place, (orderId: string) => string>> = {
  roof: paths.roof.order,
  counter: paths.counter.order,
}

/** One piece with everything that happened to it; the same page in every place. */
export function PiecePage() {
  const { t } = useTranslation('pieces')
  const { code = '' } = useParams()
  const place = usePlace()
  const piece = useQuery(pieceQuery(code))
  const orderPath = ORDER_PATHS[place]
  const back =
    piece.data && orderPath
      ? { to: orderPath(piece.data.orderId), label: t('backToOrder') }
      : { to: paths.place(place), label: t('back') }
  return (
    <PlaceFrame
      title={
        piece.data
          ? t('title', {
              mark: piece.data.mark,
              sequence: piece.data.sequence,
              quantity: piece.data.quantity,
            })
          : t('piece')
      }
      subtitle={piece.data?.name}
      back={back}
    >
      {piece.data ? (
        <PieceSheet piece={piece.data} place={place} />
      ) : piece.error ? (
        <ErrorState error={piece.error} onRetry={() => void piece.refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}

function PieceSheet({ piece, place }: { readonly piece: Piece; readonly place: Place }) {
  const { t } = useTranslation('pieces')
  const { run } = useUnits()
  const lies =
    piece.bundleCode === null
      ? null
      : piece.rackPlace === null
        ? piece.bundleCode
        : t('bundleAt', { code: piece.bundleCode, place: piece.rackPlace })
  const facts = [
    { label: t('code'), value: piece.code, figure: true },
    { label: t('length'), value: run(piece.length), figure: true },
    ...(piece.hand === null
      ? []
      : [{ label: t('hand'), value: t(`handOf.${piece.hand}`), figure: true }]),
    ...(piece.lowEnd === null
      ? []
      : [{ label: t('lowEnd'), value: t(`sideOf.${piece.lowEnd}`), figure: false }]),
    { label: t('order'), value: orderNumber(piece.orderNumber), figure: true },
    { label: t('job'), value: piece.job, figure: false },
    { label: t('company'), value: piece.company, figure: false },
    { label: t('run'), value: String(piece.runNumber), figure: true },
    ...(lies === null ? [] : [{ label: t('bundle'), value: lies, figure: true }]),
  ]
  return (
    <div className="flex max-w-3xl flex-col gap-6">
      <p className="text-title">
        <PieceStateWord state={piece.state} />
      </p>
      <dl className="grid gap-x-8 gap-y-2 sm:grid-cols-2">
        {facts.map(({ label, value, figure }) => (
          <div key={label} className="flex justify-between gap-4 border-b border-rule py-1">
            <dt className="text-scribe">{label}</dt>
            <dd className={figure ? 'text-right font-figure' : 'text-right'}>{value}</dd>
          </div>
        ))}
      </dl>
      <Replacement word={t('remakeOf')} code={piece.remakeOf} place={place} />
      <Replacement word={t('remadeAs')} code={piece.remadeAs} place={place} />
      {piece.state !== 'scrapped' && piece.state !== 'withdrawn' && (
        <PrintLabels of={{ kind: 'piece', code: piece.code }} />
      )}
      <section aria-labelledby="history">
        <h2 id="history" className="mb-2 font-bold">
          {t('history')}
        </h2>
        <PieceHistory events={piece.events} />
        <LabelHistory code={piece.code} />
      </section>
    </div>
  )
}

interface ReplacementProps {
  readonly word: string
  readonly code: string | null
  readonly place: Place
}

function Replacement({ word, code, place }: ReplacementProps) {
  if (code === null) return null
  return (
    <p>
      {word}{' '}
      <Link
        to={paths.piece(place, code)}
        className="inline-flex min-h-target items-center font-figure underline"
      >
        {code}
      </Link>
    </p>
  )
}
