import { useQuery } from '@tanstack/react-query'
import { useEffect, useState, type FormEvent } from 'react'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import { paths } from '@/app/paths'
import { applyLanguage } from '@/app/preferences'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'
import { ErrorNotice } from '@/components/ErrorNotice'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Notice } from '@/components/Notice'
import { PlainFrame } from '@/components/PlainFrame'
import { useSetPassword } from '@/features/people/api/accounts.mutations'
import { passwordLinkQuery } from '@/features/people/api/accounts.queries'
import { NewPasswordField } from '@/features/people/components/NewPasswordField'
import { usePasswordWords } from '@/features/people/usePasswordWords'
import { problemCodeOf } from '@/lib/api/api-errors'
import { useDocumentTitle } from '@/pages/shell/useDocumentTitle'

/** What a link in a mail opens: an invited person's first password, or another in place of a lost one. */
export function SetPasswordPage() {
  const { token = '' } = useParams()
  const { t } = useTranslation('passwords')
  const { data: link, error, refetch } = useQuery(passwordLinkQuery(token))
  useDocumentTitle(t('title'))

  const language = link?.language
  useEffect(() => {
    if (language) void applyLanguage(language)
  }, [language])

  const isOver = problemCodeOf(error) === 'not-found' || problemCodeOf(error) === 'invalid-input'
  return (
    <PlainFrame>
      <h1 className="mb-6 text-title font-bold">
        {link ? t(`heading.${link.kind}`, { name: link.name }) : t('title')}
      </h1>
      {link && <SetPasswordForm token={token} owner={link} />}
      {isOver && <LinkIsOver />}
      {!link && !isOver && error && <ErrorState error={error} onRetry={() => void refetch()} />}
      {!link && !error && <LoadingState />}
    </PlainFrame>
  )
}

function LinkIsOver() {
  const { t } = useTranslation('passwords')
  return (
    <div className="flex flex-col items-start gap-5">
      <Notice kind="warn">
        <strong className="block">{t('over.happened')}</strong>
        {t('over.todo')}
      </Notice>
      <ButtonLink to={paths.forgotPassword()}>{t('over.ask')}</ButtonLink>
    </div>
  )
}

interface FormProps {
  readonly token: string
  readonly owner: { readonly name: string; readonly email: string }
}

function SetPasswordForm({ token, owner }: FormProps) {
  const { t } = useTranslation('passwords')
  const words = usePasswordWords(owner)
  const { mutate, error, isPending, isSuccess } = useSetPassword()
  const [password, setPassword] = useState('')
  const [judged, setJudged] = useState<string>()

  const submit = (event: FormEvent) => {
    event.preventDefault()
    const problem = words.judge(password)
    setJudged(problem)
    if (problem === undefined && !isPending) mutate({ token, password })
  }

  if (isSuccess) {
    return (
      <div className="flex flex-col items-start gap-5">
        <Notice kind="done">{t('done')}</Notice>
        <ButtonLink variant="primary" to={paths.landing()}>
          {t('signIn')}
        </ButtonLink>
      </div>
    )
  }
  if (problemCodeOf(error) === 'not-found') return <LinkIsOver />
  const refusal = words.refusal(error)
  return (
    <form noValidate onSubmit={submit} className="flex flex-col gap-5">
      <p>{t('for', { email: owner.email })}</p>
      {/* Tells a password manager whose it is. */}
      <input type="email" autoComplete="username" value={owner.email} readOnly hidden />
      <NewPasswordField
        label={t('new')}
        hint={words.hint}
        error={judged ?? refusal}
        value={password}
        onChange={(event) => setPassword(event.target.value)}
      />
      {refusal === undefined && <ErrorNotice error={error} />}
      <Button type="submit" variant="primary" pending={isPending}>
        {t('set')}
      </Button>
    </form>
  )
}
