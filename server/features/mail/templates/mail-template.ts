import { mailHtml } from '#server/features/mail/templates/mail-html'
import { mailText } from '#server/features/mail/templates/mail-text'
import type { MailTemplateFunction, MailWords } from '#server/features/mail/templates/mail-words'
import type { Language } from '#shared/people/people.contract'

/** Why somebody gets the mail, at its foot. */
const FOOT: Record<Language, string> = {
  en: 'Foldyard wrote this for your shop. Nobody reads answers to it.',
  es: 'Foldyard escribió esto para su taller. Nadie lee las respuestas.',
}

/**
 * A mail from its words in every language; the compiler asks for each of them. Words are plain text:
 * what people typed is escaped where HTML is made, and nowhere else.
 */
export const mailTemplate =
  <Data>(words: Record<Language, (data: Data) => MailWords>): MailTemplateFunction<Data> =>
  (language, data) => {
    const said = words[language](data)
    const foot = FOOT[language]
    return {
      // A header is one line, whatever was typed into what it quotes.
      subject: said.subject.replace(/\s+/g, ' ').trim(),
      text: mailText(said, foot),
      html: mailHtml(said, { language, foot }),
    }
  }
