import { Link, type LinkProps } from 'react-router-dom'
import { buttonStyle, type ButtonVariant } from '@/components/button-style'

interface Props extends LinkProps {
  readonly variant?: ButtonVariant
}

/** A link that stands among buttons and looks like one. */
export function ButtonLink({ variant = 'secondary', className, ...rest }: Props) {
  return <Link className={buttonStyle(variant, className)} data-variant={variant} {...rest} />
}
