import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Endpoint } from '../../shared/api/endpoint.ts'
import { endpointList, endpoints } from '../../shared/api/endpoint-registry.ts'
import { actions, may, permissions, roles, usualChoices, type Role } from '../../shared/api/permissions.ts'
import { routesOf } from '../../server/features/route-registry.ts'
import { createThrottles } from '../../server/http/throttles.ts'
import { createTeam, robot, stranger, type TestTeam } from './support/agent.ts'
import { pushOf } from './support/demo-push.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
let team: TestTeam
let foreign: TestTeam
const secrets: Record<string, string> = {}

beforeAll(async () => {
  server = await startTestServer()
  team = await createTeam(server, 'home')
  foreign = await createTeam(server, 'elsewhere')
  for (const [name, who, scopes] of [
    ['pusher', team, ['push']],
    ['reader', team, ['read']],
    ['stray', foreign, ['push', 'read']],
  ] as const) {
    const made = await who.owner.call(endpoints.createToken, {
      params: { team: who.slug },
      body: { name, scopes: [...scopes] },
    })
    secrets[name] = made.secret
  }
  await team.author.call(endpoints.push, { params: { team: team.slug }, body: pushOf() })
})
afterAll(() => server.stop())

/** Values that a path accepts, of things that are not there. */
const parts: Readonly<Record<string, string>> = {
  team: 'home',
  set: 'no-such-set',
  number: '7',
  label: '9.9.9',
  file: 'nothing.pdf',
  page: 'nothing-here',
  session: 'abcdef0123456789',
  key: 'k'.repeat(43),
  secret: 's'.repeat(43),
}
const addressOf = (endpoint: Endpoint): string =>
  endpoint.path.replace(/\{(\w+)\}/g, (_, name: string) => parts[name] ?? randomUUID())

async function statusFor(endpoint: Endpoint, headers: Readonly<Record<string, string>>): Promise<number> {
  const isRead = endpoint.method === 'get'
  const type = endpoint.bodyTypes[0] ?? 'application/json'
  const answer = await fetch(server.url + addressOf(endpoint), {
    method: endpoint.method.toUpperCase(),
    headers: { origin: server.url, ...(isRead ? {} : { 'content-type': type }), ...headers },
    ...(isRead ? {} : { body: type === 'application/json' ? '{}' : 'x' }),
  })
  await answer.arrayBuffer()
  return answer.status
}

const cookieOf = (agent: TestTeam['owner']) => ({ cookie: agent.cookie() })
const teamEndpoints = endpointList.filter(({ access }) => access.kind === 'team')
const allowed = (endpoint: Endpoint, role: Role): boolean =>
  endpoint.access.kind === 'team' && may(role, endpoint.access.action, usualChoices)

describe('every endpoint', () => {
  it('has a route, and every route an endpoint', () => {
    const throttles = createThrottles(server.context.database, server.context.config)
    const routed = routesOf(throttles).map(({ endpoint }) => endpoint.name)
    expect(routed.toSorted()).toEqual(endpointList.map(({ name }) => name).toSorted())
  })

  it.each(teamEndpoints.map((endpoint) => [endpoint.name, endpoint] as const))(
    '%s: 401 signed out, 404 to another team, 403 to a role that may not',
    async (_, endpoint) => {
      const seen: Record<string, string> = {}
      const expected: Record<string, string> = {}
      const classOf = (status: number): string =>
        status === 401 || status === 403 ? String(status) : status === 404 ? '404' : 'let in'
      seen['signed out'] = classOf(await statusFor(endpoint, {}))
      expected['signed out'] = '401'
      for (const role of roles) {
        seen[`foreign ${role}`] = classOf(await statusFor(endpoint, cookieOf(foreign[role])))
        expected[`foreign ${role}`] = '404'
        // Leaving would really leave.
        if (endpoint.name === 'leaveTeam') continue
        const status = await statusFor(endpoint, cookieOf(team[role]))
        seen[role] = status === 403 ? 'kept out' : status === 401 ? '401' : 'let in'
        expected[role] = allowed(endpoint, role) ? 'let in' : 'kept out'
      }
      expect(seen).toEqual(expected)
    },
  )

  it.each(
    endpointList
      .filter(({ access }) => access.kind === 'signed-in')
      .map((endpoint) => [endpoint.name, endpoint] as const),
  )('%s: 401 signed out', async (_, endpoint) => {
    expect(await statusFor(endpoint, {})).toBe(401)
  })

  it('gives robots what their scope is for, and nothing of another team', async () => {
    for (const endpoint of teamEndpoints) {
      if (endpoint.access.kind !== 'team') continue
      const { scope } = endpoint.access
      for (const [name, has] of [
        ['pusher', 'push'],
        ['reader', 'read'],
      ] as const) {
        const outcome = await statusFor(endpoint, { authorization: `Bearer ${secrets[name] ?? ''}` })
        expect([endpoint.name, name, outcome === 403]).toEqual([endpoint.name, name, scope !== has])
      }
      const stray = await statusFor(endpoint, { authorization: `Bearer ${secrets['stray'] ?? ''}` })
      expect([endpoint.name, stray]).toEqual([endpoint.name, 404])
    }
  })
})

