import { useState, type FormEvent } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { TextField } from '@/components/TextField'
import { useCreateCompany } from '@/features/people/api/accounts.mutations'
import { refusedField } from '@/features/people/refused-field'

/** Adds a company that orders here. */
export function CompanyForm() {
  const { t } = useTranslation('people')
  const { mutate, error, isPending } = useCreateCompany()
  const [name, setName] = useState('')

  const submit = (event: FormEvent) => {
    event.preventDefault()
    if (isPending || name.trim() === '') return
    mutate({ name }, { onSuccess: () => setName('') })
  }

  const taken = refusedField(error, 'name') && t('companies.taken')
  return (
    <form noValidate onSubmit={submit} className="flex flex-col gap-3">
      <TextField
        label={t('companies.name')}
        maxLength={80}
        autoComplete="off"
        value={name}
        error={taken}
        onChange={(event) => setName(event.target.value)}
      />
      {taken === undefined && <ErrorNotice error={error} />}
      <Button
        type="submit"
        className="self-start"
        pending={isPending}
        disabled={name.trim() === ''}
      >
        {t('companies.add')}
      </Button>
    </form>
  )
}
