import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { FigureLabels } from '#shared/drawing/section-figure'
import { sectionFigure } from '#shared/drawing/section-figure'
import type { Profile } from '#shared/profile/profile.schema'
import { includedAngle, printAngle } from '#shared/units/angle'
import type { Degrees, Inches } from '#shared/units/brands'
import { SvgFigure } from '@/features/drawing/figure/SvgFigure'
import { useFigureColors } from '@/features/drawing/figure/useFigureLook'

/** Legs of different length, so that their names can be told apart. Thick, to show what is outside. */
const LEG_A: Inches = 3
const LEG_B: Inches = 2
const SHEET = { thickness: 0.06, insideRadius: 0.06, kFactor: 0.41 }

const profileOf = (turn: Degrees): Profile => ({
  version: 1,
  legs: [LEG_A, LEG_B],
  bends: [{ turn }],
  hemA: null,
  hemB: null,
  colorSide: 'none',
})

/** Which two dimensions and which angle are measured on a test bend. */
export function TestBendPicture({ turn }: { readonly turn: Degrees }) {
  const { t } = useTranslation('stocks')
  const colors = useFigureColors(null)
  const display = useMemo(() => {
    const labels: FigureLabels = {
      length: (inches) => t(inches === LEG_A ? 'testBend.legA' : 'testBend.legB'),
      angle: (bend) => printAngle(includedAngle(bend)),
    }
    return sectionFigure(
      profileOf(turn),
      { ...SHEET, metal: 'steel', density: 0.28, springbackPer90: 0 },
      { width: 320, height: 240, labels, show: { edges: false } },
    ).display
  }, [t, turn])
  return (
    <figure className="flex flex-col gap-2">
      <SvgFigure
        display={display}
        colors={colors}
        title={t('testBend.picture')}
        className="max-w-full"
      />
      <figcaption className="text-small text-scribe">{t('testBend.pictureMeaning')}</figcaption>
    </figure>
  )
}
