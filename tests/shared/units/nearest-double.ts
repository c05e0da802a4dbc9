/** A double as an exact fraction: its bits, read without any arithmetic of doubles. */
function exactly(value: number): readonly [bigint, bigint] {
  const bits = new BigUint64Array(new Float64Array([value]).buffer)[0] ?? 0n
  const exponent = Number((bits >> 52n) & 0x7ffn)
  const fraction = bits & 0xfffffffffffffn
  const significand = exponent === 0 ? fraction : fraction | (1n << 52n)
  const power = Math.max(exponent, 1) - 1075
  return power >= 0 ? [significand << BigInt(power), 1n] : [significand, 1n << BigInt(-power)]
}

const neighbour = (value: number, step: bigint): number => {
  const bits = new BigUint64Array(new Float64Array([value]).buffer)[0] ?? 0n
  return new Float64Array(new BigUint64Array([bits + step]).buffer)[0] ?? NaN
}

const absolute = (value: bigint): bigint => (value < 0n ? -value : value)

/** Whether no other double lies nearer to a positive fraction. */
export function isNearest(value: number, top: bigint, bottom: bigint): boolean {
  // Distances are compared over the common bottom of the two doubles.
  const distance = (candidate: number): readonly [bigint, bigint] => {
    const [a, b] = exactly(candidate)
    return [absolute(a * bottom - top * b), b * bottom]
  }
  const [own, ownBottom] = distance(value)
  return [neighbour(value, 1n), neighbour(value, -1n)].every((candidate) => {
    const [other, otherBottom] = distance(candidate)
    return own * otherBottom <= other * ownBottom
  })
}
