import type { BoardActionId } from '../actions/board-action'

/** Drawn from the work itself: sheets, folds and the hand that turns them. 24 x 24. */
const PATHS: Record<BoardActionId, string> = {
  undo: 'M9 6 4 11l5 5M4 11h10a5 5 0 0 1 0 10h-3',
  redo: 'M15 6l5 5-5 5M20 11H10a5 5 0 0 0 0 10h3',
  draw: 'M3 19l6-9 5 4 6-10M20 4v.01M3 19v.01M9 10v.01M14 14v.01',
  deletePart: 'M4 12h6M14 12h6M9 8l6 8M15 8l-6 8',
  splitLeg: 'M3 14h7l2-5 2 5h7',
  addKick: 'M4 7v9l7 5M15 8h6M18 5v6',
  hemA: 'M21 9H7a3.5 3.5 0 0 0 0 7h4',
  hemB: 'M3 9h14a3.5 3.5 0 0 1 0 7h-4',
  flipColor: 'M3 12h18M8 5l-3 3 3 3M5 8h10M16 13l3 3-3 3M19 16H9',
  mirror: 'M12 3v18M9 8 4 16h5zM15 8l5 8h-5z',
  reverse: 'M4 9h14l-4-4M20 15H6l4 4',
  clear: 'M5 7h14M10 7V4h4v3M7 7l1 13h8l1-13',
}

export function ActionIcon({ action }: { action: BoardActionId }) {
  return (
    <svg
      viewBox="0 0 24 24"
      className="size-6 shrink-0"
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
      focusable="false"
    >
      <path d={PATHS[action]} />
    </svg>
  )
}
