import { useState, type ComponentProps } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { TextField } from '@/components/TextField'

type Props = Omit<ComponentProps<typeof TextField>, 'type' | 'autoComplete'>

/** A new password, typed once: it can be shown, pasted, and made by a password manager. */
export function NewPasswordField(props: Props) {
  const { t } = useTranslation('passwords')
  const [shown, setShown] = useState(false)
  return (
    <div className="flex flex-col items-start gap-2">
      <TextField
        {...props}
        className="w-full"
        type={shown ? 'text' : 'password'}
        autoComplete="new-password"
        autoCapitalize="none"
        spellCheck={false}
      />
      <Button aria-pressed={shown} onClick={() => setShown(!shown)}>
        {t(shown ? 'hide' : 'show')}
      </Button>
    </div>
  )
}
