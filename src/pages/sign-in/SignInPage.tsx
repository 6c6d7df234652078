import { useTranslation } from 'react-i18next'
import { useNavigate } from 'react-router-dom'
import type { Language, Self } from '#shared/people/people.contract'
import { paths } from '@/app/paths'
import { applyLanguage } from '@/app/preferences'
import { Notice } from '@/components/Notice'
import { PlainFrame } from '@/components/PlainFrame'
import { asLanguage, LANGUAGE_NAMES, LANGUAGES } from '@/locales/languages'
import { SignInForm } from '@/pages/sign-in/SignInForm'
import { useDocumentTitle } from '@/pages/shell/useDocumentTitle'

function LanguageChoice() {
  const { t, i18n } = useTranslation('sign-in')
  const present = asLanguage(i18n.language)
  const choose = (language: Language) => void applyLanguage(language)
  return (
    <div role="group" aria-label={t('language')} className="mt-auto flex gap-1 pt-10 sm:mt-0">
      {LANGUAGES.map((language) => (
        <button
          key={language}
          type="button"
          lang={language}
          aria-pressed={language === present}
          className="min-h-target border-b-3 border-transparent px-3 text-scribe aria-pressed:border-dye aria-pressed:font-bold aria-pressed:text-ink"
          onClick={() => choose(language)}
        >
          {LANGUAGE_NAMES[language]}
        </button>
      ))}
    </div>
  )
}

/** The door. With `ended`, a session ended by itself and its screen waits beneath. */
export function SignInPage({ ended }: { readonly ended: Self | null }) {
  const { t } = useTranslation('sign-in')
  const navigate = useNavigate()
  useDocumentTitle(t('title'))

  const onSignedIn = (person: Self | null) => {
    if (ended && person?.id !== ended.id) void navigate(paths.landing(), { replace: true })
  }

  return (
    <PlainFrame>
      <h1 className="mb-6 text-title font-bold">{t('title')}</h1>
      {ended && (
        <div className="mb-6">
          <Notice kind="warn">{t('ended', { name: ended.name })}</Notice>
        </div>
      )}
      <SignInForm email={ended?.email ?? ''} onSignedIn={onSignedIn} />
      <LanguageChoice />
    </PlainFrame>
  )
}
