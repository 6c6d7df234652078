interface Props {
  /** CSS hex of the painted face. */
  readonly hex: string
  readonly name: string
  /** What follows the name: the gauge, for example. */
  readonly detail?: string
}

/** The real color, ringed so that paper-white and near-black stay visible, with its name. */
export function ColorChip({ hex, name, detail }: Props) {
  return (
    <span className="inline-flex items-center gap-2">
      <svg viewBox="0 0 16 16" className="size-[1em] shrink-0" aria-hidden="true" focusable="false">
        <circle cx="8" cy="8" r="7" fill={hex} stroke="var(--edge)" strokeWidth="1.5" />
      </svg>
      <span>
        {name}
        {detail !== undefined && `, ${detail}`}
      </span>
    </span>
  )
}
