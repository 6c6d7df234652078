import type { Signature } from '#shared/hand-off/hand-off.contract'

/** The box that strokes are kept in, whatever the size of the pad they were drawn on. */
export const SIGNATURE_BOX = { width: 1000, height: 400 } as const

/** As many as the contract takes. */
export const MOST_STROKES = 60
export const MOST_POINTS = 500

/** Points nearer than this to the last one add nothing that can be seen, in units of the box. */
const LEAST_STEP = 4

export type SignaturePoint = Signature[number][number]

interface Pad {
  readonly left: number
  readonly top: number
  readonly width: number
  readonly height: number
}

/** A place on the screen as whole units of the box; undefined where it is beside the pad. */
export function toBox(
  { x, y }: { readonly x: number; readonly y: number },
  pad: Pad,
): SignaturePoint | undefined {
  if (pad.width <= 0 || pad.height <= 0) return undefined
  const across = Math.round(((x - pad.left) / pad.width) * SIGNATURE_BOX.width)
  const down = Math.round(((y - pad.top) / pad.height) * SIGNATURE_BOX.height)
  const inside =
    across >= 0 && across <= SIGNATURE_BOX.width && down >= 0 && down <= SIGNATURE_BOX.height
  return inside ? [across, down] : undefined
}

/** No further stroke fits: the pad says so, and takes none. */
export const isFull = (signature: Signature): boolean => signature.length >= MOST_STROKES

/** The pen comes down. A full signature stays as it is. */
export const beginStroke = (signature: Signature, point: SignaturePoint): Signature =>
  isFull(signature) ? signature : [...signature, [point]]

/** The pen goes on in the last stroke; a stroke with all its points is continued by another. */
export function extendStroke(signature: Signature, point: SignaturePoint): Signature {
  const stroke = signature.at(-1)
  const last = stroke?.at(-1)
  if (!stroke || !last) return beginStroke(signature, point)
  if (Math.hypot(point[0] - last[0], point[1] - last[1]) < LEAST_STEP) return signature
  if (stroke.length < MOST_POINTS) return [...signature.slice(0, -1), [...stroke, point]]
  return isFull(signature) ? signature : [...signature, [last, point]]
}

/** A line was drawn; a tap that slipped is no signature. */
export const isSigned = (signature: Signature): boolean =>
  signature.some((stroke) => stroke.length > 1)

/** The strokes as an SVG path in units of the box; a lone point is a dot. */
export const signaturePath = (signature: Signature): string =>
  signature
    .map(([first, ...rest]) =>
      first === undefined
        ? ''
        : `M${first.join(' ')}${(rest.length === 0 ? [first] : rest)
            .map((point) => `L${point.join(' ')}`)
            .join('')}`,
    )
    .join('')
