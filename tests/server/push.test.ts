import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { createTeam, robot, type TestTeam } from './support/agent.ts'
import { boxText, commitOf, pushOf, tightLid, workspaceText } from './support/demo-push.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
let team: TestTeam
let count = 0
beforeAll(async () => {
  server = await startTestServer()
})
afterAll(() => server.stop())

const freshTeam = async (): Promise<TestTeam> => {
  count += 1
  return createTeam(server, `push-${String(count)}`)
}
const inTeam = () => ({ team: team.slug })
const setAt = (set = 'boxed-notes') => ({ team: team.slug, set })
const versionAt = (number: number, set = 'boxed-notes') => ({ team: team.slug, set, number })

describe('a push', () => {
  it('is judged by the server and stored as version 1', async () => {
    team = await freshTeam()
    const stored = await team.author.call(endpoints.push, { params: inTeam(), body: pushOf() })
    expect(stored.sets).toMatchObject([
      { set: 'boxed-notes', number: 1, isNew: true, verdict: 'pass', baseline: { reason: 'none' } },
    ])
    const version = await team.viewer.call(endpoints.version, { params: versionAt(1) })
    expect(version.text).toBe(boxText())
    expect(version.report.fits.map(({ id }) => id)).toEqual(['lid-on-base'])
  })

  it('of the same content again answers 200 with the same id and version', async () => {
    team = await freshTeam()
    const first = await team.author.call(endpoints.push, { params: inTeam(), body: pushOf({ commit: commitOf(1) }) })
    for (const asOf of ['2026-12-01', '2026-12-09']) {
      const again = await team.author.call(endpoints.push, {
        params: inTeam(),
        body: pushOf({ commit: commitOf(1), asOf }),
      })
      expect(again).toMatchObject({ id: first.id, isNew: false, sets: [{ number: 1, isNew: false }] })
    }
    const { items } = await team.author.call(endpoints.versions, { params: setAt() })
    expect(items).toHaveLength(1)
  })

  it('without a commit can bring an earlier content back as a version of its own', async () => {
    team = await freshTeam()
    const push = (lid?: string) =>
      team.author.call(endpoints.push, {
        params: inTeam(),
        body: pushOf({ sets: [{ file: 'sets/a.yaml', text: boxText(lid === undefined ? {} : { lid }) }] }),
      })
    await push()
    await push(tightLid)
    const back = await push()
    expect(back.sets[0]?.number).toBe(3)
    expect(back.isNew).toBe(true)
    expect((await push()).id).toBe(back.id)
  })

  it('shares a version between commits that changed nothing of the set', async () => {
    team = await freshTeam()
    await team.author.call(endpoints.push, { params: inTeam(), body: pushOf({ commit: commitOf(1) }) })
    const second = await team.author.call(endpoints.push, { params: inTeam(), body: pushOf({ commit: commitOf(2) }) })
    expect(second).toMatchObject({ isNew: true, sets: [{ number: 1, isNew: false }] })
  })

  it('sent by ten at once is stored once', async () => {
    team = await freshTeam()
    const body = pushOf({ commit: commitOf(3) })
    const answers = await Promise.all(
      Array.from({ length: 10 }, () => team.author.call(endpoints.push, { params: inTeam(), body })),
    )
    expect(new Set(answers.map(({ id }) => id)).size).toBe(1)
    expect(answers.filter(({ isNew }) => isNew)).toHaveLength(1)
    const without = await Promise.all(
      Array.from({ length: 6 }, () =>
        team.author.call(endpoints.push, { params: inTeam(), body: pushOf({ branch: 'other' }) }),
      ),
    )
    expect(new Set(without.map(({ id }) => id)).size).toBe(1)
  })

  it('with a text that cannot be read is refused with file and line, and stores nothing of the others', async () => {
    team = await freshTeam()
    const refused = await team.author.refusal(endpoints.push, {
      params: inTeam(),
      body: pushOf({
        sets: [
          { file: 'sets/good.yaml', text: boxText({ name: 'good' }) },
          { file: 'sets/bad.yaml', text: boxText({ name: 'bad' }).replace('kind: lid', 'kind: lit') },
        ],
      }),
    })
    expect(refused.status).toBe(422)
    expect(refused.problems[0]).toMatchObject({ path: 'sets/bad.yaml', line: 6 })
    expect((await team.author.call(endpoints.sets, { params: inTeam() })).items).toEqual([])
  })

  it('larger than the limit answers 413, with another type 415, with nonsense 422', async () => {
    team = await freshTeam()
    const send = (body: string, type = 'application/json') =>
      fetch(`${server.url}/api/teams/${team.slug}/pushes`, {
        method: 'POST',
        headers: { 'content-type': type, origin: server.url, cookie: team.author.cookie() },
        body,
      })
    expect((await send(JSON.stringify({ pad: 'x'.repeat(13_000_000) }))).status).toBe(413)
    expect((await send('a,b', 'text/csv')).status).toBe(415)
    expect((await send('{"sets":[]}')).status).toBe(422)
    expect((await send('{')).status).toBe(400)
  })

  it('keeps both verdicts where the sender’s engine judged otherwise', async () => {
    team = await freshTeam()
    const body = pushOf()
    const said = { ...body, sets: body.sets.map((set) => ({ ...set, verdict: 'fail' as const })) }
    const stored = await team.author.call(endpoints.push, { params: inTeam(), body: said })
    expect(stored.sets[0]?.differs).toMatch(/said fail; checked here .* it is pass/)
    expect((await team.author.call(endpoints.version, { params: versionAt(1) })).sender.verdict).toBe('fail')
  })

  it('by a robot needs the scope, and reads nothing without the other', async () => {
    team = await freshTeam()
    const make = async (scopes: ('push' | 'read')[]) =>
      robot(
        server,
        (await team.author.call(endpoints.createToken, { params: inTeam(), body: { name: 'pipeline', scopes } }))
          .secret,
      )
    const pusher = await make(['push'])
    const reader = await make(['read'])
    expect((await pusher.call(endpoints.push, { params: inTeam(), body: pushOf() })).isNew).toBe(true)
    expect((await pusher.refusal(endpoints.sets, { params: inTeam() })).status).toBe(403)
    expect((await reader.refusal(endpoints.push, { params: inTeam(), body: pushOf() })).status).toBe(403)
    expect((await reader.call(endpoints.versionNamed, { params: setAt(), query: { branch: 'main' } })).number).toBe(1)
    expect(
      (await reader.refusal(endpoints.invite, { params: inTeam(), body: { email: 'a@b.example', role: 'owner' } }))
        .status,
    ).toBe(403)
    const { pushedBy } = await team.viewer.call(endpoints.version, { params: versionAt(1) })
    expect(pushedBy).toEqual({ kind: 'robot', name: 'pipeline' })
  })
})

