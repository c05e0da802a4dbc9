/**
 * Generalised Irwin–Hall in exact integers: P(Σ U(−a,a) ≤ x) = Σ (−1)^|v| (x + Σa − 2v·a)₊ⁿ / (n! Π 2a).
 * Half-widths and x are whole numbers of some unit. Source: the textbook formula for sums of independent uniforms.
 */
export function exactBelow(widths: readonly number[], x: number): number {
  const n = BigInt(widths.length)
  let sum = 0n
  for (let subset = 0; subset < 2 ** widths.length; subset += 1) {
    let base = BigInt(x)
    let sign = 1n
    widths.forEach((width, index) => {
      const isTaken = (subset >> index) % 2 === 1
      base += BigInt(isTaken ? -width : width)
      if (isTaken) sign = -sign
    })
    if (base > 0n) sum += sign * base ** n
  }
  const factorial = widths.reduce((product, _width, index) => product * BigInt(index + 1), 1n)
  const below = factorial * widths.reduce((product, width) => product * BigInt(2 * width), 1n)
  return Number((sum * 10n ** 18n) / below) / 1e18
}
