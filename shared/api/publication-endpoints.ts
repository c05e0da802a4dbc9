import { z } from 'zod'
import { anyone, defineEndpoint, teamMay } from './define-endpoint.ts'
import { limits } from './limits.ts'
import { setPath } from './set-endpoints.ts'
import { words } from './shapes/words.ts'
import { versionPath } from './version-endpoints.ts'

const group = 'Publication'

const labelShape = z.string().regex(/^\d{1,4}\.\d{1,4}\.\d{1,4}$/, 'three numbers, such as 1.2.0')

const fileShape = z.strictObject({ name: z.string(), type: z.string(), bytes: z.int(), path: z.string() })

export const erratumShape = z
  .strictObject({
    id: words.id,
    labels: z.array(z.string()).describe('published labels it is about'),
    pieces: z.array(z.string()),
    pages: z.array(z.string()).describe('pages to reprint, as they are titled'),
    symptom: z.string(),
    wrong: z.string(),
    right: z.string(),
    severity: z.enum(['cosmetic', 'wastes-paper', 'will-not-assemble']),
    workaround: z.string(),
    oldPiecesMate: z.boolean().nullable().describe('from the comparison of both versions; null where none was made'),
    mating: z.array(z.string()).describe('each crossing of old and new pieces in words'),
    thanks: z.string(),
    reportedAt: words.moment,
    by: z.string(),
  })
  .meta({ id: 'Erratum' })

const publicationShape = z
  .strictObject({
    label: labelShape,
    version: z.int(),
    digest: words.digest,
    publishedAt: words.moment,
    publishedBy: z.string(),
    notes: z.string(),
    licence: z.string(),
    exports: z.enum(['pending', 'ready', 'failed']),
    files: z.array(fileShape),
    recalled: z.strictObject({ reason: z.string(), at: words.moment, by: z.string() }).nullable(),
    errata: z.array(erratumShape),
  })
  .meta({ id: 'Publication' })

const proposalShape = z.strictObject({
  label: labelShape,
  step: z.enum(['first', 'major', 'minor', 'patch', 'none']),
  why: z.string(),
  oldPiecesMate: z.boolean().nullable(),
  mating: z.array(z.string()),
  blockers: z.array(z.string()).describe('empty where it may be published'),
  checklist: z.array(z.strictObject({ item: z.string(), isDone: z.boolean() })),
})

const publicPageShape = z
  .strictObject({
    title: z.string(),
    team: z.string(),
    label: labelShape,
    publishedAt: words.moment,
    digest: words.digest,
    units: z.enum(['mm', 'in']),
    works: words.share,
    workmanship: z.string(),
    pieces: z.array(
      z.strictObject({
        name: z.string(),
        kind: z.string(),
        stock: z.string().nullable(),
        blank: z.strictObject({ length: z.number(), width: z.number() }).nullable(),
        make: z.int(),
      }),
    ),
    fits: z.array(z.strictObject({ id: z.string(), closes: words.share, verdict: z.string() })),
    notes: z.string(),
    licence: z.string(),
    files: z.array(fileShape),
    errata: z.array(erratumShape),
    recalled: z.strictObject({ reason: z.string(), at: words.moment }).nullable(),
    photo: z.string().nullable(),
    others: z.array(z.strictObject({ label: labelShape, isRecalled: z.boolean() })),
  })
  .meta({ id: 'PublicPage' })

const labelPath = setPath.extend({ label: labelShape })
const publicPath = z.strictObject({ page: z.string().min(8).max(60) })

/** Publishing, errata, recall and the public page. */
export const publicationEndpoints = {
  publications: defineEndpoint('publications', 'get', '/api/teams/{team}/sets/{set}/publications', {
    group,
    summary: 'What was published of a set, newest first',
    access: teamMay('sets:read', 'read'),
    params: setPath,
    answer: z.strictObject({ items: z.array(publicationShape) }),
  }),
  proposal: defineEndpoint('proposal', 'get', '/api/teams/{team}/sets/{set}/versions/{number}/publication', {
    group,
    summary: 'Which label a version would get and why, and what stands in the way',
    access: teamMay('sets:read'),
    params: versionPath,
    answer: proposalShape,
  }),
  publish: defineEndpoint('publish', 'post', '/api/teams/{team}/sets/{set}/versions/{number}/publication', {
    group,
    summary: 'Publish a version under a label that never changes',
    access: teamMay('publish'),
    params: versionPath,
    body: z.strictObject({
      label: labelShape,
      notes: words.note.default(''),
      overrideReason: words.reason.nullable().default(null).describe('publish without approval, for this reason'),
    }),
    answer: publicationShape,
  }),
  publishedFile: defineEndpoint(
    'publishedFile',
    'get',
    '/api/teams/{team}/sets/{set}/publications/{label}/files/{file}',
    {
      group,
      summary: 'One kept export',
      access: teamMay('sets:read', 'read'),
      params: labelPath.extend({ file: z.string().min(1).max(200) }),
      answerKind: 'file',
    },
  ),
  addErratum: defineEndpoint('addErratum', 'post', '/api/teams/{team}/sets/{set}/errata', {
    group,
    summary: 'Tell makers what is wrong in what they printed',
    access: teamMay('publish'),
    params: setPath,
    body: z.strictObject({
      labels: z.array(labelShape).min(1).max(50),
      pieces: z.array(words.name).max(50),
      pages: z.array(words.title).max(100).default([]),
      symptom: words.reason,
      wrong: z.string().max(limits.reason).default(''),
      right: z.string().max(limits.reason).default(''),
      severity: z.enum(['cosmetic', 'wastes-paper', 'will-not-assemble']),
      workaround: z.string().max(limits.note).default(''),
      replacement: labelShape.nullable().default(null).describe('label that mends it'),
      thanks: z.string().max(limits.name).default(''),
    }),
    answer: erratumShape,
  }),
  recall: defineEndpoint('recall', 'post', '/api/teams/{team}/sets/{set}/publications/{label}/recall', {
    group,
    summary: 'Stop new use of what was published; nothing disappears',
    access: teamMay('publish'),
    params: labelPath,
    body: z.strictObject({ reason: words.reason }),
    answer: publicationShape,
  }),
  publicPage: defineEndpoint('publicPage', 'get', '/api/public/{page}', {
    group,
    summary: 'What anybody may read about a published set',
    access: anyone,
    params: publicPath,
    query: z.strictObject({ label: labelShape.optional() }),
    answer: publicPageShape,
  }),
  publicPhoto: defineEndpoint('publicPhoto', 'get', '/api/public/{page}/photo', {
    group,
    summary: 'The finished sample’s photograph',
    access: anyone,
    params: publicPath,
    answerKind: 'file',
  }),
  publicFile: defineEndpoint('publicFile', 'get', '/api/public/{page}/{label}/{file}', {
    group,
    summary: 'One kept export of a published set; recalled ones answer 410',
    access: anyone,
    params: publicPath.extend({ label: labelShape, file: z.string().min(1).max(200) }),
    answerKind: 'file',
  }),
} as const
