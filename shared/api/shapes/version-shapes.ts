import { z } from 'zod'
import { reportShape } from '../../report/report-shape.ts'
import type { Report } from '../../report/report.ts'
import type { Comparison } from '../../compare/comparison.ts'
import { actorShape, words } from './words.ts'

/** Why a version is compared with another: recorded when it was chosen. */
export const baselineReasons = [
  'pinned',
  'published',
  'merge-base',
  'ancestor',
  'main-branch',
  'same-branch',
  'none',
] as const

export const baselineShape = z
  .strictObject({
    number: z.int().nullable(),
    reason: z.enum(baselineReasons),
    sentence: z.string().describe('the reason in words, with the version'),
    chosenBy: actorShape.nullable().describe('who pinned it; null where the rules chose'),
  })
  .meta({ id: 'Baseline' })

/** How a version stands against its baseline. */
export const changeShape = z
  .strictObject({
    state: z.enum(['pending', 'first', 'same', 'changed', 'better', 'worse', 'incomparable']),
    sentence: z.string(),
    newlyFailing: z.int(),
    nowPassing: z.int(),
  })
  .meta({ id: 'Change' })

export const countsShape = z.strictObject({
  pass: z.int(),
  info: z.int(),
  warn: z.int(),
  fail: z.int(),
  waived: z.int(),
  unchecked: z.int(),
  crashed: z.int(),
})

export const reviewStates = ['none', 'asked', 'approved', 'changes-asked', 'stale'] as const

export const versionRowShape = z
  .strictObject({
    number: z.int(),
    branch: words.branch,
    commit: z.string().nullable(),
    link: z.string().nullable().describe('pipeline that pushed it'),
    verdict: words.verdict,
    works: words.share,
    counts: countsShape,
    engine: z.string(),
    isOldEngine: z.boolean(),
    digest: words.digest,
    content: words.digest.describe('what an approval binds to: text, tokens and engine, not the day'),
    asOf: words.day,
    pushedAt: words.moment,
    pushedBy: actorShape,
    baseline: baselineShape,
    change: changeShape,
    review: z.enum(reviewStates),
    label: z.string().nullable().describe('what it is published as'),
    isRecalled: z.boolean(),
    isLocked: z.boolean().describe('kept by retention: published, reviewed or a baseline'),
  })
  .meta({ id: 'VersionRow' })

/** The report's own schema is looser (additions are permitted); as a type it is what the engine writes. */
export const reportAnswerShape = z
  .custom<Report>((value) => reportShape.safeParse(value).success)
  .meta({
    id: 'Report',
    override: { type: 'object', description: 'A report; schema: `foldgauge schema report`' },
  })

const comparisonKeys = ['format', 'before', 'after', 'isComparable', 'sentence', 'counts', 'changes'] as const

export const comparisonAnswerShape = z
  .custom<Comparison>((value) => {
    if (typeof value !== 'object' || value === null) return false
    return comparisonKeys.every((key) => key in value)
  })
  .meta({ id: 'Comparison', override: { type: 'object', description: 'What the shared comparison says' } })

export const commentShape = z
  .strictObject({
    id: words.id,
    by: actorShape,
    isMine: z.boolean(),
    anchor: z.strictObject({ kind: z.enum(['version', 'fit', 'piece']), name: z.string().nullable() }),
    body: z.string(),
    version: z.int(),
    createdAt: words.moment,
    resolvedAt: words.moment.nullable(),
    resolvedBy: z.string().nullable(),
  })
  .meta({ id: 'Comment' })
