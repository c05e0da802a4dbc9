import { createHash } from 'node:crypto'
import { mkdir, readFile, rm, writeFile } from 'node:fs/promises'
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http'
import { join } from 'node:path'

async function bodyOf(request: IncomingMessage): Promise<Buffer> {
  const chunks: Buffer[] = []
  for await (const chunk of request) chunks.push(chunk as Buffer)
  return Buffer.concat(chunks)
}

const missing = (response: ServerResponse, code: string): void => {
  response.writeHead(404, { 'content-type': 'application/xml' })
  response.end(`<?xml version="1.0"?><Error><Code>${code}</Code><Message>none</Message></Error>`)
}

/** Object keys hold slashes and dots; a digest is a safe file name for any of them. */
const fileOf = (folder: string, key: string): string => join(folder, createHash('sha256').update(key).digest('hex'))

async function answer(folder: string, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const { pathname, searchParams } = new URL(request.url ?? '/', 'http://localhost')
  const [, bucket = '', ...rest] = decodeURIComponent(pathname).split('/')
  const key = rest.join('/')
  const home = join(folder, bucket.replace(/[^\w-]/g, '_'))
  if (key === '') {
    if (request.method === 'PUT') {
      await mkdir(home, { recursive: true })
      response.writeHead(200).end()
    } else if (request.method === 'POST' && searchParams.has('delete')) {
      const text = (await bodyOf(request)).toString('utf8')
      for (const [, name = ''] of text.matchAll(/<Key>([^<]*)<\/Key>/g))
        await rm(fileOf(home, name.replaceAll('&amp;', '&')), { force: true })
      response.writeHead(200, { 'content-type': 'application/xml' }).end('<?xml version="1.0"?><DeleteResult/>')
    } else {
      const exists = await mkdir(home).then(
        () => rm(home, { recursive: true }).then(() => false),
        () => true,
      )
      if (exists) response.writeHead(200).end()
      else missing(response, 'NoSuchBucket')
    }
    return
  }
  const file = fileOf(home, key)
  if (request.method === 'PUT') {
    await mkdir(home, { recursive: true })
    const type = request.headers['content-type'] ?? 'application/octet-stream'
    await writeFile(file, Buffer.concat([Buffer.from(`${type}\n`), await bodyOf(request)]))
    response.writeHead(200, { etag: '"kept"' }).end()
    return
  }
  const kept = await readFile(file).catch(() => null)
  if (kept === null) {
    missing(response, 'NoSuchKey')
    return
  }
  const split = kept.indexOf('\n')
  response.writeHead(200, {
    'content-type': kept.subarray(0, split).toString(),
    'content-length': String(kept.length - split - 1),
    etag: '"kept"',
  })
  response.end(request.method === 'HEAD' ? undefined : kept.subarray(split + 1))
}

/** A stand-in for an S3 server on loopback that keeps objects as files: development and tests only. */
export function startObjectStoreFake(
  folder: string,
  port = 0,
): Promise<{ readonly url: string; readonly server: Server }> {
  const server = createServer((request, response) => {
    answer(folder, request, response).catch(() => {
      response.writeHead(500).end()
    })
  })
  return new Promise((fulfil, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', () => {
      const address = server.address()
      fulfil({ url: `http://127.0.0.1:${String(typeof address === 'object' ? address?.port : port)}`, server })
    })
  })
}
