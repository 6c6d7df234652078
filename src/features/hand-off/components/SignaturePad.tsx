import { useId, useRef, type PointerEvent } from 'react'
import { useTranslation } from 'react-i18next'
import type { Signature } from '#shared/hand-off/hand-off.contract'
import { Button } from '@/components/Button'
import {
  beginStroke,
  extendStroke,
  isFull,
  SIGNATURE_BOX,
  toBox,
  type SignaturePoint,
} from '../signature'
import { SignatureFigure } from './SignatureFigure'

interface Props {
  readonly signature: Signature
  readonly onChange: (signature: Signature) => void
  readonly disabled?: boolean
}

/**
 * Signed with a finger, a pen or the mouse. A line that leaves the pad ends at its edge and goes on
 * where it comes back. Without a pointer there is the box "signed on paper" beside it.
 */
export function SignaturePad({ signature, onChange, disabled = false }: Props) {
  const { t } = useTranslation('hand-off')
  const id = useId()
  const pen = useRef<{ readonly pointer: number; down: boolean } | null>(null)
  const full = isFull(signature)

  const pointOf = ({ currentTarget, clientX, clientY }: PointerEvent<Element>) =>
    toBox({ x: clientX, y: clientY }, currentTarget.getBoundingClientRect())

  const draw = (point: SignaturePoint, down: boolean) =>
    onChange((down ? extendStroke : beginStroke)(signature, point))

  function press(event: PointerEvent<Element>) {
    const point = pointOf(event)
    if (disabled || pen.current || event.button !== 0 || !point) return
    pen.current = { pointer: event.pointerId, down: true }
    draw(point, false)
  }

  function move(event: PointerEvent<Element>) {
    const held = pen.current
    if (held?.pointer !== event.pointerId) return
    // Let go outside the pad, where nobody told.
    if (event.buttons === 0) {
      pen.current = null
      return
    }
    const point = pointOf(event)
    if (point) draw(point, held.down)
    held.down = point !== undefined
  }

  function lift(event: PointerEvent<Element>) {
    if (pen.current?.pointer === event.pointerId) pen.current = null
  }

  return (
    <div>
      <div
        role="img"
        aria-label={t('sign.pad')}
        aria-describedby={id}
        data-testid="signature-pad"
        className={`relative touch-none border border-dashed border-edge bg-sheet select-none ${disabled ? 'opacity-50' : 'cursor-crosshair'}`}
        style={{ aspectRatio: `${SIGNATURE_BOX.width} / ${SIGNATURE_BOX.height}` }}
        onPointerDown={press}
        onPointerMove={move}
        onPointerUp={lift}
        onPointerCancel={lift}
        onPointerLeave={() => {
          if (pen.current) pen.current.down = false
        }}
      >
        <span
          aria-hidden="true"
          className="pointer-events-none absolute top-2 left-3 text-small text-scribe"
        >
          {t('sign.here')}
        </span>
        <SignatureFigure signature={signature} className="pointer-events-none size-full" line />
      </div>
      <div className="flex min-h-target flex-wrap items-center justify-between gap-x-3">
        <p id={id} role="status" className="text-small text-scribe">
          {full ? t('sign.full') : signature.length > 0 ? t('sign.begun') : t('sign.how')}
        </p>
        {signature.length > 0 && (
          <Button variant="quiet" onClick={() => onChange([])}>
            {t('sign.clear')}
          </Button>
        )}
      </div>
    </div>
  )
}
