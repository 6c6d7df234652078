import { useTranslation } from 'react-i18next'
import type { OrderState } from '#shared/orders/order.schema'
import type { PieceState } from '#shared/pieces/piece-state'
import { StateWord, type Tone } from '@/components/StateWord'
import { StateGlyph } from '@/features/drawing/figure/StateGlyph'

const TONES: Record<OrderState, Tone> = {
  submitted: 'plain',
  question: 'attention',
  released: 'quiet',
  inWork: 'waiting',
  ready: 'done',
  partPickedUp: 'waiting',
  pickedUp: 'done',
  withdrawn: 'quiet',
}

/** An order looks like its pieces do; before the release there are none. */
const PIECES: Record<Exclude<OrderState, 'submitted' | 'question'>, PieceState> = {
  released: 'queued',
  inWork: 'bent',
  ready: 'bundled',
  partPickedUp: 'pickedUp',
  pickedUp: 'pickedUp',
  withdrawn: 'withdrawn',
}

/** A strip that is not cut yet: dashed; with a question on it while the shop waits for an answer. */
function UncutGlyph({ asked }: { readonly asked: boolean }) {
  return (
    <svg
      viewBox="0 0 24 24"
      className="size-6"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.4"
      aria-hidden="true"
      focusable="false"
    >
      <path d="M2 19H22" strokeDasharray="4 2.6" />
      {asked && <path d="M9 5.5a3 3 0 1 1 4.4 2.7c-1 .5-1.4 1-1.4 2.3M12 13v1.8" strokeWidth="2" />}
    </svg>
  )
}

export function OrderStateWord({ state }: { readonly state: OrderState }) {
  const { t } = useTranslation('orders')
  const glyph =
    state === 'submitted' || state === 'question' ? (
      <UncutGlyph asked={state === 'question'} />
    ) : (
      <StateGlyph state={PIECES[state]} />
    )
  return (
    <StateWord glyph={glyph} tone={TONES[state]}>
      {t(`state.${state}`)}
    </StateWord>
  )
}
