import type { Person } from '../../../shared/schemas/account.ts'
import type { MailMessage } from '../../mail/mailSender.ts'

export function passwordResetMail({ person, link }: { person: Person; link: string }): MailMessage {
  return {
    to: person.email,
    subject: 'Set a new Quoinbook password',
    text: [
      `Hello ${person.name},`,
      '',
      'Somebody, you we hope, asked for a new password for your account. Set it here:',
      '',
      link,
      '',
      'The link works once, for one hour. If it was not you, you need do nothing: your password stays as it is.',
      '',
    ].join('\n'),
  }
}
