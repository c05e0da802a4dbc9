import type * as z from 'zod/mini'
import { mapShape, optional, type Words } from './shape-parts.ts'

type Shape = z.core.$ZodType

/** Keys with what builds the shape of each. */
export type KeyShapes = Readonly<Record<string, () => Shape>>

/**
 * A map whose keys are held against their shapes one by one: only the shapes of keys that are written get built, which
 * keeps starting up quick. The whole is built for the JSON Schema alone.
 */
export interface MapSpec<Needed extends KeyShapes, Further extends KeyShapes> {
  readonly needed: Needed
  readonly further: Further
  /** What the map is, in words. */
  readonly what: string
  readonly words: Words
}

/** What an author writes, as the spec has it. */
export type WrittenBy<M> =
  M extends MapSpec<infer Needed, infer Further>
    ? { readonly [K in keyof Needed]: z.output<ReturnType<Needed[K]>> } & {
        readonly [K in keyof Further]?: z.output<ReturnType<Further[K]>> | undefined
      }
    : never

export const mapSpec = <Needed extends KeyShapes, Further extends KeyShapes>(
  needed: Needed,
  further: Further,
  what: string,
  words: Words,
): MapSpec<Needed, Further> => ({ needed, further, what, words })

const built = new WeakMap<() => Shape, Shape>()

/** The shape a key's builder builds, built once. */
export function shapeBy<S extends Shape>(build: () => S): S {
  const known = built.get(build)
  if (known !== undefined) return known as S
  const shape = build()
  built.set(build, shape)
  return shape
}

/** The whole map as one shape. */
export function shapeOfMap(spec: MapSpec<KeyShapes, KeyShapes>): Shape {
  const keys: Record<string, Shape> = {}
  for (const [key, build] of Object.entries(spec.needed)) keys[key] = shapeBy(build)
  for (const [key, build] of Object.entries(spec.further)) keys[key] = optional(shapeBy(build))
  return mapShape(keys, spec.what, spec.words)
}
