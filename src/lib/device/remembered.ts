/**
 * What this device remembers between visits, under the product's own prefix. Storage may be barred
 * (private windows, a strict browser): then nothing is remembered, and nothing breaks.
 */
const PREFIX = 'foldyard.'

const storage = (): Storage | undefined => {
  try {
    return window.localStorage
  } catch {
    return undefined
  }
}

export const recall = (name: string): string | null => storage()?.getItem(PREFIX + name) ?? null

export function remember(name: string, value: string): void {
  try {
    storage()?.setItem(PREFIX + name, value)
  } catch (error) {
    // A full storage costs a remembered choice, not the work: it is only told to the console.
    console.warn(`Cannot remember ${name} on this device.`, error)
  }
}
