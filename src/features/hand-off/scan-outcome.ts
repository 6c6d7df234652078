import type { Bundle } from '#shared/bundles/bundles.contract'
import type { HandOffSheet } from '#shared/hand-off/hand-off.contract'
import { CODE_BODY_LENGTH, parseCode } from '#shared/pieces/codes'
import { isHere } from './hand-over'

/** What a scanned bundle or piece is to the order on screen; null when it is not in its bundles. */
export type ScanOutcome =
  | { readonly kind: 'scanned'; readonly bundle: Bundle }
  | { readonly kind: 'again'; readonly bundle: Bundle }
  | { readonly kind: 'gone'; readonly bundle: Bundle }

/** A piece stands for the bundle it is strapped into. */
export function scanOutcome(
  { bundles }: Pick<HandOffSheet, 'bundles'>,
  scanned: readonly string[],
  code: string,
): ScanOutcome | null {
  const bundle = bundles.find(
    (candidate) => candidate.code === code || candidate.pieces.some((piece) => piece.code === code),
  )
  if (!bundle) return null
  if (!isHere(bundle)) return { kind: 'gone', bundle }
  return { kind: scanned.includes(bundle.code) ? 'again' : 'scanned', bundle }
}

const CODE_LENGTH = CODE_BODY_LENGTH + 2

/**
 * A scanner types where the cursor is, the field of a name included. The code at the end of what
 * stands there when Enter comes, and the text before it; undefined where no label was scanned.
 */
export function takeScan(
  text: string,
): { readonly code: string; readonly rest: string } | undefined {
  const tail = text.slice(-CODE_LENGTH)
  // A scanner types capitals and digits alone; a name that ends like a code by chance does not.
  if (!/^[0-9A-Z]+$/.test(tail)) return undefined
  const parsed = parseCode(tail)
  return parsed.ok ? { code: parsed.code, rest: text.slice(0, -CODE_LENGTH) } : undefined
}
