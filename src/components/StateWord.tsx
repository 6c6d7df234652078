import type { ReactNode } from 'react'

export type Tone = 'plain' | 'quiet' | 'waiting' | 'done' | 'attention' | 'dye'

const INK: Record<Tone, string> = {
  plain: 'text-ink',
  quiet: 'text-scribe',
  waiting: 'text-ochre',
  done: 'text-oxide',
  attention: 'text-chalk',
  dye: 'text-dye',
}

interface Props {
  /** The state as a picture of the piece; drawn in the ink of the word. */
  readonly glyph?: ReactNode
  readonly tone?: Tone
  readonly children: ReactNode
}

/** A state: its glyph and its word, never a color alone. */
export function StateWord({ glyph, tone = 'plain', children }: Props) {
  return (
    <span className={`inline-flex items-center gap-2 align-middle whitespace-nowrap ${INK[tone]}`}>
      {glyph !== undefined && (
        <span aria-hidden="true" className="inline-flex shrink-0">
          {glyph}
        </span>
      )}
      <span>{children}</span>
    </span>
  )
}
