import { useTranslation } from 'react-i18next'
import { pieceMark } from '#shared/pieces/piece-mark'
import type { Run } from '#shared/runs/runs.contract'

/** Which piece is in the hands now: its mark, its hand, and which of its ends lies low. */
export function NextPiece({ run }: { readonly run: Run }) {
  const { t } = useTranslation('brake')
  const piece = run.pieces.find(({ state }) => state === 'queued')
  if (!piece || (piece.hand === null && piece.lowEnd === null)) return null
  return (
    <p className="border-b border-rule pb-2" data-testid="next-piece">
      <span className="text-scribe">{t('piece.next')} </span>
      <b className="font-figure text-lead">{pieceMark(piece)}</b>
      {piece.hand !== null && ` · ${t(`piece.hand.${piece.hand}`)}`}
      {piece.lowEnd !== null && ` · ${t(`piece.lowEnd.${piece.lowEnd}`)}`}
    </p>
  )
}
