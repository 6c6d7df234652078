import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { pieceMark } from '#shared/pieces/piece-mark'
import { rackPlaceSchema, type Bundle, type BundleWork } from '#shared/bundles/bundles.contract'
import { orderNumber } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { Band, type BandAnswer } from '@/components/Band'
import { Button } from '@/components/Button'
import { TextField } from '@/components/TextField'
import { useUnits } from '@/features/people/useUnits'
import { CodeEntry } from '@/features/pieces/components/CodeEntry'
import { useScanWords } from '@/features/pieces/useScanWords'
import { useCreateBundle } from '@/features/rack/api/rack.mutations'
import { LiftWord } from '@/features/rack/components/LiftWord'
import { useTicked } from '@/features/rack/useTicked'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

interface Props {
  readonly work: BundleWork
  /** Bundles of the order that lie on the rack already. */
  readonly bundles: readonly Bundle[]
  readonly scanned: string | null
}

export function BundlingScreen({ work, bundles, scanned }: Props) {
  const { t } = useTranslation('rack')
  const { run: length } = useUnits()
  const words = useScanWords()
  const create = useCreateBundle()
  const codes = work.loose.map(({ code }) => code)
  const ticks = useTicked(codes, scanned)
  const [place, setPlace] = useState(bundles.at(-1)?.rackPlace ?? '')
  const [tried, setTried] = useState(false)
  const [answer, setAnswer] = useState<BandAnswer | null>(null)

  const chosen = work.loose.filter(({ code }) => ticks.ticked.includes(code))
  const weight = chosen.reduce((sum, piece) => sum + piece.weight, 0)
  const longest = Math.max(0, ...chosen.map((piece) => piece.length))
  const parsedPlace = rackPlaceSchema.safeParse(place)
  const tell = (next: Omit<BandAnswer, 'id'>) =>
    setAnswer((before) => ({ ...next, id: Number(before?.id ?? 0) + 1 }))

  function scan(code: string) {
    const piece = work.loose.find((each) => each.code === code)
    if (!piece)
      return tell({
        kind: 'error',
        mark: code,
        title: t('notLoose.title'),
        detail: t('notLoose.detail'),
      })
    ticks.tick(code)
    tell({ kind: 'done', mark: pieceMark(piece), title: t('ticked'), detail: code })
  }

  function strap() {
    setTried(true)
    if (!parsedPlace.success || ticks.ticked.length === 0) return
    create.mutate(
      { orderId: work.orderId, pieceCodes: ticks.ticked, rackPlace: parsedPlace.data },
      {
        onSuccess: (bundle) => {
          ticks.clear()
          tell({
            kind: 'done',
            mark: bundle.code,
            title: t('strapped', { number: bundle.number, count: bundle.pieces.length }),
            detail: t('liesAt', { place: bundle.rackPlace }),
          })
        },
        onError: (error) => tell({ kind: 'error', ...words.ofError(error) }),
      },
    )
  }

  return (
    <PlaceFrame
      title={orderNumber(work.orderNumber)}
      subtitle={`${work.company} · ${work.job}`}
      back={{ to: paths.rack.home(), label: t('back') }}
      search={
        <CodeEntry
          label={t('scanPiece')}
          action={t('tick')}
          kinds={['piece']}
          takesScans
          onCode={scan}
          onFault={(fault, typed) =>
            tell({ kind: 'error', mark: typed.toUpperCase(), ...words.ofFault(fault) })
          }
        />
      }
      primary={
        <Button
          variant="primary"
          pending={create.isPending}
          disabled={ticks.ticked.length === 0}
          onClick={strap}
        >
          {ticks.ticked.length === 0 ? t('strapNone') : t('strap', { count: ticks.ticked.length })}
        </Button>
      }
    >
      <Band answer={answer} />
      {work.queued > 0 && (
        <p className="mb-3 text-ochre">{t('stillQueued', { count: work.queued })}</p>
      )}
      <div className="flex flex-wrap items-start gap-10">
        <fieldset className="min-w-80 flex-1">
          <legend className="mb-2 flex w-full items-center justify-between gap-4 font-semibold">
            {t('looseHere', { count: work.loose.length })}
          </legend>
          <Button variant="quiet" onClick={ticks.tickAll}>
            {t('tickAll')}
          </Button>
          <ul className="divide-y divide-rule border-y border-rule">
            {work.loose.map((piece) => (
              <li key={piece.code}>
                <label className="flex min-h-target cursor-pointer items-center gap-4 py-1 has-checked:bg-dye/10">
                  <input
                    type="checkbox"
                    className="ml-2 size-5 accent-dye"
                    checked={ticks.isTicked(piece.code)}
                    onChange={() => ticks.toggle(piece.code)}
                  />
                  <span className="w-20 font-figure font-bold">{pieceMark(piece)}</span>
                  <span className="w-28 font-figure">{piece.code}</span>
                  <span className="min-w-0 flex-1">{piece.name}</span>
                  <span className="pr-2 font-figure">{length(piece.length)}</span>
                </label>
              </li>
            ))}
          </ul>
        </fieldset>
        <div className="flex w-80 max-w-full flex-col gap-5">
          <TextField
            label={t('place')}
            hint={t('placeHint')}
            value={place}
            autoCapitalize="characters"
            error={tried && !parsedPlace.success ? t('placeFault') : undefined}
            onChange={(event) => setPlace(event.target.value)}
          />
          <dl className="grid grid-cols-2 gap-y-1">
            <dt className="text-scribe">{t('column.weight')}</dt>
            <dd>
              <LiftWord weight={weight} longest={longest} />
            </dd>
            <dt className="text-scribe">{t('column.longest')}</dt>
            <dd className="font-figure">{chosen.length > 0 ? length(longest) : '–'}</dd>
          </dl>
          {bundles.length > 0 && (
            <div>
              <p className="text-scribe">{t('already')}</p>
              <ul>
                {bundles.map((bundle) => (
                  <li
                    key={bundle.id}
                    className="font-figure"
                  >{`B${bundle.number} ${bundle.code} · ${bundle.rackPlace}`}</li>
                ))}
              </ul>
            </div>
          )}
          <p className="text-small text-scribe">{t('caution')}</p>
        </div>
      </div>
    </PlaceFrame>
  )
}
