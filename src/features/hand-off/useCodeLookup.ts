import { useQueryClient } from '@tanstack/react-query'
import { useRef, useState } from 'react'
import { parseCode } from '#shared/pieces/codes'
import type { ResolvedCode } from '#shared/pieces/lookup.contract'
import type { BandAnswer } from '@/components/Band'
import { codeQuery } from '@/features/pieces/api/pieces.queries'
import { useScanWords } from '@/features/pieces/useScanWords'

/** A piece or a bundle: what belongs to an order. */
export type CodeOfOrder = Extract<ResolvedCode, { orderId: string }>

/**
 * Finds what a label stands for. A run is of no use at the counter and is named and refused;
 * `answer` is what the band says of the last code that led nowhere.
 */
export function useCodeLookup(onFound: (found: CodeOfOrder) => void) {
  const client = useQueryClient()
  const words = useScanWords()
  const scans = useRef(0)
  const [answer, setAnswer] = useState<BandAnswer | null>(null)

  const refuse = (mark: string, { title, detail }: { title: string; detail: string }) =>
    setAnswer({ id: scans.current, kind: 'error', mark, title, detail })

  async function ask(code: string) {
    try {
      const found = await client.fetchQuery(codeQuery(code))
      if (found.kind === 'run') return refuse(code, words.ofFault('otherKind'))
      setAnswer(null)
      onFound(found)
    } catch (error) {
      refuse(code, words.ofError(error))
    }
  }

  /** True when the text is a code, and is being looked up. */
  function lookUp(text: string): boolean {
    const parsed = parseCode(text)
    if (!parsed.ok) return false
    scans.current += 1
    void ask(parsed.code)
    return true
  }

  return { lookUp, answer }
}
