import { useTranslation } from 'react-i18next'
import type { Starter } from '#shared/profile/starters'
import { findStarterRefusal } from '#shared/profile/starters'
import type { StarterParameter } from '#shared/profile/starters/starter'
import { printAngle } from '#shared/units/angle'
import { DimensionField } from '@/components/keypad/DimensionField'
import { useUnits } from '@/features/people/useUnits'
import { NumberField } from './NumberField'
import type { StarterValues } from './useStarterValues'

interface Props {
  readonly starter: Starter
  readonly values: StarterValues
}

/** What the roof sets of a starter, a field for each, with the range it may have. */
export function StarterFields({ starter, values }: Props) {
  const { t } = useTranslation('shelf')
  const { t: words } = useTranslation('starters')
  const { size, units } = useUnits()

  const print = ({ unit }: StarterParameter, value: number): string =>
    unit === 'inches' ? size(value) : unit === 'degrees' ? printAngle(value) : String(value)

  return (
    <fieldset className="flex flex-col gap-4">
      <legend className="mb-2 font-bold">{t('set.legend')}</legend>
      <div className="grid gap-4 sm:grid-cols-2">
        {starter.parameters.map((parameter) => {
          const { key, least, most, unit } = parameter
          const value = values.valueOf(key)
          const range = { least: print(parameter, least), most: print(parameter, most) }
          const refused = value !== null && findStarterRefusal(parameter, value) !== null
          const shared = {
            label: words(`parameter.${key}`),
            hint: refused ? undefined : t('set.range', range),
            error: refused ? t('set.outOfRange', range) : undefined,
            value,
          }
          return unit === 'inches' ? (
            <DimensionField
              key={key}
              {...shared}
              units={units}
              onChange={(next) => values.enter(key, next)}
            />
          ) : (
            <NumberField
              key={key}
              {...shared}
              malformed={t(`set.malformed.${unit}`)}
              onChange={(next) => values.enter(key, next)}
            />
          )
        })}
      </div>
    </fieldset>
  )
}
