import { z } from 'zod'
import { anyone, defineEndpoint, teamMay } from './define-endpoint.ts'
import { limits } from './limits.ts'
import { pageOf, pagingShape } from './paging.ts'
import { actorShape, words } from './shapes/words.ts'

const inTeam = z.strictObject({ team: words.slug })

const auditShape = z
  .strictObject({
    id: z.string(),
    at: words.moment,
    actor: actorShape,
    verb: z.string().describe('a plain verb: published, approved, invited'),
    object: z.strictObject({ kind: z.string(), name: z.string() }),
    sentence: z.string(),
  })
  .meta({ id: 'AuditEntry' })

const retentionShape = z
  .strictObject({
    mainDays: z.int().min(7).max(36_500).nullable().describe('null keeps the main branch for ever'),
    branchDays: z.int().min(1).max(36_500).nullable(),
    branchVersions: z.int().min(1).max(100_000).nullable().describe('versions kept per set and branch'),
  })
  .meta({ id: 'Retention' })

const paperShape = z
  .strictObject({
    id: words.id,
    stock: z.string(),
    method: z.enum(['single-sheet', 'stack-of-ten']),
    readings: z.array(z.number()).describe('millimetres per sheet'),
    mean: z.number(),
    spread: z.number().nullable().describe('standard deviation of the readings; from two'),
    note: z.string(),
    by: z.string(),
    at: words.moment,
  })
  .meta({ id: 'PaperReading' })

const jobShape = z
  .strictObject({
    id: words.id,
    kind: z.string(),
    about: z.string(),
    failedAt: words.moment,
    reason: z.string(),
  })
  .meta({ id: 'DeadJob' })

/** Audit, retention, papers, failed work and health. */
export const upkeepEndpoints = {
  audit: defineEndpoint('audit', 'get', '/api/teams/{team}/audit', {
    group: 'Audit',
    summary: 'Decisions and changes of permission, newest first',
    access: teamMay('audit:read'),
    params: inTeam,
    query: z.strictObject({ ...pagingShape, search: z.string().trim().max(limits.search).optional() }),
    answer: pageOf(auditShape),
  }),
  auditCsv: defineEndpoint('auditCsv', 'get', '/api/teams/{team}/audit.csv', {
    group: 'Audit',
    summary: 'The same as CSV',
    access: teamMay('audit:read'),
    params: inTeam,
    answerKind: 'csv',
  }),
  retention: defineEndpoint('retention', 'get', '/api/teams/{team}/retention', {
    group: 'Retention',
    summary: 'How long versions are kept',
    access: teamMay('retention:manage'),
    params: inTeam,
    answer: retentionShape,
  }),
  changeRetention: defineEndpoint('changeRetention', 'put', '/api/teams/{team}/retention', {
    group: 'Retention',
    summary: 'Change it; the answer tells how many versions would go tonight',
    access: teamMay('retention:manage'),
    params: inTeam,
    query: z.strictObject({ dryRun: z.enum(['true', 'false']).default('false') }),
    body: retentionShape,
    answer: z.strictObject({ retention: retentionShape, wouldRemove: z.int() }),
  }),
  papers: defineEndpoint('papers', 'get', '/api/teams/{team}/papers', {
    group: 'Papers',
    summary: 'Measured thicknesses of papers, newest first',
    access: teamMay('sets:read'),
    params: inTeam,
    query: z.strictObject({ ...pagingShape, stock: z.string().max(limits.name).optional() }),
    answer: pageOf(paperShape),
  }),
  addPaper: defineEndpoint('addPaper', 'post', '/api/teams/{team}/papers', {
    group: 'Papers',
    summary: 'Record readings of a paper’s thickness, five or more across a sheet',
    access: teamMay('papers:edit'),
    params: inTeam,
    body: z.strictObject({
      stock: words.name,
      method: z.enum(['single-sheet', 'stack-of-ten']),
      readings: z.array(z.number().positive().max(50)).min(1).max(limits.paperReadings),
      note: words.note.default(''),
    }),
    answer: paperShape,
  }),
  removePaper: defineEndpoint('removePaper', 'delete', '/api/teams/{team}/papers/{paper}', {
    group: 'Papers',
    summary: 'Remove readings',
    access: teamMay('papers:edit'),
    params: inTeam.extend({ paper: words.id }),
  }),
  deadJobs: defineEndpoint('deadJobs', 'get', '/api/teams/{team}/failed-work', {
    group: 'Upkeep',
    summary: 'Work that failed for good: mails, exports, comparisons',
    access: teamMay('team:manage'),
    params: inTeam,
    answer: z.strictObject({ items: z.array(jobShape) }),
  }),
  retryJob: defineEndpoint('retryJob', 'post', '/api/teams/{team}/failed-work/{job}', {
    group: 'Upkeep',
    summary: 'Try failed work again',
    access: teamMay('team:manage'),
    params: inTeam.extend({ job: words.id }),
    statuses: [204],
  }),
  live: defineEndpoint('live', 'get', '/api/health/live', {
    group: 'Health',
    summary: 'The process answers',
    access: anyone,
    answer: z.strictObject({ status: z.literal('live'), engine: z.string() }),
  }),
  ready: defineEndpoint('ready', 'get', '/api/health/ready', {
    group: 'Health',
    summary: 'The database answers and its tables are up to date; else 503',
    access: anyone,
    answer: z.strictObject({ status: z.literal('ready') }),
  }),
  openApi: defineEndpoint('openApi', 'get', '/api/openapi.json', {
    group: 'Health',
    summary: 'This document',
    access: anyone,
    answer: z.looseObject({ openapi: z.string() }),
  }),
} as const
