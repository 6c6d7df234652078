import { zodResolver } from '@hookform/resolvers/zod'
import { useForm } from 'react-hook-form'
import { useTranslation } from 'react-i18next'
import type { Job } from '#shared/jobs/jobs.contract'
import type { Company } from '#shared/people/people.contract'
import { Notice } from '@/components/Notice'
import { Select } from '@/components/Select'
import { TextField } from '@/components/TextField'
import { errorWords } from '@/lib/api/error-words'
import type { useCreateJob } from '../api/jobs.mutations'
import { newJobForm, type NewJobFields, type NewJobValues } from '../new-job'

interface Props {
  readonly formId: string
  /** For the shop's people, who say whose job it is; null for a crew lead. */
  readonly companies: readonly Company[] | null
  readonly create: ReturnType<typeof useCreateJob>
  readonly onCreated: (job: Job) => void
}

export function NewJobForm({ formId, companies, create, onCreated }: Props) {
  const { t } = useTranslation('jobs')
  const { register, handleSubmit, formState } = useForm<NewJobFields, unknown, NewJobValues>({
    resolver: zodResolver(newJobForm(companies !== null)),
    defaultValues: { name: '', address: '', pitch: '', companyId: '' },
  })
  const { errors } = formState

  const submit = handleSubmit(({ name, address, pitch, companyId }) => {
    if (create.isPending) return
    create.mutate(
      { name, address, pitchRise: pitch, ...(companyId === '' ? {} : { companyId }) },
      { onSuccess: onCreated },
    )
  })

  return (
    <form
      id={formId}
      noValidate
      className="flex max-w-lg flex-col gap-5"
      onSubmit={(event) => void submit(event)}
    >
      {companies && (
        <Select
          label={t('company')}
          placeholder={t('companyChoose')}
          options={companies.map(({ id, name }) => ({ value: id, label: name }))}
          error={errors.companyId && t('companyMissing')}
          {...register('companyId')}
        />
      )}
      <TextField
        label={t('name')}
        hint={t('nameHint')}
        maxLength={80}
        autoComplete="off"
        error={errors.name && t('nameMissing')}
        {...register('name')}
      />
      <TextField
        label={t('address')}
        maxLength={200}
        autoComplete="off"
        error={errors.address && t('addressLong')}
        {...register('address')}
      />
      <TextField
        label={t('pitch')}
        hint={t('pitchMeaning')}
        inputMode="decimal"
        autoComplete="off"
        error={errors.pitch && t(`pitchRefused.${errors.pitch.message ?? 'malformed'}`)}
        {...register('pitch')}
      />
      {create.error && (
        <Notice kind="error">
          <strong className="block">{t(`problems:${errorWords(create.error)}.happened`)}</strong>
          {t(`problems:${errorWords(create.error)}.todo`)}
        </Notice>
      )}
    </form>
  )
}
