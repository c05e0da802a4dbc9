import { z } from 'zod'
import { byLink, defineEndpoint, signedIn, teamMay } from './define-endpoint.ts'
import { bodyLimits, limits } from './limits.ts'
import { pageOf, pagingShape } from './paging.ts'
import {
  buildFormShape,
  buildReportShape,
  buildShape,
  dimensionStudyShape,
  fitStudyShape,
  photoShape,
} from './shapes/build-shapes.ts'
import { words } from './shapes/words.ts'
import { versionPath } from './version-endpoints.ts'

const group = 'Test builds'

const inviteShape = z
  .strictObject({
    id: words.id,
    email: z.string(),
    name: z.string(),
    stamp: z.string(),
    version: z.int(),
    state: z.enum(['sent', 'opened', 'draft', 'submitted', 'revoked', 'expired']),
    dueOn: words.day.nullable(),
    expiresAt: words.moment,
    invitedBy: z.string(),
    invitedAt: words.moment,
  })
  .meta({ id: 'BuildInvitation' })

const importShape = z.strictObject({
  separator: z.enum([',', ';', '\t']),
  decimal: z.enum(['.', ',']),
  units: z.enum(['mm', 'in']),
  rows: z.int(),
  builds: z.int(),
  preview: z
    .array(
      z.strictObject({ line: z.int(), tester: z.string(), key: z.string(), written: z.string(), read: z.string() }),
    )
    .describe('how the first readings were understood: “12,5” as “12.5 mm”'),
  problems: z.array(z.strictObject({ line: z.int(), column: z.string(), message: z.string() })),
  isStored: z.boolean(),
})

const keyPath = z.strictObject({
  key: z.string().min(20).max(100).describe('secret of the link, or id of an invitation to the own address'),
})
const photoTypes = ['image/jpeg', 'image/png', 'image/webp', 'image/heic', 'image/avif']
const photoQuery = z.strictObject({
  alt: z.string().max(limits.title).default(''),
  mayBePublished: z.enum(['true', 'false']).default('false'),
})
const size = z.strictObject({ size: z.enum(['full', 'thumbnail']).default('full') })

