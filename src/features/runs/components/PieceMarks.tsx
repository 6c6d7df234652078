import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import type { RunPiece } from '#shared/runs/runs.contract'
import { paths } from '@/app/paths'
import { StateGlyph } from '@/features/drawing/figure/StateGlyph'

interface Props {
  readonly pieces: readonly RunPiece[]
}

/** Each piece of a run as it looks now, under its number; it leads to its history. */
export function PieceMarks({ pieces }: Props) {
  const { t } = useTranslation('piece')
  const { t: say } = useTranslation('pieces')
  return (
    <ul className="flex min-w-0 flex-1 gap-x-1 overflow-x-auto">
      {pieces.map((piece) => (
        <li key={piece.code}>
          <Link
            to={paths.piece('brake', piece.code)}
            aria-label={t('markState', {
              mark: `${piece.mark}${piece.sequence}`,
              code: piece.code,
              state: say(`state.${piece.state}`),
            })}
            className={`inline-flex min-w-12 flex-col items-center rounded-control px-1 py-1 hover:bg-ink/5 ${piece.state === 'queued' ? 'text-scribe' : piece.state === 'scrapped' ? 'text-chalk' : 'text-oxide'}`}
          >
            <StateGlyph state={piece.state} size={32} />
            <span className="font-figure text-small">{`${piece.mark}${piece.sequence}`}</span>
          </Link>
        </li>
      ))}
    </ul>
  )
}
