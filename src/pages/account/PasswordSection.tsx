import { useState, type FormEvent } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { Notice } from '@/components/Notice'
import { TextField } from '@/components/TextField'
import { useChangePassword } from '@/features/people/api/accounts.mutations'
import { NewPasswordField } from '@/features/people/components/NewPasswordField'
import { usePerson } from '@/features/people/person-context'
import { refusedField } from '@/features/people/refused-field'
import { usePasswordWords } from '@/features/people/usePasswordWords'

/** Another password, with the one held now; every other device is signed out by it. */
export function PasswordSection() {
  const { t } = useTranslation('passwords')
  const person = usePerson()
  const words = usePasswordWords({
    name: person.name,
    email: person.email,
    company: person.company?.name ?? null,
  })
  const { mutate, error, isPending, isSuccess, reset } = useChangePassword()
  const [current, setCurrent] = useState('')
  const [password, setPassword] = useState('')
  const [judged, setJudged] = useState<string>()

  const submit = (event: FormEvent) => {
    event.preventDefault()
    const problem = words.judge(password)
    setJudged(problem)
    if (problem !== undefined || isPending) return
    mutate(
      { current, password },
      {
        onSuccess: () => {
          setCurrent('')
          setPassword('')
        },
      },
    )
  }

  const wrong = refusedField(error, 'current') && t('currentWrong')
  const refusal = words.refusal(error)
  return (
    <section className="flex flex-col gap-3 border-t border-rule pt-6">
      <h2 className="font-semibold">{t('change.title')}</h2>
      <form noValidate onSubmit={submit} className="flex flex-col gap-4">
        <input type="email" autoComplete="username" value={person.email} readOnly hidden />
        <TextField
          label={t('current')}
          type="password"
          autoComplete="current-password"
          value={current}
          error={wrong}
          onChange={(event) => {
            reset()
            setCurrent(event.target.value)
          }}
        />
        <NewPasswordField
          label={t('new')}
          hint={words.hint}
          error={judged ?? refusal}
          value={password}
          onChange={(event) => {
            reset()
            setPassword(event.target.value)
          }}
        />
        {wrong === undefined && refusal === undefined && <ErrorNotice error={error} />}
        {isSuccess && <Notice kind="done">{t('change.done')}</Notice>}
        <Button
          type="submit"
          className="self-start"
          pending={isPending}
          disabled={current === '' || password === ''}
        >
          {t('change.submit')}
        </Button>
      </form>
    </section>
  )
}
