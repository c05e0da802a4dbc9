import * as z from 'zod/mini'
import { mapShape, namedShape, optional, type Words } from '../pieces/shape/shape-parts.ts'
import { namePatternText } from './read-names.ts'

type Shape = z.core.$ZodType

export interface SchemaGroup {
  readonly entry: () => Shape
  readonly words: Words
}

/** A JSON Schema, draft 7. */
export type JsonSchema = Readonly<Record<string, unknown>>

/** Names of rules, which hold a slash. */
const rulePattern = '^[a-z-]+/[a-z-]+$'

/** The JSON Schema of one shape, for editors: what may be written, before defaults. */
export function schemaOf(shape: Shape): JsonSchema {
  const { $schema: _, ...schema } = z.toJSONSchema(shape, { target: 'draft-7', io: 'input' }) as JsonSchema
  return schema
}

/**
 * The JSON Schema of a file from the same shapes that it is read with.
 * @param required keys that must be written
 */
export function schemaOfFile(
  keys: Readonly<Record<string, () => Shape>>,
  groups: Readonly<Record<string, SchemaGroup>>,
  required: readonly string[],
  words: Words,
): JsonSchema {
  const shape: Record<string, Shape> = {}
  for (const [key, build] of Object.entries(keys)) shape[key] = required.includes(key) ? build() : optional(build())
  for (const [key, { entry, words: about }] of Object.entries(groups)) {
    shape[key] = optional(namedShape(entry(), key === 'checks' ? rulePattern : namePatternText, about))
  }
  return {
    $schema: 'http://json-schema.org/draft-07/schema#',
    ...schemaOf(mapShape(shape, 'a map of keys and values', words)),
  }
}
