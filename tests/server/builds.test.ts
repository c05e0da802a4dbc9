import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { BodyInput } from '../../shared/api/endpoint.ts'
import { endpoints } from '../../shared/api/endpoint-registry.ts'
import { createTeam, linkIn, stranger, type TestTeam } from './support/agent.ts'
import { pushOf } from './support/demo-push.ts'
import { startTestServer, type TestServer } from './support/test-server.ts'

let server: TestServer
let team: TestTeam
beforeAll(async () => {
  server = await startTestServer()
  team = await createTeam(server, 'builders')
  await team.author.call(endpoints.push, { params: { team: team.slug }, body: pushOf() })
  await server.work()
})
afterAll(() => server.stop())

const at = { team: 'builders', set: 'boxed-notes', number: 1 }

const reportOf = (
  given: Partial<BodyInput<typeof endpoints.submitBuild>> = {},
): BodyInput<typeof endpoints.submitBuild> => ({
  scaleBar: { x: 97, y: 97, nominal: 100 },
  paper: { name: 'Cover', grammage: 270, thickness: [0.32, 0.33] },
  readings: [{ key: 'lid/inside-length', values: [157.2, 157.4] }],
  fits: [{ fit: 'lid-on-base', felt: 'tight' }],
  problems: [{ piece: 'lid', edge: 'short', expected: '135', got: '134' }],
  ...given,
})

async function invite(email: string): Promise<string> {
  await team.author.call(endpoints.inviteTester, {
    params: at,
    body: { email, name: email.replace(/@.*/, ''), note: 'Thank you!' },
  })
  await server.work()
  return linkIn(server, email, '/test/')
}

/** A JPEG as a phone writes it: lying on its side, with a place in it. */
const phonePhoto = (): Promise<Buffer> =>
  sharp({ create: { width: 640, height: 400, channels: 3, background: '#885522' } })
    .withMetadata({ orientation: 6 })
    .withExif({ IFD0: { Make: 'Secret camera' }, IFD3: { GPSLatitude: '52/1 30/1 0/1' } })
    .jpeg()
    .toBuffer()

