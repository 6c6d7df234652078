import { useQueryClient } from '@tanstack/react-query'
import { useCallback, useRef, useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Bundle } from '#shared/bundles/bundles.contract'
import type { HandOffSheet } from '#shared/hand-off/hand-off.contract'
import { orderNumber } from '#shared/orders/order.schema'
import { parseCode, type CodeFault } from '#shared/pieces/codes'
import type { BandAnswer } from '@/components/Band'
import { pieceQuery } from '@/features/pieces/api/pieces.queries'
import { useScanWords } from '@/features/pieces/useScanWords'
import { bundleQuery } from '@/features/rack/api/rack.queries'
import { bundleMark } from '@/features/rack/bundle-words'
import { useFormats } from '@/lib/format/useFormats'
import { handOffQuery } from './api/hand-off.queries'
import { scanOutcome, type ScanOutcome } from './scan-outcome'

/** What a code is that is in no bundle of the order on screen. */
type Stray =
  | {
      readonly kind: 'otherOrder'
      readonly orderId: string
      readonly orderNumber: number
      readonly company: string
    }
  | {
      readonly kind: 'loose'
      readonly state: 'queued' | 'bent' | 'scrapped' | 'withdrawn' | 'bundled' | 'pickedUp'
    }

/**
 * Ticks off the bundles of one order as they are scanned or pressed. Every scan is answered: what
 * it was, and for a wrong one what was expected. `onOther` gives the band its way to another order.
 */
export function useSheetScan(
  sheet: HandOffSheet,
  action: (orderId: string) => BandAnswer['action'],
) {
  const { t } = useTranslation('hand-off')
  const client = useQueryClient()
  const words = useScanWords()
  const { moment } = useFormats()
  const orderId = sheet.order.id
  const scans = useRef(0)
  const [scanned, setScanned] = useState<readonly string[]>([])
  const [answer, setAnswer] = useState<BandAnswer | null>(null)

  const say = useCallback((said: Omit<BandAnswer, 'id'>) => {
    scans.current += 1
    setAnswer({ id: scans.current, ...said })
  }, [])

  function accept({ kind, bundle }: ScanOutcome) {
    const mark = bundleMark(bundle)
    if (kind === 'gone') {
      say({
        kind: 'warn',
        mark,
        title: t('scan.gone'),
        detail: bundle.pickedUpAt && t('scan.goneDetail', { moment: moment(bundle.pickedUpAt) }),
      })
      return
    }
    if (kind === 'again') return say({ kind: 'warn', mark, title: t('scan.again') })
    setScanned((before) => [...before, bundle.code])
    say({
      kind: 'done',
      mark,
      title: t('scan.scanned'),
      detail: t('scan.from', { place: bundle.rackPlace }),
    })
  }

  /** The sheet on screen may be older than the label: it is read anew before a code is refused. */
  async function findStray(code: string): Promise<ScanOutcome | Stray> {
    const parsed = parseCode(code)
    const found =
      parsed.ok && parsed.kind === 'bundle'
        ? await client.fetchQuery({ ...bundleQuery(code), staleTime: 0 })
        : await client.fetchQuery({ ...pieceQuery(code), staleTime: 0 })
    if (found.orderId !== orderId) {
      return {
        kind: 'otherOrder',
        orderId: found.orderId,
        orderNumber: found.orderNumber,
        company: found.company,
      }
    }
    const fresh = await client.fetchQuery({ ...handOffQuery(orderId), staleTime: 0 })
    const outcome = scanOutcome(fresh, scanned, code)
    if (outcome) return outcome
    if ('state' in found) return { kind: 'loose', state: found.state }
    throw new Error(`Bundle ${code} is not on the sheet of its order.`)
  }

  async function ask(code: string) {
    try {
      const found = await findStray(code)
      if (found.kind === 'otherOrder') {
        say({
          kind: 'error',
          mark: code,
          title: t('scan.other', {
            number: orderNumber(found.orderNumber),
            company: found.company,
          }),
          detail: t('scan.otherDetail', { number: orderNumber(sheet.order.number) }),
          action: action(found.orderId),
        })
      } else if (found.kind === 'loose') {
        say({
          kind: 'warn',
          mark: code,
          title: t('scan.loose', { state: t(`pieces:state.${found.state}`) }),
          detail: t('scan.looseDetail'),
        })
      } else accept(found)
    } catch (error) {
      const { title, detail } = words.ofError(error)
      say({ kind: 'error', mark: code, title, detail })
    }
  }

  function scan(code: string) {
    const outcome = scanOutcome(sheet, scanned, code)
    if (outcome) accept(outcome)
    else void ask(code)
  }

  function refuse(fault: CodeFault | 'otherKind') {
    const { title, detail } = words.ofFault(fault)
    say({ kind: 'error', title, detail })
  }

  const toggle = useCallback(
    ({ code }: Bundle) =>
      setScanned((before) =>
        before.includes(code) ? before.filter((other) => other !== code) : [...before, code],
      ),
    [],
  )

  const clear = useCallback(() => setScanned([]), [])

  return { scanned, answer, say, scan, refuse, toggle, clear }
}
