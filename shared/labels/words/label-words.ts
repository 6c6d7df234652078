import type { Lift } from '#shared/bundles/lift-rule'
import { EN } from '#shared/labels/words/en'
import { ES } from '#shared/labels/words/es'
import type { Language } from '#shared/people/people.contract'

/** What a label says, in one language. Every language has all of it. */
export interface LabelWords {
  /** Of the file, for its window and for a screen reader. */
  readonly title: string
  readonly pieceOf: (sequence: number, quantity: number) => string
  readonly poNumber: (number: string) => string
  readonly lowEnd: string
  readonly highEnd: string
  /** Beside a sign that points to the label's lower border: which edge of the piece lies there. */
  readonly edgeA: string
  /** How the piece is lifted; one person needs no word. */
  readonly lift: Readonly<Record<Exclude<Lift, 'onePerson'>, string>>
  /** The figure in words. */
  readonly section: (name: string) => string
}

const WORDS: Readonly<Record<Language, LabelWords>> = { en: EN, es: ES }

export const labelWords = (language: Language): LabelWords => WORDS[language]
