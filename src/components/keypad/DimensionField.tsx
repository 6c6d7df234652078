import { useId, useRef, useState, type PointerEvent } from 'react'
import { useTranslation } from 'react-i18next'
import type { Inches } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'
import { Field } from '@/components/Field'
import { CONTROL, describedBy, type FieldLabels } from '@/components/field-style'
import { typeText, type KeypadPurpose } from '@/components/keypad/keypad-model'
import { LengthKeys } from '@/components/keypad/LengthKeys'
import { useKeypad } from '@/components/keypad/useKeypad'
import { useRefusalWords } from '@/components/keypad/useRefusalWords'
import { useDismiss } from '@/components/useDismiss'

interface Props extends FieldLabels {
  readonly value: Inches | null
  readonly units: LengthUnits
  readonly purpose?: KeypadPurpose
  readonly placeholder?: string
  readonly disabled?: boolean
  readonly className?: string
  /** Null while what stands there cannot be read as a length. */
  readonly onChange: (inches: Inches | null) => void
  readonly onBlur?: () => void
}

/**
 * A length among other fields: typed in any way a length is written, or with the shop keypad,
 * which opens below it when it is touched. What cannot be read is said once the field is left.
 */
export function DimensionField({
  label,
  hint,
  error,
  value,
  units,
  purpose = 'size',
  placeholder,
  disabled = false,
  className,
  onChange,
  onBlur,
}: Props) {
  const { t } = useTranslation('components')
  const words = useRefusalWords()
  const id = useId()
  const root = useRef<HTMLDivElement>(null)
  const keypad = useKeypad({ value, units, purpose, onChange })
  const [open, setOpen] = useState(false)
  const [left, setLeft] = useState(false)
  useDismiss(open, root, setClosed)

  function setClosed() {
    setOpen(false)
  }

  function openOnTouch(event: PointerEvent) {
    if (event.pointerType !== 'mouse') setOpen(true)
  }

  const unreadable =
    left && !keypad.length.ok && keypad.text !== '' ? words(keypad.length) : undefined
  const shown = unreadable ?? error

  return (
    <div ref={root} className={className}>
      <Field id={id} label={label} hint={hint} error={shown}>
        <span className="flex gap-2">
          <input
            id={id}
            value={keypad.text}
            placeholder={placeholder}
            disabled={disabled}
            inputMode={open ? 'none' : 'text'}
            autoComplete="off"
            className={`${CONTROL} font-figure`}
            aria-invalid={shown !== undefined || undefined}
            aria-describedby={describedBy(id, { hint, error: shown })}
            onPointerDown={openOnTouch}
            onChange={(event) => keypad.press((state) => typeText(state, event.target.value))}
            onBlur={() => {
              setLeft(true)
              onBlur?.()
            }}
          />
          <button
            type="button"
            disabled={disabled}
            aria-expanded={open}
            aria-label={t('keypad.open', { label })}
            className="inline-flex size-target shrink-0 items-center justify-center rounded-control border border-edge bg-sheet font-figure text-small hover:bg-ink/5"
            onClick={() => setOpen(!open)}
          >
            1/2
          </button>
        </span>
      </Field>
      {open && (
        <div className="mt-2">
          <LengthKeys {...keypad} />
        </div>
      )}
    </div>
  )
}
