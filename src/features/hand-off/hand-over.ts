import type { Bundle } from '#shared/bundles/bundles.contract'
import type { HandOffSheet, Signature } from '#shared/hand-off/hand-off.contract'
import { isSigned } from './signature'

/** What the person at the counter has done so far towards a hand-over. */
export interface HandOverForm {
  /** Codes of the bundles that were scanned or pressed. */
  readonly scanned: readonly string[]
  readonly receivedBy: string
  readonly signature: Signature
  readonly signedOnPaper: boolean
}

/** What the one button waits for, in the order in which it is done; `ready` when for nothing. */
export type HandOverStep =
  | { readonly waitsFor: 'bundles' }
  | { readonly waitsFor: 'scan'; readonly only: Bundle | null }
  | { readonly waitsFor: 'name' }
  | { readonly waitsFor: 'signature' }
  | { readonly waitsFor: 'nothing'; readonly bundleCodes: string[] }

export const isHere = ({ pickedUpAt }: Bundle): boolean => pickedUpAt === null

/** Bundles that are scanned and still here: what somebody else handed over meanwhile is not. */
export const scannedBundles = (
  { bundles }: Pick<HandOffSheet, 'bundles'>,
  scanned: readonly string[],
): Bundle[] => bundles.filter((bundle) => isHere(bundle) && scanned.includes(bundle.code))

export function handOverStep(
  sheet: Pick<HandOffSheet, 'bundles'>,
  { scanned, receivedBy, signature, signedOnPaper }: HandOverForm,
): HandOverStep {
  const here = sheet.bundles.filter(isHere)
  if (here.length === 0) return { waitsFor: 'bundles' }
  const taken = scannedBundles(sheet, scanned)
  if (taken.length === 0) {
    return { waitsFor: 'scan', only: here.length === 1 ? (here[0] ?? null) : null }
  }
  if (receivedBy.trim() === '') return { waitsFor: 'name' }
  if (!signedOnPaper && !isSigned(signature)) return { waitsFor: 'signature' }
  return { waitsFor: 'nothing', bundleCodes: taken.map(({ code }) => code) }
}

export interface LeftBehind {
  /** Bundles that lie here and were not scanned; none are named before the first scan. */
  readonly bundles: readonly Bundle[]
  /** Bent pieces in no bundle. */
  readonly loose: number
  /** Pieces not bent yet. */
  readonly queued: number
  readonly some: boolean
}

/** What stays when the scanned bundles go: nobody should find out on the roof. */
export function leftBehind(sheet: HandOffSheet, scanned: readonly string[]): LeftBehind {
  const taken = scannedBundles(sheet, scanned)
  const bundles =
    taken.length === 0
      ? []
      : sheet.bundles.filter((bundle) => isHere(bundle) && !taken.includes(bundle))
  const loose = sheet.looseCount
  const { queued } = sheet.order.progress
  return { bundles, loose, queued, some: bundles.length + loose + queued > 0 }
}
