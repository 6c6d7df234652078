import { useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { OrderLine, PieceSummary } from '#shared/orders/order.schema'
import { Button } from '@/components/Button'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { PieceStateWord } from '@/features/pieces/components/PieceStateWord'
import { useFormats } from '@/lib/format/useFormats'

interface Props {
  readonly line: OrderLine
  readonly piecePath: (code: string) => string
}

/** A list that fits on a screen stands open. */
const SHORT = 8

const column = columnsOf<PieceSummary>()

/** Every piece of a line by the code on its label: state, run, where it lies. */
export function PieceCodes({ line, piecePath }: Props) {
  const { t } = useTranslation('counter')
  const { pieces, quantity } = line
  const [open, setOpen] = useState(pieces.length <= SHORT)
  const { moment } = useFormats()
  const columns = useMemo(
    () =>
      column.columns([
        column.display({
          id: 'code',
          header: t('pieces.code'),
          meta: { figure: true },
          cell: ({ row }) => <span className="text-lead">{row.original.code}</span>,
        }),
        column.display({
          id: 'sequence',
          header: t('pieces.sequence'),
          meta: { figure: true },
          cell: ({ row: { original } }) => (
            <>
              {original.sequence}/{quantity}
              {original.remakeOf !== null && (
                <span className="block font-sans text-small text-scribe">{t('pieces.remake')}</span>
              )}
            </>
          ),
        }),
        column.display({
          id: 'state',
          header: t('pieces.state'),
          cell: ({ row }) => <PieceStateWord state={row.original.state} />,
        }),
        column.accessor('runNumber', { header: t('pieces.run'), meta: { figure: true } }),
        column.display({
          id: 'place',
          header: t('pieces.bundle'),
          meta: { figure: true },
          cell: ({ row: { original } }) =>
            original.bundleCode !== null && (
              <>
                {original.bundleCode}
                {original.rackPlace !== null && ` · ${original.rackPlace}`}
              </>
            ),
        }),
        column.display({
          id: 'since',
          header: t('pieces.since'),
          cell: ({ row: { original } }) => (
            <span className="text-small text-scribe">
              {moment(original.since)} · {original.by}
            </span>
          ),
        }),
      ]),
    [t, moment, quantity],
  )
  return (
    <details open={open} onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="inline-flex min-h-target items-center font-semibold underline">
        {t('pieces.count', { count: pieces.length })}
      </summary>
      {open && (
        <>
          <DataTable
            caption={t('pieces.caption', { mark: line.mark })}
            captionHidden
            rows={pieces}
            columns={columns}
            rowId={({ code }) => code}
            rowLink={({ code }) => piecePath(code)}
            empty={null}
          />
          <CopyCodes codes={pieces.map(({ code }) => code)} />
        </>
      )}
    </details>
  )
}

/** Where the browser gives no clipboard the codes can still be marked and copied by hand. */
function CopyCodes({ codes }: { readonly codes: readonly string[] }) {
  const { t } = useTranslation('counter')
  const [told, setTold] = useState<'copied' | 'failed' | null>(null)
  if (!('clipboard' in navigator)) return null
  const copy = () =>
    navigator.clipboard.writeText(codes.join('\n')).then(
      () => setTold('copied'),
      () => setTold('failed'),
    )
  return (
    <p className="mt-2 flex flex-wrap items-center gap-3">
      <Button variant="quiet" onClick={() => void copy()}>
        {t('pieces.copy', { count: codes.length })}
      </Button>
      <span role="status" className="text-small text-scribe">
        {told && t(`pieces.${told}`)}
      </span>
    </p>
  )
}
