import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { Link, useParams } from 'react-router-dom'
import { pieceMark } from '#shared/pieces/piece-mark'
import { rackPlaceSchema, type Bundle } from '#shared/bundles/bundles.contract'
import { orderNumber } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { Dialog } from '@/components/Dialog'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Notice } from '@/components/Notice'
import { TextField } from '@/components/TextField'
import { useMay } from '@/features/people/person-context'
import { useUnits } from '@/features/people/useUnits'
import { PieceStateWord } from '@/features/pieces/components/PieceStateWord'
import { useScanWords } from '@/features/pieces/useScanWords'
import { useMoveBundle, useOpenBundle } from '@/features/rack/api/rack.mutations'
import { bundleQuery } from '@/features/rack/api/rack.queries'
import { LiftWord } from '@/features/rack/components/LiftWord'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

/** One bundle: what is in it, where it lies, how it is lifted. */
export function BundlePage() {
  const { t } = useTranslation('rack')
  const { code = '' } = useParams()
  const bundle = useQuery(bundleQuery(code))
  if (bundle.data) return <OneBundle bundle={bundle.data} />
  return (
    <PlaceFrame
      title={t('bundleTitle', { code })}
      back={{ to: paths.rack.home(), label: t('back') }}
    >
      {bundle.error ? (
        <ErrorState error={bundle.error} onRetry={() => void bundle.refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}

function OneBundle({ bundle }: { readonly bundle: Bundle }) {
  const { t } = useTranslation('rack')
  const { run: length } = useUnits()
  const { moment } = useFormats()
  const words = useScanWords()
  const mayWrite = useMay('bundles.write') && bundle.pickedUpAt === null
  const move = useMoveBundle(bundle.id)
  const open = useOpenBundle(bundle.id)
  const [place, setPlace] = useState(bundle.rackPlace)
  const [reason, setReason] = useState('')
  const [asking, setAsking] = useState<'move' | 'open' | null>(null)
  const parsed = rackPlaceSchema.safeParse(place)
  const close = () => setAsking(null)
  const failed = move.error ?? open.error

  return (
    <PlaceFrame
      title={`B${bundle.number} · ${bundle.code}`}
      subtitle={`${orderNumber(bundle.orderNumber)} · ${bundle.company} · ${bundle.job}`}
      back={{ to: paths.rack.home(), label: t('back') }}
      primary={
        mayWrite && bundle.pieces.length > 0 ? (
          <>
            <Button onClick={() => setAsking('open')}>{t('open')}</Button>
            <Button variant="primary" onClick={() => setAsking('move')}>
              {t('move')}
            </Button>
          </>
        ) : undefined
      }
    >
      <div className="flex max-w-3xl flex-col gap-5">
        {failed && (
          <Notice kind="error">
            {words.ofError(failed).title} {words.ofError(failed).detail}
          </Notice>
        )}
        <dl className="grid grid-cols-[auto_1fr] gap-x-6 gap-y-1">
          <dt className="text-scribe">{t('column.place')}</dt>
          <dd className="font-figure text-title font-bold">{bundle.rackPlace}</dd>
          <dt className="text-scribe">{t('column.weight')}</dt>
          <dd>
            <LiftWord weight={bundle.weight} longest={bundle.longest} />
          </dd>
          <dt className="text-scribe">{t('strappedBy')}</dt>
          <dd>{t('byAt', { name: bundle.by, when: moment(bundle.createdAt) })}</dd>
          {bundle.pickedUpAt !== null && (
            <>
              <dt className="text-scribe">{t('out')}</dt>
              <dd className="text-oxide">{moment(bundle.pickedUpAt)}</dd>
            </>
          )}
        </dl>
        <ul className="divide-y divide-rule border-y border-rule">
          {bundle.pieces.map((piece) => (
            <li key={piece.code} className="flex flex-wrap items-center gap-x-5 py-2">
              <span className="w-20 font-figure font-bold">{pieceMark(piece)}</span>
              <Link
                to={paths.piece('rack', piece.code)}
                className="inline-flex min-h-target items-center font-figure text-dye underline"
              >
                {piece.code}
              </Link>
              <span className="min-w-32 flex-1">{piece.name}</span>
              <span className="font-figure">{length(piece.length)}</span>
              <PieceStateWord state={piece.state} />
            </li>
          ))}
        </ul>
        {bundle.pieces.length === 0 && <p className="text-scribe">{t('emptyBundle')}</p>}
        <p className="text-small text-scribe">{t('caution')}</p>
      </div>
      <Dialog
        open={asking === 'move'}
        title={t('moveTitle')}
        confirm={t('moveConfirm')}
        cancel={t('cancel')}
        pending={move.isPending}
        confirmDisabled={!parsed.success}
        onCancel={close}
        onConfirm={() => parsed.success && move.mutate(parsed.data, { onSettled: close })}
      >
        <TextField
          label={t('place')}
          hint={t('placeHint')}
          value={place}
          error={parsed.success ? undefined : t('placeFault')}
          onChange={(event) => setPlace(event.target.value)}
        />
      </Dialog>
      <Dialog
        open={asking === 'open'}
        title={t('openTitle')}
        confirm={t('openConfirm')}
        confirmVariant="danger"
        cancel={t('cancel')}
        pending={open.isPending}
        confirmDisabled={reason.trim() === ''}
        onCancel={close}
        onConfirm={() => open.mutate({ reason: reason.trim() }, { onSettled: close })}
      >
        <TextField
          label={t('reason')}
          value={reason}
          maxLength={400}
          onChange={(event) => setReason(event.target.value)}
        />
      </Dialog>
    </PlaceFrame>
  )
}
