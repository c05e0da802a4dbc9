import { execFileSync } from 'node:child_process'
import { mkdirSync, mkdtempSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync, existsSync } from 'node:fs'
import { connect, createServer, type Server } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { run } from '../../../cli/run.ts'
import { forgetWorkspaces } from '../../../cli/inputs/find-workspace.ts'
import { endpoints } from '../../../shared/api/endpoint-registry.ts'
import { createTeam, type TestTeam } from '../../server/support/agent.ts'
import { boxText, tightLid, workspaceText } from '../../server/support/demo-push.ts'
import { startTestServer, type TestServer } from '../../server/support/test-server.ts'

let server: TestServer
let team: TestTeam
let token: string
let count = 0
const home = mkdtempSync(join(tmpdir(), 'foldgauge-push-'))
let cwd = home

beforeAll(async () => {
  server = await startTestServer()
})
afterAll(async () => {
  await server.stop()
  rmSync(home, { recursive: true, force: true })
})

beforeEach(async () => {
  count += 1
  team = await createTeam(server, `cli-${String(count)}`)
  token = (
    await team.author.call(endpoints.createToken, {
      params: { team: team.slug },
      body: { name: 'ci', scopes: ['push', 'read'] },
    })
  ).secret
  cwd = join(home, String(count))
  mkdirSync(join(cwd, 'sets'), { recursive: true })
  writeFileSync(join(cwd, 'foldgauge.yaml'), workspaceText())
  write(boxText())
})

const write = (text: string): void => {
  writeFileSync(join(cwd, 'sets', 'boxed-notes.yaml'), text)
}

interface Outcome {
  readonly code: number
  readonly out: string
  readonly err: string
}

/** Calls the command line as somebody in the workspace would. */
async function call(
  words: readonly string[],
  env: Readonly<Record<string, string>> = {},
  input = '',
): Promise<Outcome> {
  forgetWorkspaces()
  let out = ''
  let err = ''
  const code = await run(words, {
    cwd,
    env: {
      HOME: cwd,
      FOLDGAUGE_SERVER: server.url,
      FOLDGAUGE_TOKEN: token,
      FOLDGAUGE_RETRIES: '3',
      ...env,
    },
    today: () => '2026-12-01',
    out: (text) => (out += text),
    err: (text) => (err += text),
    terminal: { isTerminal: false, columns: 80 },
    showsProgress: false,
    readStandardInput: () => Promise.resolve(input),
  })
  return { code, out, err }
}

const versions = async () =>
  (await team.viewer.call(endpoints.versions, { params: { team: team.slug, set: 'boxed-notes' } })).items

/** What a proxy spoils: requests of the first connections after so many bytes, or the answer to the first push. */
interface Spoiling {
  readonly requests?: { readonly connections: number; readonly after: number }
  readonly isFirstAnswerLost?: boolean
}

/** Forwards to the server and cuts connections. */
async function startProxy(spoiling: Spoiling): Promise<{ readonly url: string; readonly proxy: Server }> {
  const { port, hostname } = new URL(server.url)
  let connections = 0
  let isLost = false
  const proxy = createServer((client) => {
    const isSpoilt = connections < (spoiling.requests?.connections ?? 0)
    connections += 1
    const upstream = connect(Number(port), hostname)
    const cut = (): void => {
      client.destroy()
      upstream.destroy()
    }
    let sent = 0
    let isWaitedFor = false
    client.on('data', (chunk: Buffer) => {
      sent += chunk.length
      if (isSpoilt && sent > (spoiling.requests?.after ?? 0)) cut()
      else upstream.write(chunk)
      if (chunk.includes('POST /api/teams/')) isWaitedFor = true
    })
    upstream.on('data', (chunk: Buffer) => {
      if (spoiling.isFirstAnswerLost === true && isWaitedFor && !isLost) {
        isLost = true
        cut()
      } else client.write(chunk)
    })
    client.on('end', () => upstream.end())
    upstream.on('end', () => client.end())
    client.on('error', cut)
    upstream.on('error', cut)
  })
  await new Promise<void>((fulfil) => proxy.listen(0, '127.0.0.1', fulfil))
  const address = proxy.address()
  return {
    url: `http://127.0.0.1:${String(typeof address === 'object' && address !== null ? address.port : 0)}`,
    proxy,
  }
}

