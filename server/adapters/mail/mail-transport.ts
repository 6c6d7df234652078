import type { Language } from '#shared/people/people.contract'

export interface OutgoingAttachment {
  readonly name: string
  readonly mediaType: string
  /** Set for a picture that the HTML shows as `cid:<contentId>`. */
  readonly contentId: string | null
  readonly bytes: Uint8Array
}

export interface OutgoingMail {
  /** Becomes the Message-ID: a mail that is sent twice is known as one. */
  readonly id: string
  readonly to: { readonly name: string; readonly address: string }
  readonly language: Language
  readonly subject: string
  readonly text: string
  readonly html: string
  readonly attachments: readonly OutgoingAttachment[]
}

/** How mails leave. */
export interface MailTransport {
  /** False where they are only kept in the database, for a manager to read. */
  readonly leaves: boolean
  /** Rejects with `MailRefused` for what no further try will cure, with any other error otherwise. */
  readonly send: (mail: OutgoingMail) => Promise<void>
  readonly close: () => void
}

/** The mail server knows that this mail will never arrive: there is no such mailbox. */
export class MailRefused extends Error {
  constructor(message: string, options?: ErrorOptions) {
    super(message, options)
    this.name = 'MailRefused'
  }
}
