import { Link } from 'react-router-dom'
import { Icon } from '@/components/Icon'

export function BackLink({ to, label }: { readonly to: string; readonly label: string }) {
  return (
    <Link
      to={to}
      aria-label={label}
      title={label}
      className="frame-actions inline-flex size-target shrink-0 items-center justify-center rounded-control hover:bg-ink/5"
    >
      <Icon name="back" />
    </Link>
  )
}
