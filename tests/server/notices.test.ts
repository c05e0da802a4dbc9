import { createHmac } from 'node:crypto'
import { createServer, type Server } from 'node:http'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { noticeEvents, type NoticeMode } from '../../shared/api/notice-endpoints.ts'
import { isPublicAddress } from '../../server/features/notices/webhook-address.ts'
import { createTeam, type TestTeam } from './support/agent.ts'
import { boxText, pushOf, tightLid } from './support/demo-push.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
let team: TestTeam
let hook: Server
let status = 200
const received: { readonly body: string; readonly headers: Readonly<Record<string, string | string[] | undefined>> }[] =
  []

beforeAll(async () => {
  server = await startTestServer({ ALLOW_PRIVATE_WEBHOOKS: 'true' })
  team = await createTeam(server, 'tellers')
  hook = createServer((request, response) => {
    let body = ''
    request.on('data', (chunk: Buffer) => (body += chunk.toString()))
    request.on('end', () => {
      received.push({ body, headers: request.headers })
      response.writeHead(status).end()
    })
  })
  await new Promise<void>((fulfil) => hook.listen(0, '127.0.0.1', fulfil))
})
afterAll(async () => {
  hook.close()
  await server.stop()
})

const inTeam = { team: 'tellers' }
const hookUrl = (): string => {
  const address = hook.address()
  return `http://127.0.0.1:${String(typeof address === 'object' ? address?.port : 0)}/hook`
}
const push = async (lid: string): Promise<void> => {
  await team.author.call(endpoints.push, {
    params: inTeam,
    body: pushOf({ sets: [{ file: 'a.yaml', text: boxText({ lid }) }] }),
  })
  await server.work()
}
const upkeep = async (kind: 'upkeep' | 'send-digests'): Promise<void> => {
  await server.context.database.transaction((manager) =>
    server.context.jobs.add(manager, kind, {}, { teamId: null, about: kind }),
  )
  await server.work()
}

describe('notices', () => {
  it('follow each person’s choice, and the digest holds what waited, once', async () => {
    const choose = (who: TestTeam['owner'], mode: NoticeMode) =>
      who.call(endpoints.chooseNotices, {
        params: inTeam,
        body: Object.fromEntries(noticeEvents.map((event) => [event, mode])) as never,
      })
    await choose(team.owner, 'digest')
    await choose(team.author, 'off')
    await choose(team.reviewer, 'now')
    await push('177 x 135 mm')
    await push(tightLid)
    const to = (role: string) =>
      server.mail.mails.filter((mail) => mail.to.includes(`tellers-${role}@quillfern.example`))
    expect([to('owner').length, to('author').length, to('reviewer').length]).toEqual([0, 0, 1])
    expect((await team.owner.call(endpoints.notices, { params: inTeam })).items).toMatchObject([
      { event: 'newly-failing' },
    ])
    await team.owner.call(endpoints.changeMe, { body: { digestHour: server.context.now().getUTCHours() } })
    await upkeep('send-digests')
    await upkeep('send-digests')
    expect(to('owner').map(({ subject }) => subject)).toEqual(['1 thing in your teams'])
    expect(to('owner')[0]?.text).toContain('newly fails')
  })

  it('warn of a token a week before it ends, once, and only its maker', async () => {
    await team.author.call(endpoints.chooseNotices, {
      params: inTeam,
      body: Object.fromEntries(noticeEvents.map((event) => [event, 'now'])) as never,
    })
    await team.author.call(endpoints.createToken, {
      params: inTeam,
      body: { name: 'nightly', scopes: ['push'], days: 5 },
    })
    await upkeep('upkeep')
    await upkeep('upkeep')
    const warned = server.mail.mails.filter(({ subject }) => subject === 'The token nightly ends soon')
    expect(warned.map(({ to }) => to)).toEqual([['tellers-author@quillfern.example']])
  })
})

describe('webhooks', () => {
  it('are signed so that a recording cannot be replayed', async () => {
    const { webhook, secret } = await team.owner.call(endpoints.addWebhook, {
      params: inTeam,
      body: { url: hookUrl(), events: ['newly-failing', 'recovered'] },
    })
    await push('177 x 135 mm')
    expect(received).toHaveLength(1)
    const [{ body, headers } = { body: '', headers: {} }] = received
    const [, seconds = '', signature = ''] =
      /^t=(\d+),v1=([0-9a-f]{64})$/.exec(String(headers['foldgauge-signature'])) ?? []
    expect(createHmac('sha256', secret).update(`${seconds}.${body}`).digest('hex')).toBe(signature)
    expect(JSON.parse(body)).toMatchObject({ event: 'recovered', team: 'tellers', set: 'boxed-notes' })
    const { items } = await team.owner.call(endpoints.deliveries, { params: { ...inTeam, webhook: webhook.id } })
    expect(items).toMatchObject([{ state: 'delivered', status: 200, attempts: 1 }])
  })

  it('are tried again, and stopped where nobody is there any more', async () => {
    const [webhook] = (await team.owner.call(endpoints.webhooks, { params: inTeam })).items
    const params = { ...inTeam, webhook: webhook?.id ?? '' }
    status = 500
    await push(tightLid)
    const waiting = (await team.owner.call(endpoints.deliveries, { params })).items[0]
    expect(waiting).toMatchObject({ state: 'waiting', attempts: 1, error: 'the address answered 500' })
    status = 410
    await push('177 x 135 mm')
    expect((await team.owner.call(endpoints.webhooks, { params: inTeam })).items[0]).toMatchObject({
      state: 'stopped',
      why: 'the address answered 410',
    })
    expect(server.mail.mails.some(({ subject }) => subject === 'A webhook was stopped')).toBe(true)
    const again = await team.owner.call(endpoints.changeWebhook, { params, body: { isOn: true } })
    expect(again.state).toBe('active')
  })

  it('never go to private addresses, however these are written', async () => {
    const strict = await startTestServer()
    const { owner } = await createTeam(strict, 'strict')
    const hosts = [
      '127.0.0.1',
      'localhost:8080',
      '[::1]',
      '169.254.169.254',
      '10.0.0.7',
      '[::ffff:192.168.0.1]',
      '0x7f000001',
    ]
    for (const host of hosts) {
      const body = { url: `http://${host}/`, events: ['published' as const] }
      const refused = await owner.refusal(endpoints.addWebhook, { params: { team: 'strict' }, body })
      expect([host, refused.code]).toEqual([host, 'private-address'])
    }
    await strict.stop()
  })

  it('tell public addresses from private ones, also in their other forms', () => {
    expect(['8.8.8.8', '2606:4700::1111'].map(isPublicAddress)).toEqual([true, true])
    for (const address of [
      '100.64.0.1',
      '192.168.1.1',
      '172.16.0.1',
      'fd00::1',
      'fe80::1',
      '::ffff:10.0.0.1',
      '0.0.0.0',
      'nonsense',
    ])
      expect([address, isPublicAddress(address)]).toEqual([address, false])
  })
})
