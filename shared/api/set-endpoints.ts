import { z } from 'zod'
import { defineEndpoint, teamMay } from './define-endpoint.ts'
import { bodyLimits, limits } from './limits.ts'
import { pageOf, pagingShape } from './paging.ts'
import { changeShape, countsShape, reviewStates } from './shapes/version-shapes.ts'
import { words } from './shapes/words.ts'

const group = 'Sets'
const inTeam = z.strictObject({ team: words.slug })
export const setPath = inTeam.extend({ set: words.setName })

export const setStates = ['newly-failing', 'failing', 'known-failing', 'warning', 'passing', 'invalid'] as const

const branchStateShape = z
  .strictObject({
    branch: words.branch,
    number: z.int(),
    verdict: words.verdict,
    change: changeShape,
    pushedAt: words.moment,
  })
  .meta({ id: 'BranchState' })

export const worstFitShape = z
  .strictObject({
    id: z.string(),
    axis: words.axis.nullable(),
    closes: words.share,
    binds: words.share,
    rattles: words.share,
    verdict: z.enum(['pass', 'warn', 'fail']),
  })
  .meta({ id: 'WorstFit' })

export const setRowShape = z
  .strictObject({
    name: words.setName,
    title: z.string(),
    family: z.string().nullable(),
    units: z.enum(['mm', 'in']),
    tags: z.array(words.tag),
    state: z.enum(setStates),
    latest: z.strictObject({
      number: z.int(),
      branch: words.branch,
      verdict: words.verdict,
      works: words.share,
      counts: countsShape,
      pushedAt: words.moment,
    }),
    worstFit: worstFitShape.nullable(),
    trend: z.array(words.share).describe('share of builds that work, last versions of the main branch, oldest first'),
    published: z.string().nullable().describe('label of what is published and not recalled'),
    review: z.enum(reviewStates),
    knownFailures: z.int(),
    builds: z.int(),
    photo: z.string().nullable().describe('path of the finished sample’s thumbnail'),
    updatedAt: words.moment,
  })
  .meta({ id: 'SetRow' })

const setShape = setRowShape
  .extend({
    branches: z.array(branchStateShape),
    pinned: z.strictObject({ number: z.int(), note: z.string(), by: z.string() }).nullable(),
    isPublic: z.boolean(),
    publicPage: z.string().nullable().describe('path of the public page; null unless switched on'),
    versions: z.int(),
  })
  .meta({ id: 'Set' })

const filters = {
  search: z.string().trim().max(limits.search).optional(),
  family: z.string().max(limits.name).optional(),
  state: z.enum(setStates).optional(),
  branch: words.branch.optional(),
  tag: words.tag.optional(),
}

const holdShape = z
  .strictObject({
    set: words.setName,
    title: z.string(),
    piece: z.string(),
    kind: z.string(),
    number: z.int(),
    inside: z.strictObject({ length: z.number(), width: z.number(), depth: z.number().nullable() }),
    isTurned: z.boolean().describe('goes in with length and width exchanged'),
    goesIn: words.share.describe('share of builds that the piece goes into'),
    clearance: z.strictObject({ length: z.number(), width: z.number(), depth: z.number().nullable() }),
  })
  .meta({ id: 'Hold' })

const millimetres = z.coerce.number().positive().max(5_000)

/** Sets of a team, and what may be said about them besides their versions. */
export const setEndpoints = {
  sets: defineEndpoint('sets', 'get', '/api/teams/{team}/sets', {
    group,
    summary: 'Sets: newly failing first, then by last change',
    access: teamMay('sets:read', 'read'),
    params: inTeam,
    query: z.strictObject({ ...pagingShape, ...filters }),
    answer: pageOf(setRowShape),
  }),
  setsCsv: defineEndpoint('setsCsv', 'get', '/api/teams/{team}/sets.csv', {
    group,
    summary: 'The same list as CSV',
    access: teamMay('sets:read', 'read'),
    params: inTeam,
    query: z.strictObject(filters),
    answerKind: 'csv',
  }),
  setWords: defineEndpoint('setWords', 'get', '/api/teams/{team}/set-filters', {
    group,
    summary: 'Families, tags and branches that occur, for filters',
    access: teamMay('sets:read', 'read'),
    params: inTeam,
    answer: z.strictObject({
      families: z.array(z.string()),
      tags: z.array(z.string()),
      branches: z.array(z.string()),
    }),
  }),
  holds: defineEndpoint('holds', 'get', '/api/teams/{team}/holds', {
    group,
    summary: 'Which pieces of the library hold a thing of this size, the surest first',
    access: teamMay('sets:read', 'read'),
    params: inTeam,
    query: z.strictObject({ length: millimetres, width: millimetres, height: millimetres.optional() }),
    answer: z.strictObject({ items: z.array(holdShape) }),
  }),
  set: defineEndpoint('set', 'get', '/api/teams/{team}/sets/{set}', {
    group,
    summary: 'A set with the state of each branch',
    access: teamMay('sets:read', 'read'),
    params: setPath,
    answer: setShape,
  }),
  changeSet: defineEndpoint('changeSet', 'patch', '/api/teams/{team}/sets/{set}', {
    group,
    summary: 'Tag a set, or switch its public page on or off',
    access: teamMay('sets:edit'),
    params: setPath,
    body: z.strictObject({ tags: z.array(words.tag).max(limits.tags).optional(), isPublic: z.boolean().optional() }),
    answer: setShape,
  }),
  putSetPhoto: defineEndpoint('putSetPhoto', 'put', '/api/teams/{team}/sets/{set}/photo', {
    group,
    summary: 'The finished sample’s photograph; place and other metadata are removed',
    access: teamMay('sets:edit'),
    params: setPath,
    bodyTypes: ['image/jpeg', 'image/png', 'image/webp', 'image/heic', 'image/avif'],
    bodyLimit: bodyLimits.photo,
    answer: z.strictObject({ photo: z.string() }),
  }),
  setPhoto: defineEndpoint('setPhoto', 'get', '/api/teams/{team}/sets/{set}/photo', {
    group,
    summary: 'The photograph',
    access: teamMay('sets:read', 'read'),
    params: setPath,
    query: z.strictObject({
      size: z.enum(['full', 'thumbnail']).default('full'),
      of: z.string().max(40).optional().describe('changes with the photograph; not looked at'),
    }),
    answerKind: 'file',
  }),
} as const
