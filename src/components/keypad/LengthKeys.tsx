import { useTranslation } from 'react-i18next'
import { Icon } from '@/components/Icon'
import { Key } from '@/components/keypad/Key'
import {
  pressDigit,
  pressErase,
  pressFeet,
  pressPoint,
  pressTick,
} from '@/components/keypad/keypad-model'
import { Tape } from '@/components/keypad/Tape'
import type { Keypad } from '@/components/keypad/useKeypad'

const UPPER = [1, 2, 3, 4, 5]
const LOWER = [6, 7, 8, 9, 0]

/**
 * The keys of the shop keypad: digits, ft and the tape where fractions are read; digits and a
 * decimal point in place of the tape for decimal inches and millimeters.
 */
export function LengthKeys({ state, press }: Keypad) {
  const { t } = useTranslation('components')
  const fractions = state.units === 'fraction'

  const digit = (value: number) => (
    <Key key={value} onClick={() => press((now) => pressDigit(now, value))}>
      {value}
    </Key>
  )

  return (
    <div role="group" aria-label={t('keypad.keys')} className="flex max-w-3xl flex-col gap-2">
      <div className="grid grid-cols-6 gap-2">
        {UPPER.map(digit)}
        {fractions ? (
          <Key label={t('keypad.feet')} onClick={() => press(pressFeet)}>
            ft
          </Key>
        ) : (
          <Key label={t('keypad.point')} onClick={() => press(pressPoint)}>
            .
          </Key>
        )}
        {LOWER.map(digit)}
        <Key label={t('keypad.erase')} onClick={() => press(pressErase)}>
          <Icon name="erase" />
        </Key>
      </div>
      {fractions && (
        <Tape
          value={state.sixteenths}
          onChange={(sixteenths) => press((now) => pressTick(now, sixteenths))}
        />
      )}
    </div>
  )
}
