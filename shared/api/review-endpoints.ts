import { z } from 'zod'
import { defineEndpoint, teamMay } from './define-endpoint.ts'
import { limits } from './limits.ts'
import { setPath } from './set-endpoints.ts'
import { commentShape, reviewStates } from './shapes/version-shapes.ts'
import { actorShape, words } from './shapes/words.ts'
import { versionPath } from './version-endpoints.ts'

const group = 'Review'

const decisionShape = z
  .strictObject({
    id: words.id,
    by: actorShape,
    decision: z.enum(['approve', 'ask-changes']),
    note: z.string(),
    overrideReason: z.string().nullable().describe('why the own work was approved alone'),
    version: z.int().describe('the version it was given on'),
    content: words.digest,
    isStale: z.boolean().describe('given for an earlier text, other tokens or another engine'),
    decidedAt: words.moment,
  })
  .meta({ id: 'Decision' })

const reviewShape = z
  .strictObject({
    state: z.enum(reviewStates),
    asked: z.strictObject({ by: z.string(), note: z.string(), at: words.moment }).nullable(),
    decisions: z.array(decisionShape),
    comments: z.array(commentShape),
    unresolved: z.int(),
    canPublish: z.boolean(),
    whyNot: z.array(z.string()).describe('what stands between this version and publication'),
  })
  .meta({ id: 'Review' })

const anchorShape = z
  .strictObject({ kind: z.enum(['version', 'fit', 'piece']), name: z.string().max(limits.name).nullable() })
  .refine(({ kind, name }) => (kind === 'version') === (name === null), 'a fit or piece needs its name')

const failureShape = z
  .strictObject({
    id: words.id,
    fingerprint: z.string(),
    reason: z.string(),
    until: words.day.describe('holds through this day'),
    acceptedBy: z.string(),
    acceptedAt: words.moment,
    state: z.enum(['active', 'lapses-soon', 'lapsed', 'ended', 'mended']),
  })
  .meta({ id: 'KnownFailure' })

/** Review of versions, and failures that are known. */
export const reviewEndpoints = {
  review: defineEndpoint('review', 'get', '/api/teams/{team}/sets/{set}/versions/{number}/review', {
    group,
    summary: 'What was said and decided about a version, and what keeps it from publication',
    access: teamMay('sets:read'),
    params: versionPath,
    answer: reviewShape,
  }),
  askReview: defineEndpoint('askReview', 'post', '/api/teams/{team}/sets/{set}/versions/{number}/review', {
    group,
    summary: 'Put a version up for review',
    access: teamMay('review:ask'),
    params: versionPath,
    body: z.strictObject({ note: words.note }),
    answer: reviewShape,
  }),
  decide: defineEndpoint('decide', 'post', '/api/teams/{team}/sets/{set}/versions/{number}/decisions', {
    group,
    summary: 'Approve, or ask for changes',
    access: teamMay('review:decide'),
    params: versionPath,
    body: z.strictObject({
      decision: z.enum(['approve', 'ask-changes']),
      note: words.note.default(''),
      content: words.digest.describe('of the version as it was read; 409 where it is another'),
      overrideReason: words.reason.nullable().default(null),
    }),
    answer: reviewShape,
  }),
  comment: defineEndpoint('comment', 'post', '/api/teams/{team}/sets/{set}/versions/{number}/comments', {
    group,
    summary: 'Comment on a version, a fit or a piece',
    access: teamMay('review:comment'),
    params: versionPath,
    body: z.strictObject({ anchor: anchorShape, body: z.string().trim().min(1).max(limits.comment) }),
    answer: commentShape,
  }),
  resolveComment: defineEndpoint('resolveComment', 'patch', '/api/teams/{team}/comments/{comment}', {
    group,
    summary: 'Mark a comment resolved, or open it again',
    access: teamMay('review:comment'),
    params: z.strictObject({ team: words.slug, comment: words.id }),
    body: z.strictObject({ isResolved: z.boolean() }),
    answer: commentShape,
  }),
  knownFailures: defineEndpoint('knownFailures', 'get', '/api/teams/{team}/sets/{set}/known-failures', {
    group,
    summary: 'Failures that were accepted, lapsed ones too',
    access: teamMay('sets:read', 'read'),
    params: setPath,
    answer: z.strictObject({ items: z.array(failureShape) }),
  }),
  acceptFailure: defineEndpoint('acceptFailure', 'post', '/api/teams/{team}/sets/{set}/known-failures', {
    group,
    summary: 'Accept a failure until a day, with a reason',
    access: teamMay('failures:accept'),
    params: setPath,
    body: z.strictObject({ fingerprint: z.string().min(3).max(400), reason: words.reason, until: words.day }),
    answer: failureShape,
  }),
  endFailure: defineEndpoint('endFailure', 'delete', '/api/teams/{team}/sets/{set}/known-failures/{failure}', {
    group,
    summary: 'No longer accept it',
    access: teamMay('failures:accept'),
    params: setPath.extend({ failure: words.id }),
  }),
} as const
