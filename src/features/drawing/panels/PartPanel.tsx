import type { Dispatch } from 'react'
import { useTranslation } from 'react-i18next'
import { isSamePart, type Part } from '#shared/drawing/display-list'
import type { ProfileCure } from '#shared/profile/profile-cure'
import { Button } from '@/components/Button'
import { partsOfProblem } from '../check/check-drawing'
import type { ToldProblem } from '../check/told-problems'
import type { Board, BoardEvent } from '../model/board'
import { partBeside } from '../model/parts-in-order'
import { usePartName } from '../usePartName'
import { useProblemWords } from '../useProblemWords'
import { ActionButton } from './ActionButton'
import { BendPanel } from './BendPanel'
import { CureButton } from './CureButton'
import { HemPanel } from './HemPanel'
import { LegPanel } from './LegPanel'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly told: readonly ToldProblem[]
  readonly onCure: (cure: ProfileCure) => void
  readonly pitchRise: number | null
  /** What follows when the last part has its measure. */
  readonly finish: { readonly label: string; readonly onPress: () => void }
}

/** The part in hand with its keypad, and the way to the next one. */
export function PartPanel({ board, dispatch, told, onCure, pitchRise, finish }: Props) {
  const { t } = useTranslation('drawing')
  const words = useProblemWords()
  const nameOf = usePartName()
  const { profile } = board.history.present
  const { selection } = board

  if (profile === null) {
    const { started } = board.history.present
    return (
      <p className="py-2 text-scribe">{started ? t('canvas.nextHint') : t('canvas.startHint')}</p>
    )
  }
  if (selection === null) {
    return (
      <div className="flex flex-col gap-3">
        <p>
          <span className="font-semibold">{t('part.none')}.</span>{' '}
          <span className="text-scribe">{t('part.noneHint')}</span>
        </p>
        <Button variant="primary" onClick={finish.onPress}>
          {finish.label}
        </Button>
      </div>
    )
  }

  const next = partBeside(profile, selection, 1)
  const goTo = (part: Part) => dispatch({ type: 'select', part })
  const onDone = () => (next ? goTo(next) : finish.onPress())
  const its = told.find(({ problem }) =>
    partsOfProblem(problem).some((part) => isSamePart(part, selection)),
  )
  // The cure of the worst problem stands in the answer bar.
  const cure = its === told[0] ? null : (its?.cure ?? null)
  const shared = {
    board,
    dispatch,
    profile,
    name: nameOf(selection),
    problem: its && words.problem(its.problem),
    onDone,
    children: (
      <>
        {cure && <CureButton profile={profile} cure={cure} onCure={onCure} />}
        <Steps
          previous={partBeside(profile, selection, -1)}
          next={next}
          goTo={goTo}
          finish={finish}
        />
      </>
    ),
  }

  if (selection.kind === 'leg') return <LegPanel {...shared} leg={selection.leg} />
  if (selection.kind === 'bend')
    return <BendPanel {...shared} bend={selection.bend} pitchRise={pitchRise} />
  const hem = selection.edge === 'A' ? profile.hemA : profile.hemB
  if (selection.kind === 'hem' && hem)
    return <HemPanel {...shared} hem={hem} edge={selection.edge} />
  return (
    <div className="flex flex-col gap-3">
      <p>
        <span className="font-semibold">{shared.name}.</span>{' '}
        <span className="text-scribe">{t('part.edgeHint')}</span>
      </p>
      <div className="flex flex-wrap gap-2">
        <ActionButton
          action={selection.edge === 'A' ? 'hemA' : 'hemB'}
          board={board}
          dispatch={dispatch}
          wide
        />
        {selection.edge === 'B' && (
          <ActionButton action="addKick" board={board} dispatch={dispatch} wide />
        )}
      </div>
      {shared.children}
    </div>
  )
}

interface StepsProps {
  readonly previous: Part | null
  readonly next: Part | null
  readonly goTo: (part: Part) => void
  readonly finish: Props['finish']
}

function Steps({ previous, next, goTo, finish }: StepsProps) {
  const { t } = useTranslation('drawing')
  const nameOf = usePartName()
  return (
    <div className="sticky -bottom-3 z-10 -mb-3 grid grid-cols-2 gap-2 bg-sheet pt-1 pb-3">
      <Button disabled={previous === null} onClick={() => previous && goTo(previous)}>
        {previous ? nameOf(previous) : t('part.previous')}
      </Button>
      <Button variant="primary" onClick={() => (next ? goTo(next) : finish.onPress())}>
        {next ? nameOf(next) : finish.label}
      </Button>
    </div>
  )
}
