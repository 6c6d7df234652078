import { describe, expect, it } from 'vitest'
import { invitationMail } from '#server/features/mail/templates/invitation'
import { orderQuestionMail } from '#server/features/mail/templates/order-question'
import { orderReadyMail } from '#server/features/mail/templates/order-ready'
import { orderReceivedMail } from '#server/features/mail/templates/order-received'
import { orderReleasedMail } from '#server/features/mail/templates/order-released'
import { passwordResetMail } from '#server/features/mail/templates/password-reset'
import type { Language } from '#shared/people/people.contract'

/** What somebody could type into a name. */
const SLY = '<img src=x onerror="alert(1)">\r\nBcc: all@example.com & \'co\''
const url = 'https://trim.example.com/x?a=1&b=2'

const order = {
  number: 'F-2001',
  name: SLY,
  job: SLY,
  company: SLY,
  poNumber: SLY,
  neededBy: 'May 4',
  url,
  lines: [{ mark: SLY, name: SLY, quantity: 3, length: `10'`, stock: SLY }],
}

const MAILS = {
  invitation: (language: Language) =>
    invitationMail(language, {
      ...{ name: SLY, inviter: SLY, role: 'crewLead', company: SLY },
      ...{ url, days: 7 },
    }),
  passwordReset: (language: Language) =>
    passwordResetMail(language, { name: SLY, url, minutes: 60 }),
  orderReceived: (language: Language) => orderReceivedMail(language, order),
  question: (language: Language) =>
    orderQuestionMail(language, { ...order, asker: SLY, question: SLY }),
  released: (language: Language) => orderReleasedMail(language, order),
  ready: (language: Language) =>
    orderReadyMail(language, {
      ...order,
      slipCode: 'S7K3M9QX',
      bundles: [{ code: 'B7K3M9QX', rackPlace: SLY, pieces: 3 }],
    }),
}

const LANGUAGES = ['en', 'es'] as const
const all = Object.entries(MAILS).flatMap(([name, write]) =>
  LANGUAGES.map((language) => [name, language, write(language)] as const),
)

describe.each(all)('%s in %s', (_name, language, { subject, text, html }) => {
  it('lets nothing that was typed become HTML', () => {
    expect(html).not.toContain('<img src=x')
    expect(html).toContain(`<html lang="${language}">`)
    expect(html).not.toMatch(/<(script|style|link)/)
  })

  it('has a subject of one line', () => {
    expect(subject).not.toMatch(/[\r\n]/)
    expect(subject).not.toBe('')
  })

  it('says in its text where to go, and carries its link in both', () => {
    expect(text).toContain(url)
    expect(html).toContain(`href="https://trim.example.com/x?a=1&amp;b=2"`)
  })

  it('says of every heading, cell, quote and link which color it has', () => {
    const styles = [...html.matchAll(/<(?:h1|td|th|a|blockquote)\b[^>]* style="([^"]*)"/g)]
    expect(styles.length).toBeGreaterThan(1)
    expect(styles.filter(([, style = '']) => !/(?:^|;)color:/.test(style))).toEqual([])
  })
})

it('every mail is written in words of its own in each language', () => {
  for (const write of Object.values(MAILS)) {
    expect(write('en').text).not.toBe(write('es').text)
  }
})
