import { z } from 'zod'
import { limits } from '../limits.ts'
import { roles } from '../permissions.ts'

/** Small shapes that many contracts are made of. */
export const words = {
  id: z.uuid(),
  slug: z.string().regex(/^[a-z0-9](?:[a-z0-9-]{0,58}[a-z0-9])?$/, 'small letters, digits and dashes, up to 60'),
  setName: z.string().min(1).max(limits.name),
  number: z.coerce.number().int().min(1).max(2_147_483_647),
  name: z.string().trim().min(1).max(limits.name),
  title: z.string().max(limits.title),
  email: z.string().trim().toLowerCase().max(limits.email).pipe(z.email()),
  password: z.string().min(limits.password.min).max(limits.password.max),
  secret: z.string().min(20).max(100),
  note: z.string().trim().max(limits.note),
  reason: z.string().trim().min(1).max(limits.reason),
  branch: z.string().min(1).max(limits.branch),
  commit: z.string().regex(/^[0-9a-f]{7,64}$/, 'a commit in hexadecimal'),
  day: z.iso.date(),
  moment: z.iso.datetime(),
  digest: z.string().regex(/^sha256:[0-9a-f]{64}$/),
  role: z.enum(roles),
  verdict: z.enum(['pass', 'warn', 'fail', 'invalid']),
  status: z.enum(['pass', 'info', 'warn', 'fail', 'waived', 'unchecked', 'crashed']),
  axis: z.enum(['length', 'width', 'depth', 'headspace', 'overlap']),
  share: z.number().min(0).max(1),
  tag: z.string().trim().min(1).max(limits.tag),
  link: z.url({ protocol: /^https?$/ }).max(limits.link),
} as const

/** A person as others of the team see them; null where they are gone. */
export const personShape = z.strictObject({ id: words.id, name: words.name }).meta({ id: 'Person' })

/** Whoever did something: a person, or a robot by its token's name. Readable after they are gone. */
export const actorShape = z
  .strictObject({ kind: z.enum(['person', 'robot', 'tester', 'system']), name: z.string() })
  .meta({ id: 'Actor' })
