import { useEffect, useState } from 'react'

const SETTLE_MS = 250

/** What has been typed, once the typing pauses: not every letter is a question to the server. */
export function useSettled(text: string): string {
  const [settled, setSettled] = useState(text)
  useEffect(() => {
    const timer = setTimeout(() => setSettled(text), SETTLE_MS)
    return () => clearTimeout(timer)
  }, [text])
  return settled
}
