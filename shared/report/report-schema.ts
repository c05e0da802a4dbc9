import { z } from 'zod'
import { reportShape } from './report-shape.ts'

/** JSON Schema (draft-07) of what `check --report json` writes: one report, or an array of them. */
export function reportSchema(): object {
  const one = z.toJSONSchema(reportShape, { target: 'draft-7', io: 'input' })
  const { $schema, ...report } = one
  return {
    $schema,
    $id: 'foldgauge-report-1.json',
    title: 'Foldgauge report, format 1',
    definitions: { report },
    oneOf: [{ $ref: '#/definitions/report' }, { type: 'array', items: { $ref: '#/definitions/report' } }],
  }
}
