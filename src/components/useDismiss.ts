import { useEffect, type RefObject } from 'react'

/** Closes something opened beside its button: on Escape, on a press outside, or when the focus leaves. */
export function useDismiss(
  open: boolean,
  root: RefObject<HTMLElement | null>,
  close: (returnFocus: boolean) => void,
): void {
  useEffect(() => {
    if (!open) return
    const outside = (event: Event) => {
      if (event.target instanceof Node && !root.current?.contains(event.target)) close(false)
    }
    const escape = (event: KeyboardEvent) => {
      if (event.key === 'Escape') close(true)
    }
    document.addEventListener('pointerdown', outside)
    document.addEventListener('focusin', outside)
    document.addEventListener('keydown', escape)
    return () => {
      document.removeEventListener('pointerdown', outside)
      document.removeEventListener('focusin', outside)
      document.removeEventListener('keydown', escape)
    }
  }, [open, root, close])
}
