import { useTranslation } from 'react-i18next'
import { languageSchema, themeSchema, unitsSchema } from '#shared/people/people.contract'
import { Choice } from '@/components/Choice'
import { ErrorNotice } from '@/components/ErrorNotice'
import { useUpdateSelf } from '@/features/people/api/people.mutations'
import { usePerson } from '@/features/people/person-context'
import { LANGUAGE_NAMES } from '@/locales/languages'

/** How the product speaks to the person. Each choice is saved as it is made. */
export function SpeechSection() {
  const { t } = useTranslation('account')
  const person = usePerson()
  const { mutate, error, isPending, variables } = useUpdateSelf()
  const chosen = isPending ? { ...person, ...variables } : person
  return (
    <div className="flex flex-col gap-6">
      <Choice
        legend={t('language')}
        value={chosen.language}
        options={languageSchema.options.map((value) => ({ value, label: LANGUAGE_NAMES[value] }))}
        onChange={(language) => mutate({ language })}
      />
      <Choice
        legend={t('units')}
        value={chosen.units}
        options={unitsSchema.options.map((value) => ({ value, label: t(`unit.${value}`) }))}
        onChange={(units) => mutate({ units })}
      />
      <Choice
        legend={t('theme')}
        value={chosen.theme}
        options={themeSchema.options.map((value) => ({ value, label: t(`themes.${value}`) }))}
        onChange={(theme) => mutate({ theme })}
      />
      <ErrorNotice error={error} />
    </div>
  )
}
