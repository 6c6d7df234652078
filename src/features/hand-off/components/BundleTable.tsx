import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { Bundle } from '#shared/bundles/bundles.contract'
import type { HandOff } from '#shared/hand-off/hand-off.contract'
import { Button } from '@/components/Button'
import { EmptyState } from '@/components/EmptyState'
import { Icon } from '@/components/Icon'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'
import { bundleMark, countByName } from '@/features/rack/bundle-words'
import { LiftWord } from '@/features/rack/components/LiftWord'

interface Props {
  readonly bundles: readonly Bundle[]
  readonly handOffs: readonly HandOff[]
  readonly scanned: readonly string[]
  readonly onToggle: (bundle: Bundle) => void
  readonly onReturn: (bundle: Bundle) => void
  /** A hand-over is under way: what it takes cannot change any more. */
  readonly locked: boolean
}

const column = columnsOf<Bundle>()

/** The bundles of an order: what is in them, where they lie, and which are ticked or gone. */
export function BundleTable({ bundles, handOffs, scanned, onToggle, onReturn, locked }: Props) {
  const { t } = useTranslation('hand-off')
  const { run } = useUnits()
  const { moment } = useFormats()
  const columns = useMemo(
    () =>
      column.columns([
        column.display({
          id: 'bundle',
          header: t('bundle.bundle'),
          cell: ({ row }) => (
            <>
              <span className="block font-figure text-title font-bold">
                {bundleMark(row.original)}
              </span>
              <span className="font-figure text-small text-scribe">{row.original.code}</span>
            </>
          ),
        }),
        column.display({
          id: 'pieces',
          header: t('bundle.pieces'),
          cell: ({ row }) =>
            countByName(row.original.pieces)
              .map(({ name, count }) => `${count} ${name}`)
              .join(', '),
        }),
        column.accessor(({ longest }) => run(longest), {
          id: 'longest',
          header: t('bundle.longest'),
          meta: { figure: true },
        }),
        column.display({
          id: 'weight',
          header: t('bundle.weight'),
          cell: ({ row }) => (
            <LiftWord weight={row.original.weight} longest={row.original.longest} />
          ),
        }),
        column.display({
          id: 'place',
          header: t('bundle.place'),
          cell: ({ row }) => (
            <span className="font-figure text-title">{row.original.rackPlace}</span>
          ),
        }),
        column.display({
          id: 'state',
          header: t('bundle.state'),
          meta: { align: 'end' },
          cell: ({ row: { original: bundle } }) => {
            if (bundle.pickedUpAt !== null) {
              const gone = handOffs.find(({ bundleCodes }) => bundleCodes.includes(bundle.code))
              return (
                <span className="inline-flex flex-wrap items-center justify-end gap-x-3">
                  <span className="text-right">
                    <span className="block font-semibold text-oxide">
                      {t('bundle.out', { moment: moment(bundle.pickedUpAt) })}
                    </span>
                    {gone && <span className="text-small text-scribe">{gone.receivedBy}</span>}
                  </span>
                  <Button
                    variant="quiet"
                    aria-label={`${t('bundle.takeBack')} ${bundleMark(bundle)}`}
                    onClick={() => onReturn(bundle)}
                  >
                    {t('bundle.takeBack')}
                  </Button>
                </span>
              )
            }
            const ticked = scanned.includes(bundle.code)
            const word = t(ticked ? 'bundle.scanned' : 'bundle.waiting')
            return (
              <button
                type="button"
                aria-label={`${bundleMark(bundle)} ${word}`}
                aria-pressed={ticked}
                disabled={locked}
                className={`inline-flex min-h-target items-center gap-2 rounded-control border px-3 font-semibold whitespace-nowrap disabled:cursor-not-allowed ${ticked ? 'border-oxide text-oxide' : 'border-edge text-dye'}`}
                onClick={() => onToggle(bundle)}
              >
                {ticked && <Icon name="done" className="size-5" />}
                {word}
              </button>
            )
          },
        }),
      ]),
    [t, run, moment, handOffs, scanned, onToggle, onReturn, locked],
  )
  return (
    <DataTable
      caption={t('bundle.caption')}
      captionHidden
      rows={bundles}
      columns={columns}
      rowId={({ code }) => code}
      empty={<EmptyState title={t('bundle.none')} hint={t('bundle.noneHint')} />}
    />
  )
}
