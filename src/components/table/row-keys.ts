import type { KeyboardEvent } from 'react'

/** Which row a key goes to, of `count` rows; undefined for any other key or past the ends. */
export function rowAfterKey(key: string, at: number, count: number): number | undefined {
  const targets: Record<string, number> = {
    ArrowDown: at + 1,
    ArrowUp: at - 1,
    Home: 0,
    End: count - 1,
  }
  const next = targets[key]
  return next !== undefined && next >= 0 && next < count ? next : undefined
}

/** On the link of a row: arrow keys, Home and End go to those of the other rows. */
export function moveBetweenRows(event: KeyboardEvent<HTMLElement>): void {
  const links = [
    ...(event.currentTarget.closest('tbody')?.querySelectorAll<HTMLElement>('[data-row-link]') ??
      []),
  ]
  const at = links.findIndex((link) => link === event.currentTarget)
  if (at < 0) return
  const next = rowAfterKey(event.key, at, links.length)
  if (next === undefined) return
  event.preventDefault()
  links[next]?.focus()
}
