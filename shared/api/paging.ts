import { z } from 'zod'
import { limits } from './limits.ts'

/** Where a page of a list begins: what the answer before it gave as `next`, opaque to callers. */
export const pagingShape = {
  cursor: z.string().max(300).optional().describe('`next` of the page before; absent for the first page'),
  limit: z.coerce.number().int().min(1).max(limits.page.max).default(limits.page.usual),
}

/** A page of a list ordered by a key; `next` is null on the last one. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.strictObject({ items: z.array(item), next: z.string().nullable() })

export interface Page<T> {
  readonly items: readonly T[]
  readonly next: string | null
}
