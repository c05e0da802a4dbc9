import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { addMember, addPerson, addTeam, linkIn, password, signIn, stranger } from './support/agent.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
beforeAll(async () => {
  server = await startTestServer({ SIGN_INS_PER_QUARTER_HOUR: '5' })
})
afterAll(() => server.stop())

describe('signing in', () => {
  it('answers a wrong password and an unknown account alike', async () => {
    await addPerson(server, 'ada')
    const wrong = await stranger(server).refusal(endpoints.signIn, {
      body: { email: 'ada@quillfern.example', password: 'nonsense' },
    })
    const unknown = await stranger(server).refusal(endpoints.signIn, {
      body: { email: 'nobody@quillfern.example', password: 'nonsense' },
    })
    expect([wrong.status, wrong.code, wrong.message]).toEqual([unknown.status, unknown.code, unknown.message])
    expect(wrong.status).toBe(401)
  })

  it('refuses even the right password after too many wrong ones, and says when to try again', async () => {
    await addPerson(server, 'bea')
    const email = 'bea@quillfern.example'
    for (let attempt = 0; attempt < 5; attempt += 1)
      expect((await stranger(server).refusal(endpoints.signIn, { body: { email, password: 'wrong' } })).status).toBe(
        401,
      )
    const refused = await stranger(server).refusal(endpoints.signIn, { body: { email, password } })
    expect(refused.status).toBe(429)
    expect(refused.retryAfter).toBeGreaterThan(0)
  })

  it('gives a new session id, HttpOnly and SameSite, and ends it at sign-out', async () => {
    await addPerson(server, 'cleo')
    const answer = await fetch(`${server.url}/api/session`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', origin: server.url, cookie: 'foldgauge=s%3Aplanted.signature' },
      body: JSON.stringify({ email: 'cleo@quillfern.example', password }),
    })
    const [line = ''] = answer.headers.getSetCookie()
    expect(line).toMatch(/HttpOnly/)
    expect(line).toMatch(/SameSite=Lax/)
    expect(line).not.toContain('planted')
    const agent = await signIn(server, 'cleo@quillfern.example')
    const before = agent.cookie()
    await agent.call(endpoints.signOut)
    const after = await fetch(`${server.url}/api/me`, { headers: { cookie: before } })
    expect(after.status).toBe(401)
  })

  it('lists the own sessions and ends another one', async () => {
    await addPerson(server, 'dora')
    const phone = await signIn(server, 'dora@quillfern.example')
    const desk = await signIn(server, 'dora@quillfern.example')
    const { items } = await desk.call(endpoints.sessions)
    expect(items).toHaveLength(2)
    const other = items.find(({ isThis }) => !isThis)
    await desk.call(endpoints.endSession, { params: { session: other?.id ?? '' } })
    expect((await phone.refusal(endpoints.me)).status).toBe(401)
    expect((await desk.call(endpoints.me)).name).toBe('dora')
  })
})