describe('foldgauge push', () => {
  it('sends the workspace and says which version it became', async () => {
    const pushed = await call(['push'])
    expect(pushed).toMatchObject({ code: 0, err: '' })
    expect(pushed.out).toMatch(/^boxed-notes: version 1, pass, \d+ of 100 builds work; there is no earlier version/)
    expect(pushed.out).toContain(`${server.url}/teams/${team.slug}/sets/boxed-notes/versions/1`)
    expect((await call(['push'])).out).toContain('version 1, there already')
    expect(await versions()).toMatchObject([{ number: 1, branch: 'main', pushedBy: { kind: 'robot', name: 'ci' } }])
  })

  it('records a lid that no longer clears its box, which check --against published has caught', async () => {
    await call(['push'])
    const at = { team: team.slug, set: 'boxed-notes', number: 1 }
    const { content } = await team.reviewer.call(endpoints.version, { params: at })
    await team.reviewer.call(endpoints.decide, { params: at, body: { decision: 'approve', content } })
    await team.owner.call(endpoints.publish, { params: at, body: { label: '1.0.0' } })
    const same = await call(['check', '--against', 'published', '--fail-on', 'regression'])
    expect([same.code, same.out]).toEqual([0, expect.stringContaining('Nothing is worse than published.')])
    write(boxText({ lid: tightLid }))
    const worse = await call(['check', '--against', 'published', '--fail-on', 'regression'])
    expect([worse.code, worse.out]).toEqual([1, expect.stringContaining('Worse than published.')])
    expect((await call(['check', '--against', 'branch:main', '--fail-on', 'regression'])).code).toBe(1)
    expect((await call(['push'])).code).toBe(1)
    expect((await call(['push', '--fail-on', 'never'])).code).toBe(0)
    await server.work()
    expect(await versions()).toMatchObject([{ number: 2, verdict: 'fail', change: { state: 'worse' } }, { number: 1 }])
  })

  it('holds a set that the server does not know yet against nothing', async () => {
    const fresh = await call(['check', '--against', 'published', '--fail-on', 'regression'])
    expect(fresh.code).toBe(0)
  })

  it('sends branch, commit, ancestors and merge base from git', async () => {
    const git = (...words: string[]): string =>
      execFileSync('git', ['-c', 'user.name=a', '-c', 'user.email=a@b.example', ...words], {
        cwd,
        encoding: 'utf8',
      }).trim()
    git('init', '-q', '-b', 'main')
    git('add', 'foldgauge.yaml', 'sets')
    git('commit', '-q', '-m', 'first')
    await call(['push'])
    git('checkout', '-q', '-b', 'wider')
    write(boxText({ lid: '178 x 136 mm' }))
    git('commit', '-q', '-a', '-m', 'wider')
    await call(['push'])
    const [latest] = await versions()
    expect(latest).toMatchObject({
      branch: 'wider',
      commit: git('rev-parse', 'HEAD'),
      baseline: { number: 1, reason: 'merge-base' },
    })
    write(boxText({ lid: '179 x 137 mm' }))
    expect((await call(['push'])).err).toContain('the work tree differs from its commit')
  })

  it('cut off in the middle of the request stores nothing of it, and tries again', async () => {
    const { url, proxy } = await startProxy({ requests: { connections: 2, after: 900 } })
    const pushed = await call(['push', '--server', url])
    proxy.close()
    expect(pushed.code).toBe(0)
    expect(pushed.err).toContain('trying again')
    expect(await versions()).toHaveLength(1)
  })

  it('cut off before the answer arrives is stored once', async () => {
    const { url, proxy } = await startProxy({ isFirstAnswerLost: true })
    const pushed = await call(['push', '--server', url])
    proxy.close()
    expect(pushed.code).toBe(0)
    expect(pushed.err).toContain('trying again')
    expect(pushed.out).toContain('there already')
    expect(await versions()).toHaveLength(1)
    const pushes: { n: number }[] = await server.context.database.query(
      'select count(*)::int as n from push where team_id = $1',
      [team.id],
    )
    expect(pushes[0]?.n).toBe(1)
  })

  it('that cannot be sent exits 3, is kept without the token, and is sent by --resume', async () => {
    const { url, proxy } = await startProxy({})
    proxy.close()
    const failed = await call(['push', '--server', url], { FOLDGAUGE_RETRIES: '1' })
    expect(failed.code).toBe(3)
    expect(failed.err).toContain('push --resume')
    const folder = join(cwd, '.local', 'state', 'foldgauge', 'spool')
    const [file = ''] = readdirSync(folder)
    const text = readFileSync(join(folder, file), 'utf8')
    expect(text).not.toContain(token)
    writeFileSync(join(folder, file), text.replaceAll(url, server.url))
    write(boxText({ lid: tightLid }))
    expect((await call(['push', '--resume'])).code).toBe(0)
    expect(await versions()).toMatchObject([{ number: 1, verdict: 'pass' }])
    expect(readdirSync(folder)).toEqual([])
    expect((await call(['push', '--resume'])).err).toContain('Nothing is kept')
  })

  it('with a set that cannot be read exits 2 and sends nothing', async () => {
    write(boxText().replace('kind: lid', 'kind: lit'))
    const refused = await call(['push'])
    expect([refused.code, refused.err]).toEqual([2, expect.stringMatching(/^sets\/boxed-notes\.yaml:6:\d+: /)])
    expect((await team.viewer.call(endpoints.sets, { params: { team: team.slug } })).items).toEqual([])
  })

  it('with a wrong token exits 3 and says so, without a token 2', async () => {
    const wrong = await call(['push'], { FOLDGAUGE_TOKEN: `fgt_aaaaaaaaaa_${'a'.repeat(43)}` })
    expect([wrong.code, wrong.err]).toEqual([3, expect.stringContaining('The token is unknown, revoked or over.')])
    const without = await call(['push'], { FOLDGAUGE_TOKEN: '' })
    expect([without.code, without.err]).toEqual([2, expect.stringContaining('there is no token')])
  })
})

