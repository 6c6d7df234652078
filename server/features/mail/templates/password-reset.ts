import { mailTemplate } from '#server/features/mail/templates/mail-template'

export interface PasswordResetData {
  readonly name: string
  readonly url: string
  readonly minutes: number
}

export const passwordResetMail = mailTemplate<PasswordResetData>({
  en: ({ name, url, minutes }) => ({
    subject: 'A new password for Foldyard',
    heading: `A new password, ${name}`,
    blocks: [
      { kind: 'text', text: 'Somebody, you we think, asked for a new password for your account.' },
      { kind: 'link', label: 'Choose a new password', url },
      {
        kind: 'remark',
        text: `The link works once and for ${minutes} minutes. Every device where you are signed in is signed out by it. If it was not you, do nothing: your password stays as it is.`,
      },
    ],
  }),
  es: ({ name, url, minutes }) => ({
    subject: 'Una contraseña nueva para Foldyard',
    heading: `Una contraseña nueva, ${name}`,
    blocks: [
      {
        kind: 'text',
        text: 'Alguien, creemos que usted, pidió una contraseña nueva para su cuenta.',
      },
      { kind: 'link', label: 'Elegir contraseña nueva', url },
      {
        kind: 'remark',
        text: `El enlace sirve una sola vez y durante ${minutes} minutos. Al usarlo se cierra su sesión en todos los aparatos. Si no fue usted, no haga nada: su contraseña sigue igual.`,
      },
    ],
  }),
})
