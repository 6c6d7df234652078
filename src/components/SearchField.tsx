import { useRef, type Ref } from 'react'
import { useTranslation } from 'react-i18next'
import { CONTROL } from '@/components/field-style'
import { Icon } from '@/components/Icon'

interface Props {
  /** Names the field; shown as its hint too, unless a placeholder is given. */
  readonly label: string
  readonly placeholder?: string
  readonly value: string
  readonly onChange: (text: string) => void
  /** Enter: a hand scanner ends every code with it. */
  readonly onSubmit?: (text: string) => void
  readonly ref?: Ref<HTMLInputElement>
  readonly autoFocus?: boolean
}

/** One line to search or scan into. Escape or its key empties it. */
export function SearchField({
  label,
  placeholder,
  value,
  onChange,
  onSubmit,
  ref,
  autoFocus = false,
}: Props) {
  const { t } = useTranslation('components')
  const form = useRef<HTMLFormElement>(null)

  function empty() {
    onChange('')
    form.current?.querySelector('input')?.focus()
  }

  return (
    <form
      ref={form}
      role="search"
      className="relative"
      onSubmit={(event) => {
        event.preventDefault()
        onSubmit?.(value)
      }}
    >
      <Icon
        name="search"
        className="pointer-events-none absolute top-1/2 left-3 size-5 -translate-y-1/2 text-scribe"
      />
      <input
        ref={ref}
        type="text"
        role="searchbox"
        aria-label={label}
        placeholder={placeholder ?? label}
        value={value}
        autoComplete="off"
        autoCapitalize="none"
        spellCheck={false}
        // eslint-disable-next-line jsx-a11y/no-autofocus -- a scanner types into what has the focus
        autoFocus={autoFocus}
        className={`${CONTROL} pr-11 pl-10`}
        onChange={(event) => onChange(event.target.value)}
        onKeyDown={(event) => {
          if (event.key === 'Escape' && value !== '') empty()
        }}
      />
      {value !== '' && (
        <button
          type="button"
          aria-label={t('search.clear')}
          className="absolute top-0 right-0 flex h-full min-w-11 items-center justify-center text-scribe hover:text-ink"
          onClick={empty}
        >
          <Icon name="close" className="size-5" />
        </button>
      )}
    </form>
  )
}
