import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { Brake } from '#shared/bend-plan/brake.schema'
import type { Contact } from '#shared/bend-plan/explain/contact.schema'
import { stepFigure } from '#shared/drawing/step-figure'
import { vector } from '#shared/geometry/vector'
import type { ColorSide } from '#shared/profile/profile.schema'
import { SvgFigure } from '../figure/SvgFigure'
import { useFigureColors } from '../figure/useFigureLook'

interface Props {
  readonly contact: Contact
  readonly brake: Brake
  readonly colorSide: ColorSide
  readonly paintHex: string | null
}

const SIZE = { width: 300, height: 190 }

/** The piece in the brake at the moment it meets something, with the place ringed. */
export function ContactPicture({ contact, brake, colorSide, paintHex }: Props) {
  const { t } = useTranslation('why')
  const colors = useFigureColors(paintHex)
  const display = useMemo(() => {
    const points = (chain: Contact['rear']) => chain.map(([x, y]) => vector(x, y))
    const paintedUp =
      colorSide === 'left' || colorSide === 'right'
        ? (colorSide === 'left') === contact.leftUp
        : null
    const front = points(contact.front)
    return stepFigure(
      {
        clamped: points(contact.rear),
        frontBefore: front,
        frontAfter: front,
        swings: [],
        swung: contact.swung,
        edgeAtFront: contact.aBack ? 'B' : 'A',
        edgeAtBack: contact.aBack ? 'A' : 'B',
        paintedUp,
      },
      {
        ...SIZE,
        direction: contact.direction,
        tools: contact.direction === 'up' ? brake.up : (brake.down ?? brake.up),
        textSize: 11,
        mark: vector(...contact.at),
      },
    )
  }, [contact, brake, colorSide])
  return (
    <SvgFigure
      display={display}
      colors={colors}
      title={t('contact', { against: t(`against.${contact.against}`) })}
      className="h-auto max-w-full border border-rule bg-paper"
    />
  )
}
