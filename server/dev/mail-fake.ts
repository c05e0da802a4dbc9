import { appendFileSync, existsSync, mkdirSync, readFileSync } from 'node:fs'
import { createServer } from 'node:http'
import { dirname } from 'node:path'
import PostalMime from 'postal-mime'
import { SMTPServer } from 'smtp-server'

export interface KeptMail {
  readonly to: readonly string[]
  readonly subject: string
  readonly text: string
  readonly at: string
}

export interface MailFake {
  /** For SMTP_URL. */
  readonly url: string
  readonly mails: readonly KeptMail[]
  stop(): Promise<void>
}

/** A mail server on loopback that delivers nothing and keeps everything: development and tests only. */
export async function startMailFake(port = 0, file: string | null = null): Promise<MailFake> {
  const mails: KeptMail[] =
    file !== null && existsSync(file)
      ? readFileSync(file, 'utf8')
          .split('\n')
          .filter((line) => line !== '')
          .map((line) => JSON.parse(line) as KeptMail)
      : []
  if (file !== null) mkdirSync(dirname(file), { recursive: true })
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    disableReverseLookup: true,
    onData(stream, session, done) {
      const chunks: Buffer[] = []
      stream.on('data', (chunk: Buffer) => chunks.push(chunk))
      stream.on('end', () => {
        PostalMime.parse(Buffer.concat(chunks)).then(
          (mail) => {
            const kept = {
              to: session.envelope.rcptTo.map(({ address }) => address),
              subject: mail.subject ?? '',
              text: mail.text ?? '',
              at: new Date().toISOString(),
            }
            mails.push(kept)
            if (file !== null) appendFileSync(file, `${JSON.stringify(kept)}\n`)
            done()
          },
          (error: unknown) => {
            done(error instanceof Error ? error : new Error(String(error)))
          },
        )
      })
    },
  })
  await new Promise<void>((fulfil) => server.listen(port, '127.0.0.1', fulfil))
  const address = server.server.address()
  const real = typeof address === 'object' && address !== null ? address.port : port
  return {
    url: `smtp://127.0.0.1:${String(real)}`,
    mails,
    stop: () => new Promise((fulfil) => server.close(() => fulfil())),
  }
}

const escaped = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;')

/** Addresses in a mail can be clicked. */
const linked = (text: string): string =>
  escaped(text).replace(/https?:\/\/[^\s<]+/g, (link) => `<a href="${link}">${link}</a>`)

/** Shows what was kept in the browser, newest first. */
export function showMails(
  fake: Pick<MailFake, 'mails'>,
  port: number,
): Promise<{ readonly url: string; stop(): void }> {
  const server = createServer((_request, response) => {
    const items = fake.mails
      .toReversed()
      .slice(0, 200)
      .map(
        (mail) =>
          `<article><h2>${escaped(mail.subject)}</h2><p>To ${escaped(mail.to.join(', '))}, ${mail.at}</p><pre>${linked(mail.text)}</pre></article>`,
      )
    response.writeHead(200, { 'content-type': 'text/html; charset=utf-8' })
    response.end(
      `<!doctype html><html lang="en"><title>Kept mail</title><style>body{font:16px/1.5 sans-serif;max-width:50rem;margin:2rem auto;padding:0 1rem}pre{white-space:pre-wrap}</style><h1>Mail that would have been sent</h1>${items.join('') || '<p>None yet.</p>'}</html>`,
    )
  })
  return new Promise((fulfil, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', () => {
      const address = server.address()
      const real = typeof address === 'object' && address !== null ? address.port : port
      fulfil({ url: `http://127.0.0.1:${String(real)}/`, stop: () => server.close() })
    })
  })
}
