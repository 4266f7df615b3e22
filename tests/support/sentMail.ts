import { expect, vi } from 'vitest'
import type { MailMessage } from '../../server/mail/mailSender.ts'

/** The newest mail to somebody; mail that is sent after the answer is waited for. */
export async function mailTo(sentMail: readonly MailMessage[], address: string): Promise<MailMessage> {
  return vi.waitFor(() => {
    const message = sentMail.findLast(({ to }) => to === address)
    expect(message, `mail to ${address}`).toBeDefined()
    return message as MailMessage
  })
}

/** The token of the link that a mail holds. */
export function tokenIn({ text }: MailMessage): string {
  const [, token] = /\?token=(\S+)/.exec(text) ?? []
  if (!token) throw new Error(`This mail holds no link: ${text}`)
  return token
}
