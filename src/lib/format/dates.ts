import type { Language } from '#shared/people/people.contract'

const LOCALES: Record<Language, string> = { en: 'en-US', es: 'es-US' }

const DAY_MS = 86_400_000

/** A calendar day as the local midnight it begins with; `YYYY-MM-DD`. */
function midnight(day: string): Date {
  const [year, month, date] = day.split('-').map(Number)
  if (year === undefined || month === undefined || date === undefined) {
    throw new RangeError(`Not a day: ${day}`)
  }
  return new Date(year, month - 1, date)
}

const dayNumber = (date: Date): number =>
  Date.UTC(date.getFullYear(), date.getMonth(), date.getDate()) / DAY_MS

/** Whole days from the local day of `now` to `day`: 0 today, 1 tomorrow, -1 yesterday. */
export const daysUntil = (day: string, now: Date): number =>
  dayNumber(midnight(day)) - dayNumber(now)

/** `today`, `tomorrow`, `Thu` within the week, otherwise `Thu, Dec 4`. */
export function formatDay(day: string, language: Language, now: Date): string {
  const locale = LOCALES[language]
  const away = daysUntil(day, now)
  if (Math.abs(away) <= 1) {
    return new Intl.RelativeTimeFormat(locale, { numeric: 'auto' }).format(away, 'day')
  }
  const near = away > 0 && away < 7
  return new Intl.DateTimeFormat(
    locale,
    near ? { weekday: 'long' } : { weekday: 'short', month: 'short', day: 'numeric' },
  ).format(midnight(day))
}

/** `13:42`, on the clock of the device. */
export const formatTime = (moment: string, language: Language): string =>
  new Intl.DateTimeFormat(LOCALES[language], {
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).format(new Date(moment))

const localDay = (date: Date): string =>
  [date.getFullYear(), date.getMonth() + 1, date.getDate()]
    .map((part) => String(part).padStart(2, '0'))
    .join('-')

/** `13:42` for today, otherwise the day before it: `yesterday 13:42`, `Thu, Dec 4 13:42`. */
export function formatMoment(moment: string, language: Language, now: Date): string {
  const day = localDay(new Date(moment))
  const time = formatTime(moment, language)
  return daysUntil(day, now) === 0 ? time : `${formatDay(day, language, now)} ${time}`
}

/** `1,284`, `1284` as the language groups it. */
export const formatCount = (count: number, language: Language): string =>
  new Intl.NumberFormat(LOCALES[language]).format(count)

/** `45 sec`, `2 min 10 sec`: seconds of work, to the next five. */
export function formatDuration(seconds: number, language: Language): string {
  const whole = Math.max(5, Math.ceil(seconds / 5) * 5)
  const print = (value: number, unit: 'minute' | 'second') =>
    new Intl.NumberFormat(LOCALES[language], { style: 'unit', unit, unitDisplay: 'short' }).format(
      value,
    )
  const minutes = Math.floor(whole / 60)
  const rest = whole % 60
  return [
    ...(minutes > 0 ? [print(minutes, 'minute')] : []),
    ...(rest > 0 ? [print(rest, 'second')] : []),
  ].join(' ')
}
