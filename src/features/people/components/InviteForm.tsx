import { zodResolver } from '@hookform/resolvers/zod'
import { useForm, useWatch } from 'react-hook-form'
import { useTranslation } from 'react-i18next'
import { z } from 'zod'
import { ROLES } from '#shared/access/permissions'
import { textField } from '#shared/http/fields'
import {
  emailField,
  languageSchema,
  roleSchema,
  type Company,
  type PersonRow,
} from '#shared/people/people.contract'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { Select } from '@/components/Select'
import { TextField } from '@/components/TextField'
import { useInvite } from '@/features/people/api/accounts.mutations'
import { usePerson } from '@/features/people/person-context'
import { refusedField } from '@/features/people/refused-field'
import { LANGUAGE_NAMES } from '@/locales/languages'

const formSchema = z
  .object({
    name: textField(80),
    email: emailField,
    role: roleSchema,
    companyId: z.string(),
    language: languageSchema,
    /** Whether the shop invites, which says for whom a crew lead works. */
    byShop: z.boolean(),
  })
  .refine(({ role, companyId, byShop }) => !byShop || role !== 'crewLead' || companyId !== '', {
    path: ['companyId'],
  })

interface Props {
  /** For the shop, which may invite anybody; null for a crew lead, who invites into the own company. */
  readonly companies: readonly Company[] | null
  readonly onInvited: (person: PersonRow) => void
}

/** Opens an account and mails its link. */
export function InviteForm({ companies, onInvited }: Props) {
  const { t } = useTranslation('people')
  const { language } = usePerson()
  const byShop = companies !== null
  const { mutate, error, isPending } = useInvite()
  const { register, handleSubmit, formState, control, reset } = useForm<z.infer<typeof formSchema>>(
    {
      resolver: zodResolver(formSchema),
      defaultValues: {
        name: '',
        email: '',
        role: byShop ? 'bender' : 'crewLead',
        companyId: '',
        language,
        byShop,
      },
    },
  )
  const { errors } = formState
  const role = useWatch({ control, name: 'role' })
  const needsCompany = byShop && role === 'crewLead'

  const submit = handleSubmit(({ companyId, byShop: _, ...invitation }) => {
    if (isPending) return
    mutate(needsCompany ? { ...invitation, companyId } : invitation, {
      onSuccess: (person) => {
        reset()
        onInvited(person)
      },
    })
  })

  const taken = refusedField(error, 'email') && t('invite.emailTaken')
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="flex flex-col gap-5">
      <TextField
        label={t('invite.name')}
        maxLength={80}
        autoComplete="off"
        error={errors.name && t('invite.nameMissing')}
        {...register('name')}
      />
      <TextField
        label={t('invite.email')}
        type="email"
        inputMode="email"
        autoComplete="off"
        autoCapitalize="none"
        spellCheck={false}
        error={errors.email ? t('sign-in:emailWrong') : taken}
        {...register('email')}
      />
      {byShop && (
        <Select
          label={t('invite.role')}
          options={ROLES.map((role) => ({ value: role, label: t(`shell:role.${role}`) }))}
          {...register('role')}
        />
      )}
      {needsCompany && (
        <Select
          label={t('invite.company')}
          placeholder={t('invite.companyChoose')}
          options={companies.map(({ id, name }) => ({ value: id, label: name }))}
          error={errors.companyId && t('invite.companyMissing')}
          {...register('companyId')}
        />
      )}
      <Select
        label={t('invite.language')}
        options={languageSchema.options.map((value) => ({ value, label: LANGUAGE_NAMES[value] }))}
        {...register('language')}
      />
      {taken === undefined && <ErrorNotice error={error} />}
      <Button type="submit" variant="primary" className="self-start" pending={isPending}>
        {t('invite.submit')}
      </Button>
    </form>
  )
}
