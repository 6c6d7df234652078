import { useId, useState, type ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { IconButton } from '@/components/IconButton'
import { KeyboardIcon } from '@/components/keypad/KeyboardIcon'

interface Props {
  readonly label: string
  readonly text: string
  /** Words behind the value: "inches, outside". */
  readonly unit?: string
  readonly error?: string
  /** Something short at the right end, such as the angle to the next leg. */
  readonly aside?: ReactNode
  readonly onType: (text: string) => void
  readonly onDone?: () => void
}

/**
 * What has been entered, large. It takes typed text from any keyboard; on a touch device the
 * native one comes up only when asked for, since the keys stand below.
 */
export function EntryLine({ label, text, unit, error, aside, onType, onDone }: Props) {
  const { t } = useTranslation('components')
  const id = useId()
  const [native, setNative] = useState(false)

  return (
    <div>
      <div className="flex items-center gap-2">
        <label htmlFor={id} className="shrink-0">
          {label}
        </label>
        <input
          id={id}
          value={text}
          inputMode={native ? 'text' : 'none'}
          autoComplete="off"
          aria-invalid={error !== undefined || undefined}
          aria-describedby={error === undefined ? undefined : `${id}-error`}
          className="min-h-target w-0 min-w-20 flex-1 rounded-control bg-transparent px-1 font-figure text-figure font-bold text-dye aria-invalid:text-chalk"
          onFocus={(event) => event.target.select()}
          onChange={(event) => onType(event.target.value)}
          onKeyDown={(event) => {
            if (event.key === 'Enter' && onDone) {
              event.preventDefault()
              onDone()
            }
          }}
        />
        {unit !== undefined && <span className="shrink-0 text-small text-scribe">{unit}</span>}
        {aside}
        <IconButton
          label={t('keypad.native')}
          aria-pressed={native}
          icon={<KeyboardIcon />}
          onClick={() => {
            setNative(!native)
            document.getElementById(id)?.focus()
          }}
        />
      </div>
      {error !== undefined && (
        <p id={`${id}-error`} role="status" className="pb-1 text-small font-semibold text-chalk">
          {error}
        </p>
      )}
    </div>
  )
}
