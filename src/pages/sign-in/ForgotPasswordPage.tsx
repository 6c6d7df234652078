import { zodResolver } from '@hookform/resolvers/zod'
import { useForm } from 'react-hook-form'
import { useTranslation } from 'react-i18next'
import { askPasswordReset } from '#shared/people/accounts.contract'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'
import { ErrorNotice } from '@/components/ErrorNotice'
import { Notice } from '@/components/Notice'
import { PlainFrame } from '@/components/PlainFrame'
import { TextField } from '@/components/TextField'
import { useAskPasswordReset } from '@/features/people/api/accounts.mutations'
import { useDocumentTitle } from '@/pages/shell/useDocumentTitle'

/** Asks for a link by mail; what is said afterwards does not tell whether there is an account. */
export function ForgotPasswordPage() {
  const { t } = useTranslation('passwords')
  const { mutate, error, isPending, isSuccess, variables } = useAskPasswordReset()
  const { register, handleSubmit, formState } = useForm({
    resolver: zodResolver(askPasswordReset.body),
    defaultValues: { email: '' },
  })
  useDocumentTitle(t('forgot.title'))
  const submit = handleSubmit((body) => mutate(body))

  return (
    <PlainFrame>
      <h1 className="mb-6 text-title font-bold">{t('forgot.title')}</h1>
      {isSuccess ? (
        <Notice kind="done">{t('forgot.done', { email: variables.email })}</Notice>
      ) : (
        <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-5">
          <p>{t('forgot.meaning')}</p>
          <TextField
            label={t('sign-in:email')}
            type="email"
            inputMode="email"
            autoComplete="username"
            autoCapitalize="none"
            spellCheck={false}
            error={formState.errors.email && t('sign-in:emailWrong')}
            {...register('email')}
          />
          <ErrorNotice error={error} />
          <Button type="submit" variant="primary" pending={isPending}>
            {t('forgot.send')}
          </Button>
        </form>
      )}
      <ButtonLink className="mt-5 self-start" to={paths.landing()}>
        {t('forgot.back')}
      </ButtonLink>
    </PlainFrame>
  )
}
