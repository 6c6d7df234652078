import { NavLink } from 'react-router-dom'

export interface SubNavItem {
  readonly to: string
  readonly label: string
  /** A count beside the word. */
  readonly count?: number
  /** Only this very address is "here", not what lies below it. */
  readonly end?: boolean
}

interface Props {
  readonly label: string
  readonly items: readonly SubNavItem[]
}

/** Words in a row; the one that is here stands over a thick line. */
export function SubNav({ label, items }: Props) {
  return (
    <nav aria-label={label}>
      <ul className="flex gap-5">
        {items.map(({ to, label: word, count, end = false }) => (
          <li key={to}>
            <NavLink
              to={to}
              end={end}
              className="inline-flex min-h-target items-center border-b-3 border-transparent whitespace-nowrap text-scribe hover:text-ink aria-[current=page]:border-dye aria-[current=page]:font-bold aria-[current=page]:text-ink"
            >
              {word}
              {count !== undefined && <span className="ml-2 font-figure">{count}</span>}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  )
}
