import { useRef, useState, type FormEvent } from 'react'
import { useTranslation } from 'react-i18next'
import { parseCode, type CodeFault, type CodeKind } from '#shared/pieces/codes'
import { Button } from '@/components/Button'
import { CONTROL } from '@/components/field-style'

interface Props {
  readonly label: string
  /** What the button does: "mark bent". */
  readonly action: string
  /** The kinds of code that mean something here; anything else is named and refused. */
  readonly kinds: readonly CodeKind[]
  readonly disabled?: boolean
  /** The cursor waits here, so that a scanner can be used at once. */
  readonly takesScans?: boolean
  readonly primary?: boolean
  readonly onCode: (code: string, kind: CodeKind) => void
  readonly onFault: (fault: CodeFault | 'otherKind', typed: string) => void
}

/**
 * A field for the code of a label: typed, or from a scanner that types and ends with Enter. What
 * cannot be a code is caught here by its check character; the field is free again at once.
 */
export function CodeEntry({
  label,
  action,
  kinds,
  disabled = false,
  takesScans = false,
  primary = false,
  onCode,
  onFault,
}: Props) {
  const { t } = useTranslation('codes')
  const input = useRef<HTMLInputElement>(null)
  const [text, setText] = useState('')

  function submit(event: FormEvent) {
    event.preventDefault()
    if (disabled) return
    const parsed = parseCode(text)
    if (!parsed.ok) onFault(parsed.fault, text)
    else if (!kinds.includes(parsed.kind)) onFault('otherKind', text)
    else {
      setText('')
      onCode(parsed.code, parsed.kind)
    }
    input.current?.select()
  }

  return (
    <form onSubmit={submit} className="flex items-stretch gap-2">
      <input
        ref={input}
        aria-label={label}
        placeholder={t('placeholder')}
        value={text}
        disabled={disabled}
        // A scanner types where the cursor is: on the floor it waits in this field.
        // eslint-disable-next-line jsx-a11y/no-autofocus
        autoFocus={takesScans}
        autoComplete="off"
        autoCapitalize="characters"
        spellCheck={false}
        enterKeyHint="done"
        className={`${CONTROL} w-44! font-figure uppercase placeholder:normal-case`}
        onChange={(event) => setText(event.target.value)}
      />
      <Button type="submit" variant={primary ? 'primary' : 'secondary'} disabled={disabled}>
        {action}
      </Button>
    </form>
  )
}