describe('foldgauge login', () => {
  it('keeps a token that the server knows, for its owner alone, and never shows it', async () => {
    const done = await call(['login', server.url], {}, `${token}\n`)
    expect(done.code).toBe(0)
    expect(done.err).toContain(`for team ${team.slug}`)
    expect(done.out + done.err).not.toContain(token.slice(15))
    const file = join(cwd, '.config', 'foldgauge', 'credentials.json')
    expect(statSync(file).mode & 0o777).toBe(0o600)
    token = ''
    const env = { HOME: cwd }
    const pushed = await run(['push'], {
      cwd,
      env,
      today: () => '2026-12-01',
      out: () => undefined,
      err: () => undefined,
      terminal: { isTerminal: false, columns: 80 },
      showsProgress: false,
      readStandardInput: () => Promise.resolve(''),
    })
    expect(pushed).toBe(0)
  })

  it('refuses what is no token and one that the server does not know', async () => {
    expect((await call(['login', server.url], {}, 'hunter2')).err).toContain('that is not a token')
    const unknown = await call(['login', server.url], {}, `fgt_aaaaaaaaaa_${'a'.repeat(43)}`)
    expect([unknown.code, unknown.err]).toEqual([2, expect.stringContaining('unknown, revoked or over')])
    expect(existsSync(join(cwd, '.config'))).toBe(false)
    expect((await call(['login', 'ftp://x'], {}, token)).code).toBe(2)
  })
})
