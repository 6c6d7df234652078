import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Bundle } from '#shared/bundles/bundles.contract'
import type { HandOffSheet } from '#shared/hand-off/hand-off.contract'
import { orderNumber } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { Band } from '@/components/Band'
import { ButtonLink } from '@/components/ButtonLink'
import { useHandOff } from '@/features/hand-off/api/hand-off.mutations'
import { BundleTable } from '@/features/hand-off/components/BundleTable'
import { HandOffList } from '@/features/hand-off/components/HandOffList'
import { HandOverPanel } from '@/features/hand-off/components/HandOverPanel'
import { NothingHere } from '@/features/hand-off/components/NothingHere'
import { ReturnDialog } from '@/features/hand-off/components/ReturnDialog'
import { SheetCounts } from '@/features/hand-off/components/SheetCounts'
import { isHere } from '@/features/hand-off/hand-over'
import { useSheetScan } from '@/features/hand-off/useSheetScan'
import { CodeEntry } from '@/features/pieces/components/CodeEntry'
import { RackPlan } from '@/features/rack/components/RackPlan'
import { bundleMark } from '@/features/rack/bundle-words'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { CounterNav } from './CounterNav'

export function HandOffSheetScreen({ sheet }: { readonly sheet: HandOffSheet }) {
  const { t } = useTranslation('hand-off')
  const { order, bundles, handOffs } = sheet
  const handOff = useHandOff(order.id)
  /** Each hand-over begins with an empty form, and with the cursor waiting for a scan. */
  const [round, setRound] = useState(0)
  const [returning, setReturning] = useState<Bundle | null>(null)
  const { scanned, answer, say, scan, refuse, toggle, clear } = useSheetScan(sheet, (orderId) => (
    <ButtonLink variant="onFill" to={paths.counter.handOffOrder(orderId)}>
      {t('scan.goThere')}
    </ButtonLink>
  ))
  const here = bundles.filter(isHere)

  function handedOver(count: number, name: string) {
    clear()
    setRound(round + 1)
    say({ kind: 'done', title: t('over.done', { count, name }) })
  }

  function returned(bundle: Bundle) {
    setReturning(null)
    say({
      kind: 'done',
      mark: bundleMark(bundle),
      title: t('return.done', { place: bundle.rackPlace }),
    })
  }

  return (
    <PlaceFrame
      fill
      title={orderNumber(order.number)}
      subtitle={
        <>
          <span className="mr-4 text-lead text-ink">{order.company.name}</span>
          {t('orderOf', { job: order.job.name, name: order.orderedBy })}
        </>
      }
      back={{ to: paths.counter.handOff(), label: t('back') }}
      nav={
        // Where the screen is low the pad needs the room; the way back stands beside the title.
        <div className="hidden xl:block">
          <CounterNav />
        </div>
      }
      actions={
        <ButtonLink variant="quiet" to={paths.counter.order(order.id)}>
          {t('toOrder')}
        </ButtonLink>
      }
      search={
        <div className="xl:flex xl:justify-end">
          <CodeEntry
            key={round}
            takesScans
            label={t('scan.label')}
            action={t('scan.action')}
            kinds={['bundle', 'piece']}
            disabled={handOff.isPending}
            onCode={scan}
            onFault={refuse}
          />
        </div>
      }
    >
      <Band answer={answer} />
      <div className="min-h-0 flex-1 overflow-y-auto lg:grid lg:grid-cols-[minmax(0,1fr)_22rem] lg:overflow-hidden xl:grid-cols-[minmax(0,1fr)_26rem]">
        <div className="flex min-w-0 flex-col gap-7 px-(--gutter) py-5 lg:overflow-y-auto">
          <SheetCounts sheet={sheet} />
          <BundleTable
            bundles={bundles}
            handOffs={handOffs}
            scanned={scanned}
            onToggle={toggle}
            onReturn={setReturning}
            locked={handOff.isPending}
          />
          {here.length > 0 && <RackPlan bundles={here} found={scanned} />}
          <HandOffList handOffs={handOffs} bundles={bundles} />
        </div>
        <aside
          aria-label={t('over.title')}
          // On a tablet held upright it dissolves, so that its button stays at the bottom edge.
          className="border-rule bg-sheet max-lg:contents lg:flex lg:flex-col lg:overflow-y-auto lg:border-l"
        >
          {here.length > 0 ? (
            <HandOverPanel
              key={round}
              sheet={sheet}
              scanned={scanned}
              onScan={scan}
              onHandedOver={handedOver}
              handOff={handOff}
            />
          ) : (
            <NothingHere sheet={sheet} />
          )}
        </aside>
      </div>
      {returning && (
        <ReturnDialog bundle={returning} onClose={() => setReturning(null)} onReturned={returned} />
      )}
    </PlaceFrame>
  )
}
