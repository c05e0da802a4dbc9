import * as z from 'zod/mini'

/*
 * Building blocks of the shapes that a file's data is held against. At run time numbers arrive as the text they were
 * written as; the JSON Schema for editors, made from the same shapes, lets them be numbers. The `error` of a shape is
 * what it takes, in words: it completes "`wall` takes …".
 */

/** What an editor shows for a key. */
export interface Words {
  readonly title?: string
  readonly description: string
  readonly examples?: readonly unknown[]
  readonly default?: unknown
}

type Shape = z.core.$ZodType

function described<S extends Shape>(shape: S, words: Words, more: Readonly<Record<string, unknown>> = {}): S {
  z.globalRegistry.add(shape, { ...more, ...words } as z.core.GlobalMeta)
  return shape
}

/** Builds once, when first asked for: starting up costs only the shapes that a file uses. */
export function lazily<T extends object>(build: () => T): () => T {
  let built: T | null = null
  return () => (built ??= build())
}

const numberOrText = { type: ['string', 'number'] }

export const lengthShape = (words: Words) =>
  described(
    z.string('a length, such as `148`, `0.37 mm` or `8 1/4 in`'),
    { examples: [148, '0.37 mm', '8 1/4 in'], ...words },
    numberOrText,
  )

/** A length that `fit` leaves to sizing. */
export const lengthOrFitShape = (words: Words) =>
  described(
    z.string('a length, such as `20` or `3/4 in`, or `fit`'),
    { examples: [20, '3/4 in', 'fit'], ...words },
    numberOrText,
  )

export const tolerancedShape = (words: Words) =>
  described(
    z.string('a length that may carry a tolerance, such as `0.8 mm` or `0.37 mm ± 5 %`'),
    { examples: ['0.8 mm', '0.37 mm ± 5 %', '0.37 +0.03/-0.01 mm'], ...words },
    numberOrText,
  )

export const sizeShape = (words: Words) =>
  described(z.string('a size, such as `148 x 105 mm`, or the name of one'), {
    examples: ['148 x 105 mm', '9 x 7 3/4 in', 'iso-a6'],
    ...words,
  })

export const sizeOrFitShape = (words: Words) =>
  described(z.string('a size, such as `148 x 105 mm`, the name of one, or `fit`'), {
    examples: ['148 x 105 mm', 'iso-a6', 'fit'],
    ...words,
  })

/** A size that may have a third extent, and tolerances. */
export const spaceShape = (words: Words) =>
  described(z.string('a size, such as `152 x 120 x 38 mm`'), { examples: ['152 x 120 x 38 mm'], ...words })

export const rangeShape = (words: Words) =>
  described(z.string('a range, such as `0.2..3 mm`, `0.5.. mm` or `..3 mm`'), {
    examples: ['0.2..3 mm', '0.5.. mm', '1/8..1/2 in'],
    ...words,
  })

export const countShape = (words: Words, least: number, most: number) =>
  described(z.string(`a whole number from ${String(least)} to ${String(most)}`), words, {
    type: 'integer',
    minimum: least,
    maximum: most,
  })

export const angleShape = (words: Words) =>
  described(z.string('an angle in degrees, such as `90` or `5°`'), { examples: [90, '5°'], ...words }, numberOrText)

export const textShape = (words: Words) => described(z.string('a text'), words, numberOrText)

/** Name of something written elsewhere, such as a stock. */
export const nameShape = (of: string, words: Words) => described(z.string(`the name of ${of}`), words)

export const flagShape = (words: Words) => described(z.boolean('`true` or `false`'), words)

export function wordShape<const T extends readonly [string, ...string[]]>(options: T, words: Words) {
  return described(z.enum(options, `one of ${options.map((option) => `\`${option}\``).join(', ')}`), words)
}

/** A map with these keys and no others. */
export function mapShape<T extends z.core.$ZodShape>(keys: T, what: string, words: Words) {
  const shape = z.strictObject(keys, {
    // The keys there are travel in the message of an unknown one: they are offered to the author.
    error: (issue) => (issue.code === 'unrecognized_keys' ? Object.keys(keys).join(' ') : what),
  })
  return described(shape, words)
}

export const listShape = <S extends Shape>(item: S, what: string, words: Words) => described(z.array(item, what), words)

/** A list of exactly two. */
export const pairShape = <S extends Shape>(item: S, what: string, words: Words) =>
  described(z.tuple([item, item], what), words)

/** A map from names of the author's own choosing, which have this form. */
export const namedShape = <S extends Shape>(entry: S, pattern: string, words: Words) =>
  described(z.record(z.string(), entry), words, { propertyNames: { pattern } })

export const eitherShape = <const T extends readonly [Shape, ...Shape[]]>(options: T, what: string, words: Words) =>
  described(z.union(options, what), words)

/** A further option of a choice, built only where those before it do not fit. */
export const later = <S extends Shape>(build: () => S) => z.lazy(build)

export const optional = <S extends Shape>(shape: S) => z.optional(shape)
