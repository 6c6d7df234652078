import { useState, type KeyboardEvent } from 'react'
import { useTranslation } from 'react-i18next'
import { liftOf } from '#shared/bundles/lift-rule'
import type { HandOffSheet, Signature } from '#shared/hand-off/hand-off.contract'
import { Button } from '@/components/Button'
import { Notice } from '@/components/Notice'
import { TextField } from '@/components/TextField'
import { OrderCaution } from '@/features/orders/components/OrderCaution'
import { bundleMark } from '@/features/rack/bundle-words'
import type { useHandOff } from '../api/hand-off.mutations'
import { handOverStep, leftBehind, scannedBundles, type HandOverStep } from '../hand-over'
import { takeScan } from '../scan-outcome'
import { HandOverRefusal } from './HandOverRefusal'
import { LeftBehindNotice } from './LeftBehindNotice'
import { SignaturePad } from './SignaturePad'

interface Props {
  readonly sheet: HandOffSheet
  readonly scanned: readonly string[]
  /** A label scanned while the cursor stood in the field of the name. */
  readonly onScan: (code: string) => void
  readonly onHandedOver: (count: number, receivedBy: string) => void
  readonly handOff: ReturnType<typeof useHandOff>
}

/** Who takes it, the signature, what stays behind, and the one button. */
export function HandOverPanel({ sheet, scanned, onScan, onHandedOver, handOff }: Props) {
  const { t } = useTranslation('hand-off')
  const pending = handOff.isPending
  const [receivedBy, setReceivedBy] = useState('')
  const [signature, setSignature] = useState<Signature>([])
  const [signedOnPaper, setSignedOnPaper] = useState(false)

  const step = handOverStep(sheet, { scanned, receivedBy, signature, signedOnPaper })
  const taken = scannedBundles(sheet, scanned)
  const left = leftBehind(sheet, scanned)
  const heavy = taken.some((bundle) => liftOf(bundle) !== 'onePerson')

  function keepScans(event: KeyboardEvent<HTMLInputElement>) {
    if (event.key !== 'Enter') return
    event.preventDefault()
    const scan = takeScan(receivedBy)
    if (!scan) return
    setReceivedBy(scan.rest)
    onScan(scan.code)
  }

  function handOver() {
    if (step.waitsFor !== 'nothing') return
    const { bundleCodes } = step
    handOff.mutate(
      { bundleCodes, receivedBy, signature: signedOnPaper ? [] : signature },
      { onSuccess: () => onHandedOver(bundleCodes.length, receivedBy.trim()) },
    )
  }

  return (
    <>
      <div className="flex flex-1 flex-col gap-4 bg-sheet p-(--gutter) max-lg:border-t max-lg:border-rule">
        <h2 className="text-title font-bold">{t('over.title')}</h2>
        <TextField
          label={t('over.name')}
          hint={t('over.nameHint')}
          value={receivedBy}
          maxLength={80}
          autoComplete="off"
          disabled={pending}
          onChange={(event) => setReceivedBy(event.target.value)}
          onKeyDown={keepScans}
        />
        {!signedOnPaper && (
          <SignaturePad signature={signature} onChange={setSignature} disabled={pending} />
        )}
        <label className="flex min-h-target items-center gap-3">
          <input
            type="checkbox"
            className="size-5 accent-dye"
            checked={signedOnPaper}
            disabled={pending}
            onChange={(event) => setSignedOnPaper(event.target.checked)}
          />
          <span>
            {t('sign.onPaper')}
            <span className="block text-small text-scribe">{t('sign.onPaperHint')}</span>
          </span>
        </label>
        {(taken.length > 0 || left.some) && <LeftBehindNotice left={left} />}
        {heavy && <Notice kind="warn">{t('lift.caution')}</Notice>}
        <OrderCaution />
      </div>
      <div className="sticky bottom-0 flex flex-col gap-3 border-t border-rule bg-sheet px-(--gutter) py-3">
        <HandOverRefusal error={handOff.error} bundles={sheet.bundles} />
        <Button
          variant="primary"
          className="min-h-14! w-full text-lead"
          disabled={step.waitsFor !== 'nothing'}
          pending={pending}
          onClick={handOver}
        >
          <StepWords step={step} />
        </Button>
      </div>
    </>
  )
}

function StepWords({ step }: { readonly step: HandOverStep }) {
  const { t } = useTranslation('hand-off')
  switch (step.waitsFor) {
    case 'bundles':
      return t('step.bundles')
    case 'scan':
      return step.only ? t('step.scanOne', { mark: bundleMark(step.only) }) : t('step.scanSome')
    case 'name':
      return t('step.name')
    case 'signature':
      return t('step.signature')
    case 'nothing':
      return t('step.ready', { count: step.bundleCodes.length })
  }
}
