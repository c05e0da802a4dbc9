import { createTransport } from 'nodemailer'
import type { Config } from '../config.ts'

export interface Mail {
  readonly to: string
  readonly subject: string
  readonly text: string
}

export interface Mailer {
  send(mail: Mail): Promise<void>
  close(): void
}

/** Sends plain text over SMTP. */
export function createMailer(config: Config): Mailer {
  const transport = createTransport(config.SMTP_URL)
  return {
    async send(mail) {
      await transport.sendMail({
        from: config.MAIL_FROM,
        to: mail.to,
        subject: mail.subject,
        text: mail.text,
        headers: { 'Auto-Submitted': 'auto-generated' },
      })
    },
    close() {
      transport.close()
    },
  }
}