describe('things of another team', () => {
  it('are not found under the own team’s address', async () => {
    const own = { team: 'home' }
    const theirs = { team: 'elsewhere' }
    const pushed = await team.author.call(endpoints.pushState, {
      params: { ...own, push: (await team.author.call(endpoints.push, { params: own, body: pushOf() })).id },
    })
    const at = { ...own, set: 'boxed-notes', number: 1 }
    const comment = await team.author.call(endpoints.comment, {
      params: at,
      body: { anchor: { kind: 'version', name: null }, body: 'Ours.' },
    })
    const token = (
      await team.owner.call(endpoints.createToken, { params: own, body: { name: 'ours', scopes: ['read'] } })
    ).token
    const paper = await team.author.call(endpoints.addPaper, {
      params: own,
      body: { stock: 'cover', method: 'single-sheet', readings: [0.3] },
    })
    const hook = (
      await team.owner.call(endpoints.addWebhook, {
        params: own,
        body: { url: 'https://hooks.example/x', events: ['published'] },
      })
    ).webhook
    const invited = await team.owner.call(endpoints.invite, {
      params: own,
      body: { email: 'new@quillfern.example', role: 'viewer' },
    })
    const tester = await team.author.call(endpoints.inviteTester, {
      params: at,
      body: { email: 't@quillfern.example', name: 'T' },
    })
    const { owner } = foreign
    const refusals = await Promise.all([
      owner.refusal(endpoints.pushState, { params: { ...theirs, push: pushed.id } }),
      owner.refusal(endpoints.version, { params: { ...at, ...theirs } }),
      owner.refusal(endpoints.resolveComment, {
        params: { ...theirs, comment: comment.id },
        body: { isResolved: true },
      }),
      owner.refusal(endpoints.revokeToken, { params: { ...theirs, token: token.id } }),
      owner.refusal(endpoints.rotateToken, { params: { ...theirs, token: token.id }, body: {} }),
      owner.refusal(endpoints.removePaper, { params: { ...theirs, paper: paper.id } }),
      owner.refusal(endpoints.removeWebhook, { params: { ...theirs, webhook: hook.id } }),
      owner.refusal(endpoints.deliveries, { params: { ...theirs, webhook: hook.id } }),
      owner.refusal(endpoints.revokeInvitation, { params: { ...theirs, invitation: invited.id } }),
      owner.refusal(endpoints.revokeBuildInvitation, { params: { ...theirs, invitation: tester.id } }),
    ])
    expect(refusals.map(({ status }) => status)).toEqual(refusals.map(() => 404))
    expect((await team.viewer.call(endpoints.version, { params: at })).number).toBe(1)
  })

  it('answer the same whether a team exists or not', async () => {
    const there = await foreign.owner.refusal(endpoints.sets, { params: { team: 'home' } })
    const nowhere = await foreign.owner.refusal(endpoints.sets, { params: { team: 'no-such-team' } })
    expect([there.status, there.code, there.message, there.hint]).toEqual([
      nowhere.status,
      nowhere.code,
      nowhere.message,
      nowhere.hint,
    ])
  })
})

