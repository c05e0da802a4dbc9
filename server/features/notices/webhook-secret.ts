import type { Config } from '../../config.ts'
import { derivedSecret } from '../../http/secrets.ts'

/** What a webhook's messages are signed with: follows from the server's secret, so that none is stored. */
export const webhookSecret = (config: Config, id: string): string =>
  `fgw_${derivedSecret(config.FOLDGAUGE_SECRET, `webhook ${id}`)}`
