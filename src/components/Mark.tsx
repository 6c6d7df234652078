/** The sign of the product: a flat line folded once, with its color side. */
export function Mark({ className = 'size-7' }: { readonly className?: string }) {
  return (
    <svg
      viewBox="0 0 64 64"
      className={`shrink-0 ${className}`}
      fill="none"
      aria-hidden="true"
      focusable="false"
    >
      <path d="M4 50 H36 A5 5 0 0 0 40.6 47 L56 14" stroke="var(--ink)" strokeWidth="9" />
      <path d="M4 43 H33.5 L49.5 9" stroke="var(--dye)" strokeWidth="5" />
    </svg>
  )
}
