import type { Lift } from '#shared/bundles/lift-rule'
import type { Side } from '#shared/ends/end.schema'
import type { Language } from '#shared/people/people.contract'
import type { ColorSide } from '#shared/profile/profile.schema'
import { EN } from '#shared/sheets/words/en'
import { ES } from '#shared/sheets/words/es'

/** What strip sheets and end templates say, in one language. Every language has all of it. */
export interface SheetWords {
  readonly stripSheet: string
  readonly endTemplates: string
  readonly page: (page: number, pages: number) => string
  readonly printed: (day: string) => string
  readonly poNumber: (number: string) => string
  readonly hand: Readonly<Record<Side, string>>
  readonly fact: {
    readonly pieces: string
    readonly left: string
    readonly right: string
    readonly length: string
    readonly stripWidth: string
    readonly girth: string
    readonly statedGirth: string
    readonly blank: string
    readonly weight: string
    readonly stock: string
    readonly colorSide: string
    readonly brake: string
    /** In the brake's place before release. */
    readonly notReleased: string
  }
  readonly colorSide: Readonly<Record<ColorSide, string>>
  readonly section: string
  readonly strip: string
  readonly wholeStrip: string
  readonly creases: {
    readonly title: string
    readonly fold: string
    readonly fromA: string
    readonly way: string
    readonly angle: string
    readonly up: string
    readonly down: string
    readonly bend: (bend: number) => string
    readonly hem: (edge: 'A' | 'B') => string
  }
  readonly end: {
    readonly title: Readonly<Record<Side, string>>
    readonly low: string
    readonly high: string
    readonly square: string
    readonly under: string
    /** What is cut off for a lap that slips under. */
    readonly relief: (length: string) => string
    readonly over: string
    readonly miter: string
    readonly tab: (leg: number, length: string) => string
    readonly opening: (edge: 'A' | 'B', gap: string, length: string) => string
    readonly slits: (count: number) => string
  }
  readonly marks: {
    readonly title: string
    readonly at: string
    readonly fromA: string
    readonly fromEnd: string
    readonly edgeA: string
    readonly edgeB: string
  }
  readonly template: {
    /** What to measure before the paper is laid on the metal; a length as text. */
    readonly check: (length: string) => string
    readonly full: string
    readonly join: string
    readonly noDressedEnd: string
  }
  readonly caution: {
    readonly title: string
    readonly edges: string
    readonly brake: string
    readonly film: string
    readonly lift: Readonly<
      Record<Exclude<Lift, 'onePerson'>, (weight: string, length: string, never: string) => string>
    >
  }
  /** Figures in words, for who cannot see them. */
  readonly figure: {
    readonly section: (name: string) => string
    readonly strip: (name: string) => string
    readonly wholeStrip: (name: string) => string
    readonly end: (name: string, end: string) => string
  }
}

const WORDS: Readonly<Record<Language, SheetWords>> = { en: EN, es: ES }

export const sheetWords = (language: Language): SheetWords => WORDS[language]
