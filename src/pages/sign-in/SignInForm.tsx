import { zodResolver } from '@hookform/resolvers/zod'
import { useForm } from 'react-hook-form'
import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import { signIn, type Self } from '#shared/people/people.contract'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { TextField } from '@/components/TextField'
import { useSignIn, type Credentials } from '@/features/people/api/people.mutations'

interface Props {
  readonly email: string
  readonly onSignedIn: (person: Self | null) => void
}

export function SignInForm({ email, onSignedIn }: Props) {
  const { t } = useTranslation('sign-in')
  const { mutate, error, isPending } = useSignIn()
  const { register, handleSubmit, formState } = useForm<Credentials>({
    resolver: zodResolver(signIn.body),
    defaultValues: { email, password: '' },
  })
  const { errors } = formState

  const submit = handleSubmit((credentials) =>
    mutate(credentials, { onSuccess: ({ person }) => onSignedIn(person) }),
  )

  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-5">
      <TextField
        label={t('email')}
        type="email"
        inputMode="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        error={errors.email && t('emailWrong')}
        {...register('email')}
      />
      <TextField
        label={t('password')}
        type="password"
        autoComplete="current-password"
        error={errors.password && t('passwordMissing')}
        {...register('password')}
      />
      <ErrorNotice error={error} />
      <Button type="submit" variant="primary" pending={isPending}>
        {t('submit')}
      </Button>
      <Link className="flex min-h-target items-center self-start" to={paths.forgotPassword()}>
        {t('forgot')}
      </Link>
    </form>
  )
}
