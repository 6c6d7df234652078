import type { Language } from '#shared/people/people.contract'
import type { Cents } from '#shared/units/brands'

const LOCALES: Record<Language, string> = { en: 'en-US', es: 'es-US' }

const CENTS_PER_DOLLAR = 100

/**
 * `$1,234.56`: whole cents as dollars, grouped as the language does it in the United States.
 *
 * @throws RangeError for what is not whole cents: a price that was not rounded yet is a fault
 */
export function printMoney(cents: Cents, language: Language): string {
  if (!Number.isSafeInteger(cents)) throw new RangeError(`Not whole cents: ${cents}.`)
  return new Intl.NumberFormat(LOCALES[language], { style: 'currency', currency: 'USD' }).format(
    cents / CENTS_PER_DOLLAR,
  )
}
