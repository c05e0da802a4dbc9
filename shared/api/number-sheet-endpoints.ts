import { z } from 'zod'
import { defineEndpoint, teamMay } from './define-endpoint.ts'
import { words } from './shapes/words.ts'
import { versionPath } from './version-endpoints.ts'

const group = 'Number sheet'

const measureShape = z
  .strictObject({
    key: z
      .string()
      .describe('`base/blank/length`, `lid-on-base/clearance/width` and the like; the same in every version'),
    piece: z.string().nullable(),
    fit: z.string().nullable(),
    what: z.string().describe('in the author’s nouns'),
    value: z.number().describe('millimetres'),
    marks: z.strictObject({ mm: z.string(), in: z.string() }).describe('as a maker finds it on a ruler'),
    from: z.string().describe('where it comes from'),
    sum: z.array(z.string()).describe('keys of the measures that must add up to it'),
    line: z.int().nullable(),
    state: z.enum(['open', 'ticked', 'queried', 'changed']).describe('changed: ticked before, another value now'),
    note: z.string(),
    by: z.string().nullable(),
    at: words.moment.nullable(),
    carriedFrom: z.int().nullable().describe('version the tick was made on, where it was carried over'),
  })
  .meta({ id: 'Measure' })

const sheetShape = z
  .strictObject({
    items: z.array(measureShape),
    ticked: z.int(),
    queried: z.int(),
    open: z.int(),
  })
  .meta({ id: 'NumberSheet' })

/** Every measure that will be published, for the editor to tick or query. */
export const numberSheetEndpoints = {
  numberSheet: defineEndpoint('numberSheet', 'get', '/api/teams/{team}/sets/{set}/versions/{number}/measures', {
    group,
    summary: 'The measures of a version with their ticks',
    access: teamMay('sets:read'),
    params: versionPath,
    answer: sheetShape,
  }),
  numberSheetCsv: defineEndpoint(
    'numberSheetCsv',
    'get',
    '/api/teams/{team}/sets/{set}/versions/{number}/measures.csv',
    {
      group,
      summary: 'The same as CSV',
      access: teamMay('sets:read'),
      params: versionPath,
      answerKind: 'csv',
    },
  ),
  tick: defineEndpoint('tick', 'put', '/api/teams/{team}/sets/{set}/versions/{number}/measures', {
    group,
    summary: 'Tick, query or open measures; several at once, all or none',
    access: teamMay('numbers:tick'),
    params: versionPath,
    body: z.strictObject({
      keys: z.array(z.string().min(1).max(300)).min(1).max(500),
      state: z.enum(['open', 'ticked', 'queried']),
      note: words.note.default(''),
    }),
    answer: sheetShape,
  }),
} as const
