import { useTranslation } from 'react-i18next'
import type { PieceState } from '#shared/pieces/piece-state'
import { StateWord, type Tone } from '@/components/StateWord'
import { StateGlyph } from '@/features/drawing/figure/StateGlyph'

const TONES: Record<PieceState, Tone> = {
  queued: 'quiet',
  bent: 'waiting',
  bundled: 'done',
  pickedUp: 'done',
  scrapped: 'attention',
  withdrawn: 'quiet',
}

/** The state of a piece: the piece as it looks now, and the word. */
export function PieceStateWord({ state }: { readonly state: PieceState }) {
  const { t } = useTranslation('pieces')
  return (
    <StateWord glyph={<StateGlyph state={state} />} tone={TONES[state]}>
      {t(`state.${state}`)}
    </StateWord>
  )
}
