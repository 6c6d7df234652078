import { useCallback, useState } from 'react'

export interface ElementSize {
  readonly width: number
  readonly height: number
}

/** The inner size of an element in pixels, kept up to date; null before it is on the page. */
export function useElementSize() {
  const [size, setSize] = useState<ElementSize | null>(null)
  const ref = useCallback((element: HTMLElement | null) => {
    if (element === null) return
    const measure = () => setSize({ width: element.clientWidth, height: element.clientHeight })
    measure()
    const observer = new ResizeObserver(measure)
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return { ref, size }
}
