const PATHS = {
  back: 'M15 4 7 12l8 8',
  close: 'M5 5l14 14M19 5 5 19',
  menu: 'M4 7h16M4 12h16M4 17h16',
  undo: 'M8 5 3 10l5 5M3 10h11a6 6 0 0 1 0 12h-3',
  redo: 'M16 5l5 5-5 5M21 10H10a6 6 0 0 0 0 12h3',
  erase: 'M9 5h12v14H9l-6-7zM12 9l6 6M18 9l-6 6',
  search: 'M10.5 4a6.5 6.5 0 1 1 0 13 6.5 6.5 0 0 1 0-13M15.5 15.5 21 21',
  plus: 'M12 4v16M4 12h16',
  minus: 'M4 12h16',
  down: 'M5 9l7 7 7-7',
  done: 'M4 13l5 5L20 6',
  warn: 'M12 3 2 21h20zM12 10v5M12 18v.5',
  wrong: 'M12 3a9 9 0 1 1 0 18 9 9 0 0 1 0-18M6 6l12 12',
  sound: 'M4 9v6h4l5 4V5L8 9zM17 8.5a5 5 0 0 1 0 7',
  mute: 'M4 9v6h4l5 4V5L8 9zM17 9l5 6M22 9l-5 6',
  print: 'M7 9V3h10v6M7 17H3V9h18v8h-4M7 14h10v7H7z',
} as const

export type IconName = keyof typeof PATHS

/** A line icon in the color of the words beside it; always next to, or named by, words. */
export function Icon({ name, className = 'size-6' }: { name: IconName; className?: string }) {
  return (
    <svg
      viewBox="0 0 24 24"
      className={`shrink-0 ${className}`}
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
      focusable="false"
    >
      <path d={PATHS[name]} />
    </svg>
  )
}
