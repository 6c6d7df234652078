import type { ComponentProps, MouseEvent } from 'react'
import { useTranslation } from 'react-i18next'
import { buttonStyle, type ButtonVariant } from '@/components/button-style'

interface Props extends ComponentProps<'button'> {
  /** One `primary` a screen. */
  readonly variant?: ButtonVariant
  /** While the press is being worked on: further presses do nothing, and the focus stays here. */
  readonly pending?: boolean
}

export function Button({
  variant = 'secondary',
  pending = false,
  type = 'button',
  className,
  onClick,
  children,
  ...rest
}: Props) {
  const { t } = useTranslation('components')

  function press(event: MouseEvent<HTMLButtonElement>) {
    if (pending) event.preventDefault()
    else onClick?.(event)
  }

  return (
    <button
      type={type}
      className={buttonStyle(variant, className)}
      data-variant={variant}
      aria-disabled={pending || undefined}
      onClick={press}
      {...rest}
    >
      {children}
      {pending && (
        <span role="status" className="sr-only">
          {t('working')}
        </span>
      )}
    </button>
  )
}
