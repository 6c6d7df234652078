/**
 * What an order's event `redrawn` says, in signs that are read in every language:
 *
 *     6/12 → 8/12: A, B
 *     ∡ 6/12: C
 *
 * First the pitches and the marks whose drawing followed the roof; then the marks whose mitered ends
 * were set for the pitch before: their cuts follow no rule and stay as they are, for the crew to look
 * at. Either list may be empty.
 */
export interface Redrawn {
  /** Rise in 12. */
  readonly from: number
  readonly to: number
  /** Marks with a comma between them; empty for none. */
  readonly drawn: string
  readonly mitered: string
}

const withMarks = (head: string, marks: string): string =>
  marks === '' ? head : `${head}: ${marks}`

export const redrawnText = ({ from, to, drawn, mitered }: Redrawn): string => {
  const first = withMarks(`${from}/12 → ${to}/12`, drawn)
  return mitered === '' ? first : `${first}\n${withMarks(`∡ ${from}/12`, mitered)}`
}

const REDRAWN = /^([\d.]+)\/12 → ([\d.]+)\/12(?:: (.+))?(?:\n∡ [\d.]+\/12: (.+))?$/

/** The text read back, to be said in a person's language; null where it is another text. */
export function readRedrawn(text: string): Redrawn | null {
  const [, from, to, drawn = '', mitered = ''] = REDRAWN.exec(text) ?? []
  if (from === undefined || to === undefined) return null
  return { from: Number(from), to: Number(to), drawn, mitered }
}
