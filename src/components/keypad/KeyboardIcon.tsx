export function KeyboardIcon() {
  return (
    <svg
      viewBox="0 0 24 24"
      className="size-6"
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      strokeLinecap="round"
      aria-hidden="true"
      focusable="false"
    >
      <path d="M3 6h18v12H3zM7 10h.01M12 10h.01M17 10h.01M8 14.5h8" />
    </svg>
  )
}
