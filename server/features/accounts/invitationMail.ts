import type { Person } from '../../../shared/schemas/account.ts'
import type { MailMessage } from '../../mail/mailSender.ts'

interface InvitationMail {
  person: Person
  invitedBy: string
  firmName: string
  link: string
}

export function invitationMail({ person, invitedBy, firmName, link }: InvitationMail): MailMessage {
  return {
    to: person.email,
    subject: `${firmName} invites you to Quoinbook`,
    text: [
      `Hello ${person.name},`,
      '',
      `${invitedBy} invites you to the estimates of ${firmName}. Set your password here:`,
      '',
      link,
      '',
      'The link works once, for seven days. If you expected no invitation, you need do nothing.',
      '',
    ].join('\n'),
  }
}
