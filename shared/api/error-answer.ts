import { z } from 'zod'

/** What every refusal answers with. */
export const errorAnswerShape = z
  .strictObject({
    error: z.strictObject({
      code: z.string().describe('stable kebab-case word'),
      message: z.string().describe('the fact'),
      hint: z.string().nullable().describe('what to do instead'),
      problems: z
        .array(z.strictObject({ path: z.string(), message: z.string(), line: z.int().nullable() }))
        .describe('what is wrong where, for bodies and files'),
      requestId: z.string(),
    }),
  })
  .meta({ id: 'Refusal' })

export type ErrorAnswer = z.output<typeof errorAnswerShape>
