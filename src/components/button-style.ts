export type ButtonVariant = 'primary' | 'secondary' | 'quiet' | 'danger' | 'onFill'

const BASE =
  'inline-flex min-h-target min-w-target items-center justify-center gap-2 rounded-control px-4 ' +
  'py-1 text-body font-semibold text-center no-underline select-none ' +
  'disabled:cursor-not-allowed aria-disabled:cursor-not-allowed'

const IDLE =
  'disabled:border-rule disabled:bg-rule disabled:text-scribe aria-disabled:border-rule ' +
  'aria-disabled:bg-rule aria-disabled:text-scribe'

const VARIANTS: Record<ButtonVariant, string> = {
  primary: `border border-dye bg-dye text-paper not-disabled:not-aria-disabled:hover:bg-dye/90 ${IDLE}`,
  secondary: `border border-ink bg-sheet text-ink hover:bg-ink/5 ${IDLE}`,
  quiet: 'text-dye hover:bg-dye/10 disabled:text-scribe aria-disabled:text-scribe',
  /** On a filled band. */
  onFill: 'border border-current text-paper hover:bg-paper/15',
  danger: `border border-chalk bg-sheet text-chalk hover:bg-chalk/10 ${IDLE}`,
}

/** The look of a button, for buttons and for links that stand among them. */
export const buttonStyle = (variant: ButtonVariant, more = ''): string =>
  `${BASE} ${VARIANTS[variant]} ${more}`
