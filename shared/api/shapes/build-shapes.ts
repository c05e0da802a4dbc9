import { z } from 'zod'
import { limits } from '../limits.ts'
import { words } from './words.ts'

const millimetres = z.number().positive().max(5_000)

export const feels = ['will-not-go', 'tight', 'good', 'loose', 'falls-off'] as const
export type Feel = (typeof feels)[number]

/** What a tester reports; lengths are millimetres. */
export const buildReportShape = z
  .strictObject({
    scaleBar: z
      .strictObject({ x: millimetres.nullable(), y: millimetres.nullable(), nominal: millimetres.default(100) })
      .describe('the measured scale bar along the page and across it'),
    sheet: z.string().max(limits.name).default(''),
    printer: z.string().max(limits.name).default(''),
    paper: z.strictObject({
      name: z.string().max(limits.name).default(''),
      grammage: z.number().positive().max(2_000).nullable().default(null),
      thickness: z.array(z.number().positive().max(10)).max(5).default([]),
    }),
    tools: z.string().max(limits.note).default(''),
    skill: z.enum(['first-time', 'some', 'experienced']).nullable().default(null),
    minutes: z.int().min(0).max(100_000).nullable().default(null),
    sheetsWasted: z.int().min(0).max(1_000).nullable().default(null),
    readings: z
      .array(
        z.strictObject({
          key: z.string().min(1).max(300).describe('key of the measure'),
          values: z.array(millimetres).min(1).max(limits.readingsPerDimension),
        }),
      )
      .max(limits.dimensionsPerBuild)
      .default([]),
    fits: z
      .array(z.strictObject({ fit: words.name, felt: z.enum(feels), note: z.string().max(limits.reason).default('') }))
      .max(limits.dimensionsPerBuild)
      .default([]),
    problems: z
      .array(
        z.strictObject({
          piece: z.string().max(limits.name),
          edge: z.string().max(limits.name).default(''),
          expected: z.string().max(limits.reason).default(''),
          got: z.string().max(limits.reason),
        }),
      )
      .max(limits.problemsPerBuild)
      .default([]),
    note: words.note.default(''),
  })
  .meta({ id: 'BuildReport' })

export type BuildReport = z.output<typeof buildReportShape>

export const photoShape = z
  .strictObject({
    id: words.id,
    alt: z.string(),
    mayBePublished: z.boolean(),
    width: z.int(),
    height: z.int(),
    path: z.string(),
    thumbnail: z.string(),
  })
  .meta({ id: 'Photo' })

export const buildShape = z
  .strictObject({
    id: words.id,
    stamp: z.string().describe('`v3-t2`: printed on the tester’s copy'),
    version: z.int(),
    tester: z.string(),
    source: z.enum(['tester', 'member', 'import']),
    state: z.enum(['draft', 'submitted']),
    report: buildReportShape,
    photos: z.array(photoShape),
    startedAt: words.moment,
    submittedAt: words.moment.nullable(),
  })
  .meta({ id: 'Build' })

/** What the form asks for, from the version that was built. */
export const buildFormShape = z
  .strictObject({
    title: z.string(),
    set: words.setName,
    version: z.int(),
    stamp: z.string(),
    units: z.enum(['mm', 'in']),
    team: z.string(),
    note: z.string().describe('what the team asks for'),
    dueOn: words.day.nullable(),
    measure: z.array(
      z.strictObject({ key: z.string(), what: z.string(), value: z.number(), go: z.number(), noGo: z.number() }),
    ),
    fits: z.array(z.strictObject({ fit: z.string(), put: z.string(), to: z.string(), relation: z.string() })),
    pieces: z.array(z.string()),
    cautions: z.array(z.string()),
  })
  .meta({ id: 'BuildForm' })

export const dimensionStudyShape = z
  .strictObject({
    key: z.string(),
    what: z.string(),
    predicted: z.strictObject({ nominal: z.number(), sigma: z.number(), min: z.number(), max: z.number() }),
    points: z.array(z.strictObject({ build: z.string(), mean: z.number(), corrected: z.number() })),
    n: z.int(),
    mean: z.number().nullable(),
    bias: z.number().nullable().describe('mean of what was measured minus what was predicted'),
    interval: z.strictObject({ low: z.number(), high: z.number() }).nullable().describe('95 % of the mean, from three'),
    deviation: z.number().nullable().describe('from ten builds'),
    tolerance: z.strictObject({ low: z.number(), high: z.number() }).nullable().describe('95/95, from ten builds'),
    reading: z.enum(['too-few', 'agrees', 'biased']),
  })
  .meta({ id: 'DimensionStudy' })

export const fitStudyShape = z
  .strictObject({
    fit: z.string(),
    predicted: words.share,
    n: z.int(),
    went: z.int(),
    atLeast: words.share.nullable().describe('lower end of the 95 % interval of the share'),
    felt: z.strictObject(Object.fromEntries(feels.map((feel) => [feel, z.int()])) as Record<Feel, z.ZodInt>),
  })
  .meta({ id: 'FitStudy' })
