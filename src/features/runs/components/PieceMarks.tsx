import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import { pieceMark } from '#shared/pieces/piece-mark'
import type { RunPiece } from '#shared/runs/runs.contract'
import { paths } from '@/app/paths'
import { StateGlyph } from '@/features/drawing/figure/StateGlyph'

interface Props {
  readonly pieces: readonly RunPiece[]
}

const queuedFirst = (pieces: readonly RunPiece[]) =>
  pieces.toSorted((a, b) => Number(b.state === 'queued') - Number(a.state === 'queued'))

/**
 * Each piece of a run as it looks now, under its number; it leads to its history.
 * What is still to be bent comes first.
 */
export function PieceMarks({ pieces }: Props) {
  const { t } = useTranslation('piece')
  const { t: say } = useTranslation('pieces')
  return (
    <ul className="flex min-w-0 flex-1 gap-x-1 overflow-x-auto">
      {queuedFirst(pieces).map((piece) => (
        <li key={piece.code}>
          <Link
            to={paths.piece('brake', piece.code)}
            aria-label={t('markState', {
              mark: pieceMark(piece),
              code: piece.code,
              state: say(`state.${piece.state}`),
            })}
            className={`inline-flex min-h-target min-w-12 flex-col items-center justify-center rounded-control px-2 whitespace-nowrap hover:bg-ink/5 ${piece.state === 'queued' ? 'text-scribe' : piece.state === 'scrapped' ? 'text-chalk' : 'text-oxide'}`}
          >
            <StateGlyph state={piece.state} size={28} />
            <span className="font-figure text-small">
              <b>{pieceMark(piece)}</b> {piece.code}
            </span>
          </Link>
        </li>
      ))}
    </ul>
  )
}
