export interface MailMessage {
  to: string
  subject: string
  /** Plain text, whole lines. */
  text: string
}

/** Sends mail: to the outbox in the app, to a mail server, or into a list in tests. */
export interface MailSender {
  send(message: MailMessage): Promise<void>
}
