import { useMemo, useSyncExternalStore } from 'react'
import { figureColors, type FigureColors } from '#shared/drawing/figure-colors'
import type { ThemeName } from '#shared/drawing/palette'
import type { FigureLabels } from '#shared/drawing/section-figure'
import { printBend } from '#shared/units/angle'
import type { LengthUnits } from '#shared/units/length-units'
import { printSize, type Denominator } from '#shared/units/print-length'
import { usePerson } from '@/features/people/person-context'

const DARK = '(prefers-color-scheme: dark)'

function followSystem(changed: () => void) {
  const query = window.matchMedia(DARK)
  query.addEventListener('change', changed)
  return () => query.removeEventListener('change', changed)
}

/** The theme that is really shown: the person's choice, or the system's where they left it so. */
export function useShownTheme(): ThemeName {
  const { theme } = usePerson()
  const system = useSyncExternalStore(followSystem, () => window.matchMedia(DARK).matches)
  return theme === 'system' ? (system ? 'dark' : 'light') : theme
}

/** A drawing says its unit once, not at every number. */
export const figureLabels = (units: LengthUnits, denominator: Denominator = 16): FigureLabels => ({
  length: (inches) => printSize(inches, units, denominator).replace(/("| mm)$/, ''),
  angle: (turn) => printBend(turn, 'included'),
})

/** To 16ths for a crew; the shop marks its creases to 32nds. */
export function useFigureLabels(denominator: Denominator = 16): FigureLabels {
  const { units } = usePerson()
  return useMemo(() => figureLabels(units, denominator), [units, denominator])
}

/** `paintHex` is the stock's real color; null draws bare metal. */
export function useFigureColors(paintHex: string | null): FigureColors {
  const theme = useShownTheme()
  return useMemo(() => figureColors(theme, paintHex), [theme, paintHex])
}
