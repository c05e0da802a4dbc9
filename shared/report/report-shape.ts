import { z } from 'zod'

const number = z.number()
const share = z.number().min(0).max(1)
const verdict = z.enum(['pass', 'warn', 'fail'])
const open = number.nullable()

const quantity = z
  .looseObject({
    nominal: number,
    min: number.describe('Worst-case low end'),
    max: number.describe('Worst-case high end'),
    sigma: number,
    sources: z.array(
      z.looseObject({ name: z.string(), effect: number, shape: z.enum(['uniform', 'triangular', 'normal']) }),
    ),
  })
  .describe('A quantity in millimetres; the effect of a source is its coefficient times its half-width, signed.')

const place = z.looseObject({
  file: z.string(),
  line: z.int().min(1),
  column: z.int().min(1),
  endLine: z.int().min(1),
  endColumn: z.int().min(1),
  path: z.array(z.union([z.string(), z.int()])),
})

const axis = z.looseObject({
  axis: z.enum(['length', 'width', 'depth', 'headspace', 'overlap']),
  clearance: quantity,
  perSide: number,
  required: z.looseObject({ min: open, max: open }),
  requirementFrom: z.string(),
  binds: share,
  rattles: share,
  sources: z.array(z.looseObject({ name: z.string(), share })),
  verdict,
})

const fit = z.looseObject({
  id: z.string(),
  relation: z.enum(['in', 'over', 'around']),
  put: z.string(),
  to: z.string(),
  holding: z.string().nullable(),
  count: z.int(),
  turned: z.boolean(),
  closes: share,
  dependsOnCare: z.boolean(),
  verdict,
  axes: z.array(axis),
  give: z.looseObject({ axis: z.string(), name: z.enum(['snug', 'push-on']), goesTo: number, bow: open }).nullable(),
  seat: z.looseObject({ z: number, exposed: number }).nullable(),
  scale: z.looseObject({ min: number, max: number }).nullable(),
  papers: z.array(z.looseObject({ stock: z.string(), verdict, closes: share })),
})

const judged = z.looseObject({
  rule: z.string(),
  subject: z.string(),
  fingerprint: z.string(),
  status: z.enum(['pass', 'info', 'warn', 'fail', 'waived', 'unchecked', 'crashed']),
  level: z.enum(['off', 'info', 'warn', 'fail']),
  measure: z
    .looseObject({ actual: number, limit: number, sense: z.enum(['at-least', 'at-most', 'equal']), unit: z.string() })
    .nullable(),
  message: z.string(),
  at: place,
  waiver: z.looseObject({ reason: z.string(), until: z.string() }).nullable(),
  fix: z
    .looseObject({ path: z.array(z.union([z.string(), z.int()])), from: z.string(), to: z.string(), note: z.string() })
    .nullable(),
})

const piece = z.looseObject({
  kind: z.string(),
  stock: z.string().nullable(),
  caliper: open,
  blank: z.looseObject({ length: number, width: number }).nullable(),
  inside: z.looseObject({ length: quantity, width: quantity }).nullable(),
  outside: z.looseObject({ length: quantity, width: quantity, height: quantity }).nullable(),
  make: z.int(),
  made: z.enum(['measured', 'printed']),
})

/** The report as a shape: every field that others may rely on; additions are permitted anywhere. */
export const reportShape = z
  .looseObject({
    format: z.literal('foldgauge-report/1'),
    engine: z.string(),
    rules: z.string(),
    asOf: z.iso.date(),
    file: z.string(),
    set: z.string(),
    title: z.string(),
    family: z.string().nullable(),
    units: z.enum(['mm', 'in']),
    digest: z.string().regex(/^sha256:[0-9a-f]{64}$/),
    workmanship: z.string(),
    paper: z.string().nullable(),
    scale: number,
    target: share,
    floor: share,
    inputs: z.looseObject({
      stocks: z.record(z.string(), z.looseObject({})),
      sizes: z.record(z.string(), z.looseObject({})),
      clearances: z.record(z.string(), z.looseObject({})),
      makers: z.record(z.string(), z.looseObject({})),
    }),
    errors: z.array(z.looseObject({ code: z.string(), message: z.string(), hint: z.string(), at: place })),
    pieces: z.record(z.string(), piece),
    fits: z.array(fit),
    verdicts: z.array(judged),
    summary: z.looseObject({
      pass: z.int(),
      info: z.int(),
      warn: z.int(),
      fail: z.int(),
      waived: z.int(),
      unchecked: z.int(),
      crashed: z.int(),
      works: share,
      verdict: z.enum(['pass', 'warn', 'fail', 'invalid']),
    }),
  })
  .describe('A Foldgauge report of one set. Lengths are millimetres, unrounded; an open end is null.')