describe('links by mail', () => {
  it('sets a new password once, ends every session, and tells nobody whether an account exists', async () => {
    await addPerson(server, 'elsa')
    const agent = await signIn(server, 'elsa@quillfern.example')
    await stranger(server).call(endpoints.askReset, { body: { email: 'nobody2@quillfern.example' } })
    await stranger(server).call(endpoints.askReset, { body: { email: 'elsa@quillfern.example' } })
    await server.work()
    expect(server.mail.mails.filter(({ to }) => to.includes('nobody2@quillfern.example'))).toEqual([])
    const secret = linkIn(server, 'elsa@quillfern.example', '/password/')
    const body = { password: 'a better password' }
    await stranger(server).call(endpoints.reset, { params: { secret }, body })
    expect((await agent.refusal(endpoints.me)).status).toBe(401)
    expect((await stranger(server).refusal(endpoints.reset, { params: { secret }, body })).status).toBe(410)
    await signIn(server, 'elsa@quillfern.example', 'a better password')
  })

  it('ends a reset link after an hour', async () => {
    await addPerson(server, 'gina')
    await stranger(server).call(endpoints.askReset, { body: { email: 'gina@quillfern.example' } })
    await server.work()
    const secret = linkIn(server, 'gina@quillfern.example', '/password/')
    server.later(61 * 60_000)
    const refused = await stranger(server).refusal(endpoints.reset, {
      params: { secret },
      body: { password: 'whatever it is' },
    })
    server.later(-61 * 60_000)
    expect(refused.status).toBe(410)
  })

  it('changes an address only when both ends have confirmed', async () => {
    await addPerson(server, 'fay')
    const agent = await signIn(server, 'fay@quillfern.example')
    await agent.call(endpoints.askEmailChange, { body: { email: 'fay.new@quillfern.example', password } })
    await server.work()
    const old = linkIn(server, 'fay@quillfern.example', '/email/')
    const next = linkIn(server, 'fay.new@quillfern.example', '/email/')
    expect(await stranger(server).call(endpoints.confirmEmailChange, { params: { secret: next } })).toEqual({
      isComplete: false,
      waitsFor: 'old',
    })
    expect((await agent.call(endpoints.me)).email).toBe('fay@quillfern.example')
    await stranger(server).call(endpoints.confirmEmailChange, { params: { secret: old } })
    expect((await agent.call(endpoints.me)).email).toBe('fay.new@quillfern.example')
  })

  it('brings somebody new into a team by invitation, once', async () => {
    const team = await addTeam(server, 'nest')
    await addMember(server, team, await addPerson(server, 'hana'), 'owner')
    const owner = await signIn(server, 'hana@quillfern.example')
    await owner.call(endpoints.invite, {
      params: { team: 'nest' },
      body: { email: 'Ivy@Quillfern.example', role: 'author' },
    })
    await server.work()
    const secret = linkIn(server, 'ivy@quillfern.example', '/invitations/')
    const seen = await stranger(server).call(endpoints.invitationByLink, { params: { secret } })
    expect(seen).toMatchObject({ team: 'nest', role: 'author', hasAccount: false, invitedBy: 'hana' })
    const ivy = stranger(server)
    const me = await ivy.call(endpoints.acceptInvitation, { params: { secret }, body: { name: 'Ivy', password } })
    expect(me.teams).toEqual([{ slug: 'nest', name: 'nest', role: 'author' }])
    expect((await ivy.call(endpoints.team, { params: { team: 'nest' } })).may).toContain('push')
    const again = await stranger(server).refusal(endpoints.acceptInvitation, { params: { secret }, body: { password } })
    expect(again.status).toBe(410)
  })
})

describe('writes from elsewhere', () => {
  it.each([
    ['without an origin', {}],
    ['from another origin', { origin: 'https://elsewhere.example' }],
    ['that the browser calls cross-site', { 'sec-fetch-site': 'cross-site' }],
  ])('refuses a cookie write %s', async (_, headers) => {
    const answer = await fetch(`${server.url}/api/session`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', ...headers } as Record<string, string>,
      body: JSON.stringify({ email: 'ada@quillfern.example', password }),
    })
    expect(answer.status).toBe(403)
  })
})

describe('the log', () => {
  it('holds no password, link, cookie or token', async () => {
    await addPerson(server, 'jo')
    const agent = await signIn(server, 'jo@quillfern.example')
    await stranger(server).call(endpoints.askReset, { body: { email: 'jo@quillfern.example' } })
    await server.work()
    const secret = linkIn(server, 'jo@quillfern.example', '/password/')
    await stranger(server).refusal(endpoints.reset, { params: { secret }, body: { password: 'short' } } as never)
    await stranger(server).call(endpoints.reset, { params: { secret }, body: { password: 'a third password' } })
    server.context.log.error(
      { headers: { authorization: 'Bearer fgt_leak', cookie: 'leak' }, body: { password: 'leak' } },
      'careless',
    )
    const log = server.lines.join('')
    expect(log).toContain('"endpoint":"reset"')
    for (const word of [secret, agent.cookie().slice(12, 40), password, 'a third password', 'leak'])
      expect(log).not.toContain(word)
  })
})
