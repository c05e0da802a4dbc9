import type { JobHandlers } from './job-handler.ts'
import { mailLink } from './mail-link.ts'

const later = (): Promise<void> => Promise.resolve()

/** What each kind of job does. */
export const jobHandlers: JobHandlers = {
  'compare-version': later,
  ripple: later,
  'render-exports': later,
  'send-mail': async (context, mail) => {
    await context.mailer.send(mail)
  },
  'mail-link': mailLink,
  'deliver-webhook': later,
  'send-digests': later,
  upkeep: later,
}
