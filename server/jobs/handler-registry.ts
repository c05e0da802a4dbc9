import { ripple } from '../features/push/ripple.service.ts'
import { compareVersion } from './compare-version.ts'
import { deliverWebhook } from './deliver-webhook.ts'
import type { JobHandlers } from './job-handler.ts'
import { mailLink } from './mail-link.ts'
import { renderExports } from './render-exports.ts'
import { sendDigests } from './send-digests.ts'
import { upkeep } from './upkeep.ts'

/** What each kind of job does. */
export const jobHandlers: JobHandlers = {
  'compare-version': compareVersion,
  ripple: (context, { pushId }) => ripple(context, pushId),
  'render-exports': renderExports,
  'send-mail': (context, mail) => context.mailer.send(mail),
  'mail-link': mailLink,
  'deliver-webhook': deliverWebhook,
  'send-digests': sendDigests,
  upkeep,
}
