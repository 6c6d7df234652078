import type { Language } from '#shared/people/people.contract'

/** A mail as it is read, from top to bottom; text and HTML are both made from it. */
export type MailBlock =
  | { readonly kind: 'text'; readonly text: string }
  /** Somebody's own words. */
  | { readonly kind: 'quote'; readonly text: string }
  | { readonly kind: 'facts'; readonly rows: readonly (readonly [label: string, value: string])[] }
  | {
      readonly kind: 'table'
      readonly head: readonly string[]
      readonly rows: readonly (readonly string[])[]
    }
  | { readonly kind: 'link'; readonly label: string; readonly url: string }
  /** A picture among the attachments; what it says stands in words beside it. */
  | { readonly kind: 'picture'; readonly contentId: string; readonly alt: string }
  | { readonly kind: 'remark'; readonly text: string }

export interface MailWords {
  readonly subject: string
  readonly heading: string
  readonly blocks: readonly MailBlock[]
}

export interface MailContent {
  readonly subject: string
  readonly text: string
  readonly html: string
}

export type MailTemplateFunction<Data> = (language: Language, data: Data) => MailContent
