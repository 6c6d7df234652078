import type { Dispatch, ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { BoardActionId } from '../actions/board-action'
import type { Board, BoardEvent } from '../model/board'
import { ActionButton } from './ActionButton'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly snapping: boolean
  readonly setSnapping: (on: boolean) => void
  /** On a phone the table of legs takes the place of the part in hand. */
  readonly tabled: boolean
  readonly setTabled: (on: boolean) => void
  /** What else can be done with the drawing, at the end of the row. */
  readonly end?: ReactNode
}

const TOOLS: readonly BoardActionId[] = [
  'draw',
  'deletePart',
  'splitLeg',
  'hemA',
  'hemB',
  'addKick',
  'flipColor',
  'mirror',
  'reverse',
  'clear',
]

/** What can be done to the drawing, in one row that slides under the thumb. */
export function Toolbar({ board, dispatch, snapping, setSnapping, tabled, setTabled, end }: Props) {
  const { t } = useTranslation('drawing')
  return (
    <div
      role="toolbar"
      aria-label={t('view.tools')}
      className="flex shrink-0 items-center overflow-x-auto border-t border-rule"
    >
      <button
        type="button"
        aria-pressed={tabled}
        className="min-h-target shrink-0 px-3 text-dye hover:bg-ink/5 lg:hidden"
        onClick={() => setTabled(!tabled)}
      >
        {tabled ? t('view.part') : t('view.table')}
      </button>
      {TOOLS.map((action) => (
        <ActionButton key={action} action={action} board={board} dispatch={dispatch} />
      ))}
      <label className="flex min-h-target shrink-0 cursor-pointer items-center gap-2 px-3">
        <input
          type="checkbox"
          className="size-5 accent-dye"
          checked={snapping}
          onChange={(event) => setSnapping(event.target.checked)}
        />
        {t('view.snap')}
      </label>
      {end}
    </div>
  )
}