describe('members', () => {
  it('cannot be left without an owner, by leaving, removal or demotion', async () => {
    const lone = await createTeam(server, 'lone')
    const params = { team: 'lone' }
    const { items } = await lone.owner.call(endpoints.members, { params })
    const person = items.find(({ isMe }) => isMe)?.id ?? ''
    expect((await lone.owner.refusal(endpoints.leaveTeam, { params })).code).toBe('last-owner')
    expect((await lone.owner.refusal(endpoints.removeMember, { params: { ...params, person } })).code).toBe(
      'last-owner',
    )
    expect(
      (await lone.owner.refusal(endpoints.changeRole, { params: { ...params, person }, body: { role: 'viewer' } }))
        .code,
    ).toBe('last-owner')
    const second = items.find(({ role }) => role === 'author')?.id ?? ''
    await lone.owner.call(endpoints.changeRole, { params: { ...params, person: second }, body: { role: 'owner' } })
    // Two owners step down at once: one must stay.
    const both = await Promise.allSettled([
      lone.owner.call(endpoints.leaveTeam, { params }),
      lone.author.call(endpoints.leaveTeam, { params }),
    ])
    expect(both.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
  })

  it('who leave lose the team at once, and their tokens go on', async () => {
    const made = await createTeam(server, 'leavers')
    const { secret } = await made.author.call(endpoints.createToken, {
      params: { team: 'leavers' },
      body: { name: 'ci', scopes: ['read'] },
    })
    await made.author.call(endpoints.leaveTeam, { params: { team: 'leavers' } })
    expect((await made.author.refusal(endpoints.sets, { params: { team: 'leavers' } })).status).toBe(404)
    expect((await robot(server, secret).call(endpoints.sets, { params: { team: 'leavers' } })).items).toEqual([])
  })
})

describe('tokens', () => {
  it('are refused in addresses and bodies, when rotated, revoked or over', async () => {
    const params = { team: 'home' }
    const made = await team.author.call(endpoints.createToken, {
      params,
      body: { name: 'short', scopes: ['read'], days: 1 },
    })
    const inAddress = await fetch(`${server.url}/api/teams/home/sets?access_token=${made.secret}`)
    expect([inAddress.status, (await inAddress.json()) as unknown]).toMatchObject([
      400,
      { error: { code: 'token-in-address' } },
    ])
    const both = await fetch(`${server.url}/api/teams/home/sets`, {
      headers: { authorization: 'Bearer fgt_wrong', cookie: team.owner.cookie() },
    })
    expect(both.status).toBe(401)
    const next = await team.author.call(endpoints.rotateToken, {
      params: { ...params, token: made.token.id },
      body: { days: 1 },
    })
    expect((await robot(server, made.secret).refusal(endpoints.sets, { params })).status).toBe(401)
    expect((await robot(server, next.secret).call(endpoints.tokenCaller)).team).toBe('home')
    server.later(86_400_001)
    expect((await robot(server, next.secret).refusal(endpoints.sets, { params })).status).toBe(401)
    server.later(-86_400_001)
    await team.author.call(endpoints.revokeToken, { params: { ...params, token: made.token.id } })
    expect((await robot(server, next.secret).refusal(endpoints.sets, { params })).code).toBe('bad-token')
    const { items } = await team.owner.call(endpoints.tokens, { params })
    expect(JSON.stringify(items)).not.toContain(next.secret.slice(15, 40))
  })
})

describe('the table of permissions', () => {
  it('lets owners do everything and viewers change nothing', () => {
    for (const action of actions) expect(permissions[action].owner).toBe('yes')
    const viewers = actions.filter((action) => may('viewer', action, usualChoices))
    expect(viewers).toEqual(['team:read', 'sets:read', 'notices:choose'])
  })
})

describe('anybody', () => {
  it('gets strict headers and no hint of what runs here', async () => {
    const answer = await fetch(`${server.url}/api/health/live`)
    expect(answer.headers.get('content-security-policy')).toContain("default-src 'none'")
    expect(answer.headers.get('x-content-type-options')).toBe('nosniff')
    expect(answer.headers.get('referrer-policy')).toBe('no-referrer')
    expect(answer.headers.get('x-powered-by')).toBeNull()
    expect((await stranger(server).call(endpoints.ready)).status).toBe('ready')
  })
})
