import { zodResolver } from '@hookform/resolvers/zod'
import { useForm } from 'react-hook-form'
import { useTranslation } from 'react-i18next'
import { z } from 'zod'
import { textField } from '#shared/http/fields'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { Notice } from '@/components/Notice'
import { TextField } from '@/components/TextField'
import { useUpdateSelf } from '@/features/people/api/people.mutations'
import { usePerson } from '@/features/people/person-context'

const nameSchema = z.strictObject({ name: textField(80) })

export function NameForm() {
  const { t } = useTranslation('account')
  const person = usePerson()
  const { mutate, error, isPending, isSuccess } = useUpdateSelf()
  const { register, handleSubmit, formState } = useForm({
    resolver: zodResolver(nameSchema),
    values: { name: person.name },
  })

  const submit = handleSubmit((change) => mutate(change))

  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-3">
      <div className="flex flex-wrap items-start gap-3">
        <TextField
          label={t('name')}
          autoComplete="name"
          maxLength={80}
          className="min-w-56 flex-1"
          error={formState.errors.name && t('nameMissing')}
          {...register('name')}
        />
        <Button
          type="submit"
          className="mt-[calc(var(--body)*1.5+0.375rem)]"
          pending={isPending}
          disabled={!formState.isDirty}
        >
          {t('saveName')}
        </Button>
      </div>
      <ErrorNotice error={error} />
      {isSuccess && !formState.isDirty && <Notice kind="done">{t('saved')}</Notice>}
    </form>
  )
}
