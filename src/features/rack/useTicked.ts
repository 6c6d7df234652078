import { useState } from 'react'

/** Pieces ticked for the next bundle, beginning with the one that was scanned. A piece that is no longer loose is no longer ticked. */
export function useTicked(loose: readonly string[], first: string | null) {
  const [chosen, setChosen] = useState<ReadonlySet<string>>(
    () => new Set(first === null ? [] : [first]),
  )
  const ticked = loose.filter((code) => chosen.has(code))
  return {
    ticked,
    isTicked: (code: string) => chosen.has(code),
    tick: (code: string) => setChosen(new Set([...chosen, code])),
    toggle: (code: string) => {
      const next = new Set(chosen)
      if (!next.delete(code)) next.add(code)
      setChosen(next)
    },
    tickAll: () => setChosen(new Set(loose)),
    clear: () => setChosen(new Set()),
  }
}
