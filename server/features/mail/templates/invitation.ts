import { mailTemplate } from '#server/features/mail/templates/mail-template'
import type { Role } from '#shared/access/permissions'
import type { Language } from '#shared/people/people.contract'

export interface InvitationData {
  readonly name: string
  readonly inviter: string
  readonly role: Role
  /** Of a crew lead. */
  readonly company: string | null
  readonly url: string
  readonly days: number
}

const ROLES: Record<Language, Record<Role, string>> = {
  en: { crewLead: 'crew lead', bender: 'bender', counter: 'counter staff', manager: 'manager' },
  es: {
    crewLead: 'jefe de cuadrilla',
    bender: 'doblador',
    counter: 'personal de mostrador',
    manager: 'gerente',
  },
}

export const invitationMail = mailTemplate<InvitationData>({
  en: ({ name, inviter, role, company, url, days }) => ({
    subject: `${inviter} invites you to Foldyard`,
    heading: `Welcome, ${name}`,
    blocks: [
      {
        kind: 'text',
        text: `${inviter} opened an account for you as ${ROLES.en[role]}${company === null ? '' : ` of ${company}`}. Choose a password and you can sign in.`,
      },
      { kind: 'link', label: 'Choose a password', url },
      {
        kind: 'remark',
        text: `The link works once and for ${days} days. After that, ask ${inviter} for a new one. If you do not know what this is about, do nothing: without a password nobody can sign in.`,
      },
    ],
  }),
  es: ({ name, inviter, role, company, url, days }) => ({
    subject: `${inviter} le invita a Foldyard`,
    heading: `Hola, ${name}`,
    blocks: [
      {
        kind: 'text',
        text: `${inviter} le abrió una cuenta como ${ROLES.es[role]}${company === null ? '' : ` de ${company}`}. Elija una contraseña y ya puede entrar.`,
      },
      { kind: 'link', label: 'Elegir contraseña', url },
      {
        kind: 'remark',
        text: `El enlace sirve una sola vez y durante ${days} días. Después, pida otro a ${inviter}. Si no sabe de qué se trata, no haga nada: sin contraseña nadie puede entrar.`,
      },
    ],
  }),
})
