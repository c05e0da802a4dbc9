import { z } from 'zod'
import { defineEndpoint, teamMay } from './define-endpoint.ts'
import { bodyLimits, limits } from './limits.ts'
import { baselineShape, changeShape } from './shapes/version-shapes.ts'
import { words } from './shapes/words.ts'

const group = 'Push'

const pathShape = z
  .string()
  .min(1)
  .max(400)
  .refine((path) => !path.startsWith('/') && !path.split('/').includes('..'), 'a path inside the workspace')

export const pushBodyShape = z
  .strictObject({
    workspace: z
      .strictObject({ file: pathShape, text: z.string().max(limits.workspaceText) })
      .nullable()
      .describe('`foldgauge.yaml`; null for sets that stand alone'),
    sets: z
      .array(
        z.strictObject({
          file: pathShape,
          text: z.string().min(1).max(limits.setText),
          digest: words.digest.nullable().describe('what the sender’s engine said it judged'),
          verdict: words.verdict.nullable(),
        }),
      )
      .min(1)
      .max(limits.setsPerPush),
    engine: z.string().max(40).describe('version of the sender’s engine'),
    rules: z.string().max(20),
    judging: z
      .strictObject({
        asOf: words.day,
        workmanship: z.string().max(limits.name).nullable().default(null),
        paper: z.string().max(limits.name).nullable().default(null),
        scale: z.number().min(0.5).max(2).default(1),
      })
      .describe('how the sets are judged'),
    branch: words.branch.nullable().describe('git branch; null takes the team’s main branch'),
    commit: words.commit.nullable(),
    ancestors: z
      .array(words.commit)
      .max(limits.ancestors)
      .default([])
      .describe('commits before this one, nearest first'),
    mergeBase: words.commit.nullable().default(null).describe('where the branch left the main branch'),
    link: words.link.nullable().default(null).describe('pipeline or page this came from'),
  })
  .meta({ id: 'Push' })

export const pushedSetShape = z
  .strictObject({
    file: z.string(),
    set: words.setName,
    number: z.int(),
    isNew: z.boolean().describe('false where this very content was there already'),
    verdict: words.verdict,
    works: words.share,
    baseline: baselineShape,
    change: changeShape,
    differs: z
      .string()
      .nullable()
      .describe('where the server’s own check differs from the sender’s: what differs; both are kept'),
    page: z.string().describe('path of the version on the page'),
  })
  .meta({ id: 'PushedSet' })

const pushAnswerShape = z.strictObject({
  id: words.id,
  isNew: z.boolean(),
  branch: words.branch,
  sets: z.array(pushedSetShape),
  ripple: z
    .array(z.strictObject({ set: words.setName, number: z.int().nullable(), state: changeShape.shape.state }))
    .describe('other sets of the workspace that a changed token is judged again for'),
})

/** The one request that brings results. */
export const pushEndpoints = {
  push: defineEndpoint('push', 'post', '/api/teams/{team}/pushes', {
    group,
    summary: 'Store a push whole or not at all; the same content again answers 200 with what is there',
    access: teamMay('push', 'push'),
    params: z.strictObject({ team: words.slug }),
    body: pushBodyShape,
    bodyLimit: bodyLimits.push,
    answer: pushAnswerShape,
    statuses: [201, 200],
  }),
  pushState: defineEndpoint('pushState', 'get', '/api/teams/{team}/pushes/{push}', {
    group,
    summary: 'A push and how its sets stand against their baselines by now',
    access: teamMay('sets:read', 'read'),
    params: z.strictObject({ team: words.slug, push: words.id }),
    answer: pushAnswerShape,
  }),
} as const
