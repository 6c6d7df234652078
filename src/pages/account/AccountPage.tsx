import { useTranslation } from 'react-i18next'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { NameForm } from '@/pages/account/NameForm'
import { PasswordSection } from '@/pages/account/PasswordSection'
import { SessionsSection } from '@/pages/account/SessionsSection'
import { SpeechSection } from '@/pages/account/SpeechSection'
import { ButtonLink } from '@/components/ButtonLink'
import { paths } from '@/app/paths'
import { useMay, usePerson } from '@/features/people/person-context'

/** What a person may set for themselves: name, language, units, theme; and signing out. */
export function AccountPage() {
  const { t } = useTranslation('account')
  const person = usePerson()
  const leadsCrew = useMay('crew.read')
  return (
    <PlaceFrame
      title={t('title')}
      subtitle={person.email}
      back={{ to: paths.landing(), label: t('back') }}
    >
      <div className="flex max-w-xl flex-col gap-8">
        <NameForm />
        <SpeechSection />
        {leadsCrew && (
          <ButtonLink className="self-start" to={paths.crew()}>
            {t('crew')}
          </ButtonLink>
        )}
        <PasswordSection />
        <SessionsSection />
      </div>
    </PlaceFrame>
  )
}
