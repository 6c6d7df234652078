import type { ComponentProps } from 'react'

interface Props extends ComponentProps<'button'> {
  readonly label?: string
}

/** One key. The mouse leaves the focus where it is, so that the hand may go on typing. */
export function Key({ label, children, ...rest }: Props) {
  return (
    <button
      type="button"
      aria-label={label}
      className="flex min-h-[max(var(--target),3rem)] items-center justify-center rounded-control border border-edge bg-sheet font-figure text-title select-none hover:bg-ink/5 active:border-dye active:bg-dye/15"
      onPointerDown={(event) => {
        if (event.pointerType === 'mouse') event.preventDefault()
      }}
      {...rest}
    >
      {children}
    </button>
  )
}