describe('a tester', () => {
  it('reports a build by a link without an account: draft, photograph, submission', async () => {
    const key = await invite('una@quillfern.example')
    const tester = stranger(server)
    const { form, build, last } = await tester.call(endpoints.buildForm, { params: { key } })
    expect(form).toMatchObject({ stamp: 'v1-t1', set: 'boxed-notes', note: 'Thank you!' })
    expect(form.measure.map(({ key: name }) => name)).toContain('lid/inside-length')
    expect([build, last]).toEqual([null, null])
    const draft = await tester.call(endpoints.saveBuild, { params: { key }, body: reportOf() })
    expect(draft.state).toBe('draft')
    const photo = await tester.call(endpoints.addBuildPhoto, {
      params: { key },
      query: { alt: 'The lid on its box' },
      body: await phonePhoto(),
    } as never)
    expect(photo).toMatchObject({ width: 400, height: 640, mayBePublished: false })
    const bytes = Buffer.from(await (await fetch(`${server.url}${photo.path}`)).arrayBuffer())
    const kept = await sharp(bytes).metadata()
    expect([kept.exif, kept.orientation, kept.format]).toEqual([undefined, undefined, 'jpeg'])
    expect(bytes.includes('Secret camera')).toBe(false)
    const sent = await tester.call(endpoints.submitBuild, { params: { key }, body: reportOf() })
    expect(sent).toMatchObject({ state: 'submitted', photos: [{ id: photo.id }] })
    await server.work()
    expect(
      server.mail.mails.some(
        ({ subject, to }) =>
          subject === 'Build reported: Boxed notes' && to.includes('builders-author@quillfern.example'),
      ),
    ).toBe(true)
    const { items } = await team.reviewer.call(endpoints.builds, { params: at })
    expect(items).toMatchObject([{ tester: 'una', state: 'submitted' }])
    expect((await team.viewer.refusal(endpoints.builds, { params: at })).status).toBe(403)
  })

  it('opens nothing but the version of the link, and nothing once it has ended', async () => {
    const key = await invite('vera@quillfern.example')
    const tester = stranger(server)
    expect((await tester.refusal(endpoints.version, { params: at })).status).toBe(401)
    const wrong = await tester.refusal(endpoints.saveBuild, {
      params: { key },
      body: reportOf({ fits: [{ fit: 'drawer', felt: 'good' }] }),
    })
    expect(wrong.status).toBe(422)
    const { items } = await team.author.call(endpoints.buildInvitations, { params: at })
    const invitation = items.find(({ email }) => email === 'vera@quillfern.example')?.id ?? ''
    expect((await tester.refusal(endpoints.buildForm, { params: { key: invitation } })).status).toBe(404)
    await team.author.call(endpoints.revokeBuildInvitation, { params: { team: team.slug, invitation } })
    expect((await tester.refusal(endpoints.buildForm, { params: { key } })).status).toBe(410)
  })

  it('with an account sees their invitations and opens them without the link', async () => {
    await invite('builders-tester@quillfern.example')
    const { items } = await team.tester.call(endpoints.myBuilds)
    expect(items).toMatchObject([{ state: 'sent', title: 'Boxed notes' }])
    const key = items[0]?.key ?? ''
    expect((await team.tester.call(endpoints.buildForm, { params: { key } })).form.version).toBe(1)
    expect((await team.viewer.refusal(endpoints.buildForm, { params: { key } })).status).toBe(404)
  })

  it.each([
    ['a text called JPEG', Buffer.from('no photograph at all')],
    ['a drawing', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="5" height="5"/>')],
    ['a broken JPEG', Buffer.from([0xff, 0xd8, 0xff, 0xe0, 1, 2, 3])],
  ])('cannot send %s', async (_, body) => {
    const key = await invite(`wren${String(body.length)}@quillfern.example`)
    await stranger(server).call(endpoints.saveBuild, { params: { key }, body: reportOf() })
    const refused = await stranger(server).refusal(endpoints.addBuildPhoto, { params: { key }, body } as never)
    expect(refused.status).toBe(415)
  })
})

describe('a sheet of readings', () => {
  const load = (body: string, query: object = {}) =>
    team.reviewer.call(endpoints.importBuilds, { params: at, query, body } as never)

  it('is read with its own separator and decimal mark, shown first, and stored whole', async () => {
    const text =
      'tester;key;units;reading 1;reading 2;reading 3;felt\r\nxena;lid/inside-length;mm;157,25;157,5;;\r\nxena;lid-on-base;mm;;;;good\r\nyara;lid/inside-length;mm;157;;;\r\n'
    const shown = await load(text)
    expect(shown).toMatchObject({
      separator: ';',
      decimal: ',',
      units: 'mm',
      rows: 3,
      builds: 2,
      isStored: false,
      problems: [],
    })
    expect(shown.preview[0]).toEqual({
      line: 2,
      tester: 'xena',
      key: 'lid/inside-length',
      written: '157,25',
      read: '157.25 mm',
    })
    expect((await load(text, { store: 'true' })).isStored).toBe(true)
    const csv = String(await team.reviewer.call(endpoints.buildsCsv, { params: at }))
    expect(csv).toContain('xena,lid/inside-length,mm,157.25,157.5,,,')
    expect((await load(csv)).problems).toEqual([])
  })

  it.each([
    ['of one column', 'tester\nxena\n', 'only one column'],
    ['without units', 'tester,key,reading 1\nxena,lid/inside-length,157\n', 'mm or in'],
    [
      'with both decimal marks',
      'tester;key;units;reading 1;reading 2\na;lid/inside-length;mm;157.2;157,3\n',
      'decimal',
    ],
    ['with an unknown dimension', 'tester,key,units,reading 1\na,lid/colour,mm,157\n', 'no dimension'],
    ['with a word for a number', 'tester,key,units,reading 1\na,lid/inside-length,mm,about 157\n', 'not a number'],
    ['with a quote that never ends', 'tester,key,units,reading 1\n"a,lid/inside-length,mm,157\n', ''],
  ])('%s is refused with its line, and nothing of it is stored', async (_, text, words) => {
    const answer = await load(text, { store: 'true' })
    expect(answer.isStored).toBe(false)
    expect(answer.problems[0]?.message).toContain(words)
    expect(answer.problems[0]?.line).toBeGreaterThan(0)
  })

  it('in inches is kept in millimetres', async () => {
    const before = (await team.reviewer.call(endpoints.builds, { params: at })).items.length
    await load('tester,key,units,reading 1\nzoe,lid/inside-length,in,6.2\n', { store: 'true' })
    const { items } = await team.reviewer.call(endpoints.builds, { params: at })
    expect(items).toHaveLength(before + 1)
    expect(items[0]?.report.readings[0]?.values[0]).toBeCloseTo(157.48, 6)
  })
})

describe('predicted against measured', () => {
  it('says nothing of the mean under three builds and gives its interval from three', async () => {
    const { dimensions, fits, builds } = await team.reviewer.call(endpoints.study, { params: at })
    expect(builds).toBe(4)
    const lid = dimensions.find(({ key }) => key === 'lid/inside-length')
    expect(lid).toMatchObject({ n: 4, deviation: null, tolerance: null })
    expect(lid?.interval?.low).toBeLessThan(lid?.mean ?? 0)
    // Measured out by the maker: the printer's scale has no part in it.
    expect(lid?.points[0]).toMatchObject({ mean: 157.3, corrected: 157.3 })
    expect(dimensions.find(({ key }) => key === 'base/outside-width')).toMatchObject({
      n: 0,
      reading: 'too-few',
      interval: null,
    })
    expect(fits).toMatchObject([{ fit: 'lid-on-base', n: 2, went: 2, atLeast: null }])
  })
})

describe('papers', () => {
  it('are measured per sheet, a stack of ten divided by ten', async () => {
    const paper = await team.reviewer.call(endpoints.addPaper, {
      params: { team: team.slug },
      body: { stock: 'cover', method: 'stack-of-ten', readings: [3.2, 3.3, 3.1] },
    })
    expect(paper.mean).toBeCloseTo(0.32, 9)
    expect(paper.spread).toBeCloseTo(0.01, 9)
    expect((await team.viewer.call(endpoints.papers, { params: { team: team.slug } })).items).toHaveLength(1)
  })
})
