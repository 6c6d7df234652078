import { useState, type ReactNode } from 'react'

interface Props {
  readonly summary: ReactNode
  /** Opens it when it becomes true; closing stays with the person. */
  readonly wanted?: boolean
  readonly children: ReactNode
}

/** What is needed now and then, behind its name. */
export function Disclosure({ summary, wanted = false, children }: Props) {
  const [open, setOpen] = useState(wanted)
  const [seen, setSeen] = useState(wanted)
  if (seen !== wanted) {
    setSeen(wanted)
    if (wanted) setOpen(true)
  }
  return (
    <details open={open} onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="inline-flex min-h-target items-center font-semibold underline">
        {summary}
      </summary>
      {open && <div className="pt-1 pb-2">{children}</div>}
    </details>
  )
}
