import { useMemo, useState, type Dispatch, type ReactNode } from 'react'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { LineQuote } from '#shared/pricing/line-quote'
import type { Profile } from '#shared/profile/profile.schema'
import type { ProfileCure } from '#shared/profile/profile-cure'
import type { Stock } from '#shared/stock/stock.schema'
import { pitchAngle } from '#shared/units/angle'
import type { Inches } from '#shared/units/brands'
import { BoardCanvas } from './canvas/BoardCanvas'
import { partsLit, tellProblems } from './check/told-problems'
import { useFigureColors, useFigureLabels } from './figure/useFigureLook'
import { shownDocument, type Board, type BoardEvent } from './model/board'
import { editProfile } from './model/board-document'
import { cureEvent } from './model/cure-event'
import { AnswerBar } from './panels/AnswerBar'
import { LegTable } from './panels/LegTable'
import { PartPanel } from './panels/PartPanel'
import { ProblemList } from './panels/ProblemList'
import { STRIP_HEIGHT } from './panels/strip-height'
import { StripPanel } from './panels/StripPanel'
import { Toolbar } from './panels/Toolbar'
import { BrakeAnswers } from './plan/BrakeAnswers'
import { useAnswer } from './usePlans'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly stock: Stock
  /** The choice of stock, laid over the corner of the sheet. */
  readonly stockSelect: ReactNode
  readonly pieceLength: Inches
  /** What a line of it as drawn costs; null while that is not known. */
  readonly priceOf: (profile: Profile) => LineQuote | null
  readonly brakes: readonly ShopBrake[]
  /** Rise in 12 of the job's roof. */
  readonly pitchRise: number | null
  readonly finish: { readonly label: string; readonly onPress: () => void }
  /** What else can be done with the drawing, at the end of the tools. */
  readonly toolsEnd?: ReactNode
  /** What the order says of the figures, under them. */
  readonly notice?: ReactNode
}

/** The section and its strip, the figures under them, and the part in hand: on a phone one above the other. */
export function DrawingBoard({
  board,
  dispatch,
  stock,
  stockSelect,
  pieceLength,
  priceOf,
  brakes,
  pitchRise,
  finish,
  toolsEnd,
  notice,
}: Props) {
  const [snapping, setSnapping] = useState(true)
  const [view, setView] = useState<'part' | 'table' | 'brakes' | 'problems'>('part')
  const tabled = view === 'table'
  const colors = useFigureColors(stock.painted ? stock.colorHex : null)
  const labels = useFigureLabels()
  const { profile } = shownDocument(board)
  const { check, plans, confirmed, lookedAt } = useAnswer(profile, stock, pieceLength, brakes)
  const isIdle = board.gesture.kind === 'idle'
  // Cures are of the drawing as it lies; one that is under the finger is only told what it has.
  const told = useMemo(
    () =>
      profile && check
        ? isIdle
          ? tellProblems(profile, stock, check.problems)
          : check.problems.map((problem) => ({ problem, cure: null }))
        : [],
    [profile, stock, check, isIdle],
  )
  const lit = useMemo(() => partsLit(told), [told])
  const cure = (edit: ProfileCure) => dispatch(cureEvent(board, edit, pitchRise))

  return (
    <div className="flex min-h-0 flex-1 flex-col lg:flex-row">
      {/* On a phone the part in hand gives way first: what is told must never be covered. */}
      <div className="flex min-w-0 flex-1 flex-col lg:min-h-0">
        <div className="relative flex min-h-40 flex-1 flex-col">
          <BoardCanvas
            board={board}
            dispatch={dispatch}
            sheet={stock.sheet}
            colors={colors}
            labels={labels}
            {...lit}
            pitch={pitchRise === null ? null : pitchAngle(pitchRise)}
            snapping={snapping}
          />
          <div className="absolute top-2 right-2">{stockSelect}</div>
        </div>
        {/* Its room is kept from the start: the sheet must not shrink under the finger. */}
        <div style={{ minHeight: STRIP_HEIGHT }} className="shrink-0">
          {profile && check?.strip && (
            <StripPanel
              profile={profile}
              strip={check.strip}
              selected={board.selection}
              warnings={lit.warnings}
              dispatch={dispatch}
              colors={colors}
              labels={labels}
            />
          )}
        </div>
        <Toolbar
          board={board}
          dispatch={dispatch}
          snapping={snapping}
          setSnapping={setSnapping}
          tabled={tabled}
          setTabled={(on) => setView(on ? 'table' : 'part')}
          end={toolsEnd}
        />
        <AnswerBar
          check={check}
          plans={plans}
          profile={profile}
          told={told}
          pieceLength={pieceLength}
          quote={profile && check?.strip ? priceOf(profile) : null}
          lying={isIdle}
          confirmed={confirmed}
          lookedAt={lookedAt}
          brakesOpen={view === 'brakes'}
          onBrakes={() => setView(view === 'brakes' ? 'part' : 'brakes')}
          problemsOpen={view === 'problems'}
          onProblems={() => setView(view === 'problems' ? 'part' : 'problems')}
          onCure={cure}
          notice={notice}
        />
      </div>
      <aside className="max-h-[46dvh] min-h-46 overflow-y-auto border-t border-rule bg-sheet px-(--gutter) pb-3 lg:max-h-none lg:w-104 lg:shrink-0 lg:overflow-y-auto lg:border-t-0 lg:border-l">
        {view === 'brakes' && profile ? (
          <BrakeAnswers
            plans={plans}
            brakes={brakes}
            profile={profile}
            stock={stock}
            pieceLength={pieceLength}
            confirmed={confirmed}
            onCure={({ edit }) => {
              if (edit)
                dispatch({ type: 'change', document: editProfile(board.history.present, edit) })
            }}
            onClose={() => setView('part')}
          />
        ) : view === 'problems' && profile && told.length > 0 ? (
          <ProblemList
            profile={profile}
            told={told}
            onCure={cure}
            onPart={(part) => {
              dispatch({ type: 'select', part })
              setView('part')
            }}
            onClose={() => setView('part')}
          />
        ) : (
          <>
            <div className={tabled ? 'hidden lg:block' : ''}>
              <PartPanel
                board={board}
                dispatch={dispatch}
                told={told}
                onCure={cure}
                pitchRise={pitchRise}
                finish={finish}
              />
            </div>
            <div className={tabled ? 'pt-3' : 'hidden pt-4 lg:block'}>
              <LegTable board={board} dispatch={dispatch} />
            </div>
          </>
        )}
      </aside>
    </div>
  )
}
