import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { Cents } from '#shared/units/brands'
import { printMoney } from '#shared/units/money'
import {
  daysUntil,
  formatCount,
  formatDay,
  formatDuration,
  formatMoment,
  formatTime,
} from '@/lib/format/dates'
import { asLanguage } from '@/locales/languages'

/** Days, times, counts and money in the language on screen, on the clock of the device. */
export function useFormats() {
  const { i18n } = useTranslation()
  const language = asLanguage(i18n.language)
  return useMemo(
    () => ({
      day: (day: string) => formatDay(day, language, new Date()),
      daysUntil: (day: string) => daysUntil(day, new Date()),
      time: (moment: string) => formatTime(moment, language),
      moment: (moment: string) => formatMoment(moment, language, new Date()),
      duration: (seconds: number) => formatDuration(seconds, language),
      count: (count: number) => formatCount(count, language),
      money: (cents: Cents) => printMoney(cents, language),
    }),
    [language],
  )
}
