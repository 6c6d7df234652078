import type { ComponentProps, ReactNode } from 'react'

interface Props extends Omit<ComponentProps<'button'>, 'aria-label' | 'children'> {
  /** What pressing it does; read out and shown as its hint. */
  readonly label: string
  readonly icon: ReactNode
}

export function IconButton({ label, icon, type = 'button', className = '', ...rest }: Props) {
  return (
    <button
      type={type}
      aria-label={label}
      title={label}
      className={`inline-flex size-target shrink-0 items-center justify-center rounded-control text-ink hover:bg-ink/5 disabled:text-edge ${className}`}
      {...rest}
    >
      {icon}
    </button>
  )
}
