import { createHmac } from 'node:crypto'
import { request as httpRequest } from 'node:http'
import { request as httpsRequest } from 'node:https'
import { engineVersion } from '../../../shared/edition.ts'
import { lookupPublic, refusePrivateHost } from './webhook-address.ts'

const patience = 10_000

/** `t=SECONDS,v1=HEX`: HMAC-SHA-256 over `SECONDS.BODY`, so that a recording cannot be replayed later. */
export const signatureOf = (secret: string, body: string, at: Date): string => {
  const seconds = String(Math.floor(at.getTime() / 1000))
  return `t=${seconds},v1=${createHmac('sha256', secret).update(`${seconds}.${body}`).digest('hex')}`
}

/**
 * Posts a message; redirects are not followed and the answer's body is not read.
 * @returns the status of the answer
 */
export function postWebhook(
  url: string,
  body: string,
  headers: { readonly signature: string; readonly event: string },
  isPrivateAllowed: boolean,
): Promise<number> {
  const address = new URL(url)
  if (!isPrivateAllowed) refusePrivateHost(address)
  const request = address.protocol === 'https:' ? httpsRequest : httpRequest
  return new Promise((fulfil, reject) => {
    const sent = request(
      address,
      {
        method: 'POST',
        timeout: patience,
        signal: AbortSignal.timeout(patience),
        ...(isPrivateAllowed ? {} : { lookup: lookupPublic }),
        headers: {
          'content-type': 'application/json',
          'content-length': Buffer.byteLength(body),
          'user-agent': `Foldgauge/${engineVersion}`,
          'foldgauge-event': headers.event,
          'foldgauge-signature': headers.signature,
        },
      },
      (answer) => {
        answer.destroy()
        fulfil(answer.statusCode ?? 0)
      },
    )
    sent.on('timeout', () => sent.destroy(new Error('no answer in time')))
    sent.on('error', reject)
    sent.end(body)
  })
}