describe('a lid that stops clearing its box', () => {
  it('is worse than its baseline, told once, and told again only when it is mended', async () => {
    team = await freshTeam()
    const push = (lid: string, commit: number) =>
      team.author.call(endpoints.push, {
        params: inTeam(),
        body: pushOf({
          sets: [{ file: 'sets/a.yaml', text: boxText({ lid }) }],
          commit: commitOf(commit),
          ancestors: commit === 1 ? [] : [commitOf(commit - 1)],
        }),
      })
    const told = () =>
      server.mail.mails
        .filter(({ to }) => to.includes(`${team.slug}-owner@quillfern.example`))
        .map(({ subject }) => subject)
    await push('177 x 135 mm', 1)
    await server.work()
    const broken = await push(tightLid, 2)
    expect(broken.sets[0]).toMatchObject({ number: 2, verdict: 'fail', change: { state: 'pending' } })
    await server.work()
    const seen = await team.viewer.call(endpoints.pushState, { params: { ...inTeam(), push: broken.id } })
    expect(seen.sets[0]?.change).toMatchObject({ state: 'worse' })
    expect(seen.sets[0]?.baseline).toMatchObject({ number: 1, reason: 'ancestor' })
    const list = await team.viewer.call(endpoints.sets, { params: inTeam() })
    expect(list.items[0]).toMatchObject({ state: 'newly-failing', latest: { number: 2 } })
    expect(told()).toEqual(['Boxed notes newly fails'])

    await push('174 x 132 mm', 3)
    await server.work()
    expect(told()).toEqual(['Boxed notes newly fails'])

    await push('177 x 135 mm', 4)
    await server.work()
    expect(told()).toEqual(['Boxed notes newly fails', 'Boxed notes passes again'])
    expect((await team.viewer.call(endpoints.sets, { params: inTeam() })).items[0]?.state).toBe('passing')

    const { comparison, sentence } = await team.viewer.call(endpoints.compare, {
      params: versionAt(2),
      query: { with: 1 },
    })
    expect(sentence).toBe('version 2 compared with version 1')
    expect(comparison.counts.newlyFailing).toBeGreaterThan(0)
    const trend = await team.viewer.call(endpoints.trend, { params: setAt() })
    expect(new Set(trend.items.map(({ number }) => number))).toEqual(new Set([1, 2, 3, 4]))
  })
})

describe('tokens that change', () => {
  it('judge every other set of the workspace again, and say which broke', async () => {
    team = await freshTeam()
    const two = [
      { file: 'sets/a.yaml', text: boxText({ name: 'a' }) },
      { file: 'sets/b.yaml', text: boxText({ name: 'b', lid: '176.5 x 134.5 mm' }) },
    ]
    await team.author.call(endpoints.push, { params: inTeam(), body: pushOf({ sets: two }) })
    await server.work()
    const unused = await team.author.call(endpoints.push, {
      params: inTeam(),
      body: pushOf({ sets: two.slice(0, 1), workspace: workspaceText({ extra: '  spare: { caliper: 0.2 mm }\n' }) }),
    })
    await server.work()
    const first = await team.author.call(endpoints.pushState, { params: { ...inTeam(), push: unused.id } })
    expect(first.ripple).toEqual([{ set: 'b', number: 1, state: 'first' }])

    const thicker = await team.author.call(endpoints.push, {
      params: inTeam(),
      body: pushOf({ sets: two.slice(0, 1), workspace: workspaceText({ caliper: '0.55 mm' }) }),
    })
    expect(thicker.ripple).toEqual([{ set: 'b', number: null, state: 'pending' }])
    await server.work()
    const { ripple } = await team.author.call(endpoints.pushState, { params: { ...inTeam(), push: thicker.id } })
    expect(ripple).toEqual([{ set: 'b', number: 2, state: 'worse' }])
  })
})
