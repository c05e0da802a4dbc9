import { z } from 'zod'
import { defineEndpoint, teamMay } from './define-endpoint.ts'
import { pageOf, pagingShape } from './paging.ts'
import { setPath } from './set-endpoints.ts'
import {
  baselineShape,
  comparisonAnswerShape,
  reportAnswerShape,
  reviewStates,
  versionRowShape,
} from './shapes/version-shapes.ts'
import { words } from './shapes/words.ts'

const group = 'Versions'
export const versionPath = setPath.extend({ number: words.number })

const versionShape = versionRowShape
  .extend({
    set: words.setName,
    file: z.string(),
    text: z.string(),
    workspace: z.strictObject({ file: z.string(), text: z.string() }).nullable(),
    report: reportAnswerShape,
    sender: z
      .strictObject({ engine: z.string(), digest: words.digest.nullable(), verdict: words.verdict.nullable() })
      .describe('what the sender’s engine said'),
    differs: z.string().nullable(),
    knownFailures: z.array(
      z.strictObject({ fingerprint: z.string(), reason: z.string(), until: words.day, acceptedBy: z.string() }),
    ),
    rechecks: z.array(
      z.strictObject({ engine: z.string(), verdict: words.verdict, works: words.share, checkedAt: words.moment }),
    ),
  })
  .meta({ id: 'Version' })

const comparisonShape = z
  .strictObject({
    sentence: z.string().describe('what is compared with what, and why'),
    before: z.int(),
    after: z.int(),
    reason: baselineShape.shape.reason.or(z.literal('asked')),
    comparison: comparisonAnswerShape,
    isRechecked: z.boolean().describe('the older text was judged again by the present engine to be comparable'),
    texts: z.strictObject({ before: z.string(), after: z.string() }),
  })
  .meta({ id: 'VersionComparison' })

const trendPointShape = z.strictObject({
  number: z.int(),
  pushedAt: words.moment,
  fit: z.string(),
  axis: words.axis,
  clearance: z.strictObject({ nominal: z.number(), min: z.number(), max: z.number() }),
  required: z.strictObject({ min: z.number().nullable(), max: z.number().nullable() }),
  binds: words.share,
  rattles: words.share,
})

/** Versions, baselines and comparisons. */
export const versionEndpoints = {
  versions: defineEndpoint('versions', 'get', '/api/teams/{team}/sets/{set}/versions', {
    group,
    summary: 'Versions of a set, newest first',
    access: teamMay('sets:read', 'read'),
    params: setPath,
    query: z.strictObject({
      ...pagingShape,
      branch: words.branch.optional(),
      review: z.enum(reviewStates).optional(),
    }),
    answer: pageOf(versionRowShape),
  }),
  versionsCsv: defineEndpoint('versionsCsv', 'get', '/api/teams/{team}/sets/{set}/versions.csv', {
    group,
    summary: 'The same list as CSV',
    access: teamMay('sets:read', 'read'),
    params: setPath,
    query: z.strictObject({ branch: words.branch.optional() }),
    answerKind: 'csv',
  }),
  version: defineEndpoint('version', 'get', '/api/teams/{team}/sets/{set}/versions/{number}', {
    group,
    summary: 'A version with its texts and report',
    access: teamMay('sets:read', 'read'),
    params: versionPath,
    answer: versionShape,
  }),
  versionNamed: defineEndpoint('versionNamed', 'get', '/api/teams/{team}/sets/{set}/version-named', {
    group,
    summary: 'The published version, or the latest of a branch, to check against',
    access: teamMay('sets:read', 'read'),
    params: setPath,
    query: z.strictObject({ published: z.literal('true').optional(), branch: words.branch.optional() }),
    answer: versionShape,
  }),
  compare: defineEndpoint('compare', 'get', '/api/teams/{team}/sets/{set}/versions/{number}/comparison', {
    group,
    summary: 'A version compared with another one, or with its baseline',
    access: teamMay('sets:read', 'read'),
    params: versionPath,
    query: z.strictObject({ with: words.number.optional().describe('the older one; absent: the baseline') }),
    answer: comparisonShape,
  }),
  pinBaseline: defineEndpoint('pinBaseline', 'put', '/api/teams/{team}/sets/{set}/baseline', {
    group,
    summary: 'Compare every later version with this one until unpinned',
    access: teamMay('baseline:pin'),
    params: setPath,
    body: z.strictObject({ number: z.int().min(1), note: words.reason }),
    statuses: [204],
  }),
  unpinBaseline: defineEndpoint('unpinBaseline', 'delete', '/api/teams/{team}/sets/{set}/baseline', {
    group,
    summary: 'Let the rules choose baselines again',
    access: teamMay('baseline:pin'),
    params: setPath,
  }),
  recheck: defineEndpoint('recheck', 'post', '/api/teams/{team}/sets/{set}/versions/{number}/rechecks', {
    group,
    summary: 'Judge a version with the present engine; what was recorded stays',
    access: teamMay('sets:edit'),
    params: versionPath,
    answer: z.strictObject({ report: reportAnswerShape }),
  }),
  trend: defineEndpoint('trend', 'get', '/api/teams/{team}/sets/{set}/trend', {
    group,
    summary: 'Clearance and yield of each fit across the last versions of a branch, oldest first',
    access: teamMay('sets:read', 'read'),
    params: setPath,
    query: z.strictObject({
      branch: words.branch.optional(),
      versions: z.coerce.number().int().min(2).max(100).default(30),
    }),
    answer: z.strictObject({ items: z.array(trendPointShape) }),
  }),
} as const