/** Test builds: invitations, the tester's form, imports, and predicted against measured. */
export const buildEndpoints = {
  inviteTester: defineEndpoint(
    'inviteTester',
    'post',
    '/api/teams/{team}/sets/{set}/versions/{number}/build-invitations',
    {
      group,
      summary: 'Invite somebody by mail to build a version; no account is needed',
      access: teamMay('builds:invite'),
      params: versionPath,
      body: z.strictObject({
        email: words.email,
        name: words.name,
        note: words.note.default(''),
        dueOn: words.day.nullable().default(null),
        days: z.int().min(1).max(120).default(30),
      }),
      answer: inviteShape,
    },
  ),
  buildInvitations: defineEndpoint(
    'buildInvitations',
    'get',
    '/api/teams/{team}/sets/{set}/versions/{number}/build-invitations',
    {
      group,
      summary: 'Who was invited to build a version, and how far they are',
      access: teamMay('builds:read'),
      params: versionPath,
      answer: z.strictObject({ items: z.array(inviteShape) }),
    },
  ),
  revokeBuildInvitation: defineEndpoint(
    'revokeBuildInvitation',
    'delete',
    '/api/teams/{team}/build-invitations/{invitation}',
    {
      group,
      summary: 'End a link; what was sent in stays',
      access: teamMay('builds:invite'),
      params: z.strictObject({ team: words.slug, invitation: words.id }),
    },
  ),
  builds: defineEndpoint('builds', 'get', '/api/teams/{team}/sets/{set}/versions/{number}/builds', {
    group,
    summary: 'Builds of a version, newest first',
    access: teamMay('builds:read'),
    params: versionPath,
    query: z.strictObject(pagingShape),
    answer: pageOf(buildShape),
  }),
  ownBuild: defineEndpoint('ownBuild', 'post', '/api/teams/{team}/sets/{set}/versions/{number}/builds', {
    group,
    summary: 'A member reports a build of their own',
    access: teamMay('builds:read'),
    params: versionPath,
    body: buildReportShape,
    answer: buildShape,
  }),
  buildsCsv: defineEndpoint('buildsCsv', 'get', '/api/teams/{team}/sets/{set}/versions/{number}/builds.csv', {
    group,
    summary: 'Every reading of a version as CSV, in the form that can be imported',
    access: teamMay('builds:read'),
    params: versionPath,
    answerKind: 'csv',
  }),
  buildsTemplate: defineEndpoint(
    'buildsTemplate',
    'get',
    '/api/teams/{team}/sets/{set}/versions/{number}/builds-template.csv',
    {
      group,
      summary: 'An empty sheet with the measures of a version filled in',
      access: teamMay('builds:read'),
      params: versionPath,
      query: z.strictObject({ units: z.enum(['mm', 'in']).default('mm') }),
      answerKind: 'csv',
    },
  ),
  importBuilds: defineEndpoint('importBuilds', 'post', '/api/teams/{team}/sets/{set}/versions/{number}/build-imports', {
    group,
    summary: 'Read a sheet of readings: a preview first, then all of it or nothing',
    access: teamMay('builds:read'),
    params: versionPath,
    query: z.strictObject({
      store: z.enum(['true', 'false']).default('false'),
      separator: z.enum(['comma', 'semicolon', 'tab']).optional(),
      decimal: z.enum(['point', 'comma']).optional(),
      units: z.enum(['mm', 'in']).optional(),
    }),
    bodyTypes: ['text/csv'],
    bodyLimit: bodyLimits.csv,
    answer: importShape,
    statuses: [200],
  }),
  study: defineEndpoint('study', 'get', '/api/teams/{team}/sets/{set}/versions/{number}/study', {
    group,
    summary: 'Predicted against measured, per dimension and fit',
    access: teamMay('builds:read'),
    params: versionPath,
    answer: z.strictObject({
      builds: z.int(),
      dimensions: z.array(dimensionStudyShape),
      fits: z.array(fitStudyShape),
      policy: z.string().describe('what is shown for how many builds, in words'),
    }),
  }),
  buildPhoto: defineEndpoint('buildPhoto', 'get', '/api/teams/{team}/photos/{photo}', {
    group,
    summary: 'A photograph of a build',
    access: teamMay('builds:read'),
    params: z.strictObject({ team: words.slug, photo: words.id }),
    query: size,
    answerKind: 'file',
  }),
  myBuilds: defineEndpoint('myBuilds', 'get', '/api/me/build-invitations', {
    group,
    summary: 'What the signed-in person is invited to build',
    access: signedIn,
    answer: z.strictObject({
      items: z.array(
        z.strictObject({
          key: words.id,
          team: z.string(),
          title: z.string(),
          stamp: z.string(),
          state: inviteShape.shape.state,
          dueOn: words.day.nullable(),
        }),
      ),
    }),
  }),
  buildForm: defineEndpoint('buildForm', 'get', '/api/test-builds/{key}', {
    group,
    summary: 'The tester’s form and what they have filled in so far',
    access: byLink,
    params: keyPath,
    answer: z.strictObject({
      form: buildFormShape,
      build: buildShape.nullable(),
      last: buildReportShape.pick({ sheet: true, printer: true, paper: true, tools: true, skill: true }).nullable(),
    }),
  }),
  saveBuild: defineEndpoint('saveBuild', 'put', '/api/test-builds/{key}', {
    group,
    summary: 'Keep a draft',
    access: byLink,
    params: keyPath,
    body: buildReportShape,
    answer: buildShape,
  }),
  submitBuild: defineEndpoint('submitBuild', 'post', '/api/test-builds/{key}/submission', {
    group,
    summary: 'Send the build in; it can be sent again until the team has decided',
    access: byLink,
    params: keyPath,
    body: buildReportShape,
    answer: buildShape,
    statuses: [200],
  }),
  addBuildPhoto: defineEndpoint('addBuildPhoto', 'post', '/api/test-builds/{key}/photos', {
    group,
    summary: 'Add a photograph; place and other metadata are removed',
    access: byLink,
    params: keyPath,
    query: photoQuery,
    bodyTypes: photoTypes,
    bodyLimit: bodyLimits.photo,
    answer: photoShape,
  }),
  removeBuildPhoto: defineEndpoint('removeBuildPhoto', 'delete', '/api/test-builds/{key}/photos/{photo}', {
    group,
    summary: 'Take a photograph back',
    access: byLink,
    params: keyPath.extend({ photo: words.id }),
  }),
  ownBuildPhoto: defineEndpoint('ownBuildPhoto', 'get', '/api/test-builds/{key}/photos/{photo}', {
    group,
    summary: 'The tester’s own photograph',
    access: byLink,
    params: keyPath.extend({ photo: words.id }),
    query: size,
    answerKind: 'file',
  }),
} as const
