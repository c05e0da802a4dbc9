/** An exact fraction; the bottom is positive in every fraction that has a value. */
export interface Rational {
  readonly top: bigint
  readonly bottom: bigint
}

export const rational = (top: bigint, bottom: bigint): Rational => ({ top, bottom })

export const multiplied = (a: Rational, b: Rational): Rational => rational(a.top * b.top, a.bottom * b.bottom)

/** Whole number and fraction together: 8 and 1/4 are 33/4. */
export const mixed = (whole: bigint, part: Rational): Rational => rational(whole * part.bottom + part.top, part.bottom)

/** Integers below this are doubles exactly, and the quotient of two of them is rounded correctly. */
const exactDoubles = 2n ** 53n

const bits = (value: bigint): number => value.toString(16).length * 4

/**
 * The double nearest to a fraction that is not negative, ties to even.
 * The quotient is taken with more than 60 bits, a remainder marked in the last, so that it is rounded once only.
 */
export function nearestDouble({ top, bottom }: Rational): number {
  if (top < exactDoubles && bottom < exactDoubles) return Number(top) / Number(bottom)
  if (top === 0n) return 0
  const shift = 68 - bits(top) + bits(bottom)
  const scaledTop = shift > 0 ? top << BigInt(shift) : top
  const scaledBottom = shift < 0 ? bottom << BigInt(-shift) : bottom
  const quotient = scaledTop / scaledBottom
  const marked = scaledTop % scaledBottom === 0n ? quotient : quotient | 1n
  return Number(marked) * 2 ** -shift
}
