import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Run } from '#shared/runs/runs.contract'
import { paths } from '@/app/paths'
import { Band } from '@/components/Band'
import { Button } from '@/components/Button'
import { ColorChip } from '@/components/ColorChip'
import { Notice } from '@/components/Notice'
import { useMay, usePerson } from '@/features/people/person-context'
import { useUnits } from '@/features/people/useUnits'
import { CodeEntry } from '@/features/pieces/components/CodeEntry'
import { useClaimRun, useLeaveRun } from '@/features/runs/api/runs.mutations'
import { PieceMarks } from '@/features/runs/components/PieceMarks'
import { RunCards } from '@/features/runs/components/RunCards'
import { SeveralDialog } from '@/features/runs/components/SeveralDialog'
import { TroubleDialog } from '@/features/runs/components/TroubleDialog'
import { useMarking } from '@/features/runs/useMarking'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

/** A run at the brake: the bend card, the pieces as they are done, and one thing to press. */
export function RunScreen({ run }: { readonly run: Run }) {
  const { t } = useTranslation('brake')
  const { day, daysUntil, time } = useFormats()
  const { run: length } = useUnits()
  const person = usePerson()
  const mayBend = useMay('pieces.bend')
  const [card, setCard] = useState(0)
  const [asking, setAsking] = useState<'several' | 'trouble' | null>(null)
  const marking = useMarking(run)
  const claim = useClaimRun(run.id)
  const leave = useLeaveRun(run.id)

  const last = run.plan.steps.length
  const mine = run.claimedBy?.id === person.id
  const queued = run.progress.queued
  const done = run.pieces.filter(
    ({ state }) => state !== 'queued' && state !== 'scrapped' && state !== 'withdrawn',
  ).length
  const living = run.pieces.filter(
    ({ state }) => state !== 'scrapped' && state !== 'withdrawn',
  ).length
  const close = () => setAsking(null)
  // After the last hit the next piece begins with the first one, not with the strip.
  const next = card === last ? Math.min(1, last) : card + 1

  return (
    <PlaceFrame
      fill
      title={t('run', { number: run.number })}
      subtitle={
        <span className="flex flex-wrap items-baseline gap-x-6">
          <span>{run.name}</span>
          <span className="max-md:hidden">
            <ColorChip
              hex={run.stock.colorHex}
              name={run.stock.colorName}
              detail={run.stock.thicknessName}
            />
          </span>
          <span className="font-figure max-md:hidden">
            {run.lengths
              .map(({ length: inches, count }) => `${count} × ${length(inches)}`)
              .join(', ')}
          </span>
          <span className={daysUntil(run.neededBy) < 0 ? 'text-chalk' : 'text-ochre'}>
            {t(daysUntil(run.neededBy) < 0 ? 'queue.late' : 'queue.due', {
              day: day(run.neededBy),
            })}
          </span>
        </span>
      }
      back={{ to: paths.brake.queue(), label: t('back') }}
      actions={
        mine ? (
          <Button variant="quiet" pending={leave.isPending} onClick={() => leave.mutate()}>
            {t('leave')}
          </Button>
        ) : undefined
      }
    >
      {run.claimedBy && !mine && (
        <Notice kind="warn">
          {t('claimedBy', { name: run.claimedBy.name, time: time(run.claimedBy.at) })}
        </Notice>
      )}
      <RunCards run={run} card={card} />
      <Band
        answer={
          marking.told && {
            ...marking.told,
            action:
              marking.told.undoable.length > 0 ? (
                <Button onClick={marking.undo} pending={marking.pending}>
                  {t('undo')}
                </Button>
              ) : undefined,
          }
        }
      />
      <div className="flex shrink-0 items-center gap-5 border-t border-rule px-(--gutter) pt-1">
        <PieceMarks pieces={run.pieces} />
        <p className="shrink-0 text-right">
          <b className="text-lead" data-testid="bent-count">
            {t('bentCount', { done, count: living })}
          </b>
          <span className="ml-3 text-small text-scribe max-md:hidden">
            {queued === 0 ? t('allBent') : t('scanHint')}
          </span>
        </p>
      </div>
      <footer className="flex shrink-0 flex-wrap items-center gap-3 px-(--gutter) pt-1 pb-2">
        {mayBend && run.claimedBy === null && queued > 0 && (
          <Button variant="primary" pending={claim.isPending} onClick={() => claim.mutate()}>
            {t('take')}
          </Button>
        )}
        {mayBend && mine && queued > 0 && (
          <>
            <CodeEntry
              label={t('pieceCode')}
              action={t('markBent')}
              kinds={['piece']}
              takesScans
              onCode={marking.markBent}
              onFault={marking.tellFault}
            />
            <Button onClick={() => setAsking('several')}>{t('several.open')}</Button>
            <Button onClick={() => setAsking('trouble')}>{t('trouble.open')}</Button>
          </>
        )}
        {/* A run released against the checks has no hits to page through. */}
        <div className={last === 0 ? 'hidden' : 'ml-auto flex gap-3'}>
          <Button disabled={card === 0} onClick={() => setCard(card - 1)}>
            {card <= 1 ? t('toStrip') : t('toStep', { number: card - 1 })}
          </Button>
          <Button
            variant={mine || run.claimedBy ? 'primary' : 'secondary'}
            onClick={() => setCard(next)}
          >
            {card === last ? t('nextPiece') : t('toStep', { number: next })}
          </Button>
        </div>
      </footer>
      <SeveralDialog
        run={run}
        open={asking === 'several'}
        pending={marking.pending}
        onCancel={close}
        onConfirm={(count, inches) => marking.markSeveral(count, inches, close)}
      />
      <TroubleDialog
        run={run}
        open={asking === 'trouble'}
        pending={marking.pending}
        onCancel={close}
        onConfirm={(code, reason) => marking.markSpoiled(code, reason, close)}
      />
    </PlaceFrame>
  )
}
