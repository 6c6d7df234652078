import { useTranslation } from 'react-i18next'
import type { ColorSide } from '#shared/profile/profile.schema'
import { Choice } from '@/components/Choice'

interface Props {
  readonly legend: string
  readonly colorSide: ColorSide
  /** +1 for the left of the walk from A to B, -1 for the right. */
  readonly value: 1 | -1
  readonly onChange: (side: 1 | -1) => void
}

/** A side of the sheet, named by its color where one side has it: nobody on a roof walks from A to B. */
export function SideChoice({ legend, colorSide, value, onChange }: Props) {
  const { t } = useTranslation('drawing')
  const name = (side: 1 | -1): string => {
    if (colorSide === 'left') return side > 0 ? t('part.colorSide') : t('part.bareSide')
    if (colorSide === 'right') return side > 0 ? t('part.bareSide') : t('part.colorSide')
    return side > 0 ? t('part.leftSide') : t('part.rightSide')
  }
  return (
    <Choice
      legend={legend}
      value={value > 0 ? 'left' : 'right'}
      options={[
        { value: 'left', label: name(1) },
        { value: 'right', label: name(-1) },
      ]}
      onChange={(side) => onChange(side === 'left' ? 1 : -1)}
    />
  )
}
