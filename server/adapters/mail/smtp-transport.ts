import nodemailer from 'nodemailer'
import {
  MailRefused,
  type MailTransport,
  type OutgoingMail,
} from '#server/adapters/mail/mail-transport'

const CONNECT_MS = 10_000
const SILENCE_MS = 30_000

export interface SmtpOptions {
  /** `smtp://` (STARTTLS where the server has it) or `smtps://`, with user and password. */
  readonly url: string
  /** `Name <name@example.com>` or the address alone. */
  readonly from: string
}

/** Sends through a mail server, over kept connections. */
export function smtpTransport({ url, from }: SmtpOptions): MailTransport {
  const transport = nodemailer.createTransport({
    url,
    pool: true,
    connectionTimeout: CONNECT_MS,
    greetingTimeout: CONNECT_MS,
    socketTimeout: SILENCE_MS,
    // A mail is built from strings and bytes alone; nothing is read from disk or net for it.
    disableFileAccess: true,
    disableUrlAccess: true,
  })
  const domain = /@([^>\s]+)>?\s*$/.exec(from)?.[1] ?? 'foldyard.invalid'
  return {
    leaves: true,
    send: async (mail) => {
      try {
        await transport.sendMail({ from, ...messageOf(mail, domain) })
      } catch (error) {
        throw isRefusal(error) ? new MailRefused(error.message, { cause: error }) : error
      }
    },
    close: () => transport.close(),
  }
}

const messageOf = (mail: OutgoingMail, domain: string) => ({
  to: mail.to,
  subject: mail.subject,
  text: mail.text,
  html: mail.html,
  messageId: `<${mail.id}@${domain}>`,
  headers: { 'Content-Language': mail.language, 'Auto-Submitted': 'auto-generated' },
  attachments: mail.attachments.map(({ name, mediaType, contentId, bytes }) => ({
    filename: name,
    contentType: mediaType,
    content: Buffer.from(bytes),
    ...(contentId !== null && { cid: contentId, contentDisposition: 'inline' as const }),
  })),
})

/** A 5xx answer to the recipient's address (RFC 5321, 4.2.1); other troubles may pass. */
function isRefusal(error: unknown): error is Error {
  return (
    error instanceof Error &&
    'code' in error &&
    error.code === 'EENVELOPE' &&
    'responseCode' in error &&
    typeof error.responseCode === 'number' &&
    error.responseCode >= 500
  )
}
