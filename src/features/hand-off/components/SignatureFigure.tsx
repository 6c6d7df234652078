import type { Signature } from '#shared/hand-off/hand-off.contract'
import { SIGNATURE_BOX, signaturePath } from '../signature'

interface Props {
  readonly signature: Signature
  readonly className?: string
  /** With the line that one signs on. */
  readonly line?: boolean
  /** The accessible name; without one it is hidden from screen readers. */
  readonly title?: string
}

export function SignatureFigure({ signature, className, line = false, title }: Props) {
  const { width, height } = SIGNATURE_BOX
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      className={className}
      fill="none"
      strokeLinecap="round"
      strokeLinejoin="round"
      focusable="false"
      {...(title === undefined ? { 'aria-hidden': true } : { role: 'img', 'aria-label': title })}
    >
      {line && <path d={`M60 ${height - 90}H${width - 60}`} stroke="var(--rule)" strokeWidth="4" />}
      <path d={signaturePath(signature)} stroke="var(--ink)" strokeWidth="9" />
    </svg>
  )
}
