import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { constant, dimension, source } from '../../../shared/uncertainty/arithmetic.ts'
import type { Dimension } from '../../../shared/uncertainty/dimension.ts'
import { distributionOf } from '../../../shared/uncertainty/distribution.ts'
import { normalCumulative, normalDensity } from '../../../shared/uncertainty/normal.ts'
import { exactBelow } from './exact-below.ts'

const uniform = (widths: readonly number[], nominal = 0): Dimension =>
  dimension(
    nominal,
    widths.map((width, index) => source(`s${String(index)}`, 1, width)),
  )

/** Half-widths in whole units that lie up to seven powers of ten apart. */
const width = fc.double({ min: 0, max: 7, noNaN: true }).map((power) => Math.round(10 ** power))

describe('shares of builds where sources are very unequal', () => {
  it('agree with exact sums of up to eight uniforms within 1e-6', () => {
    fc.assert(
      fc.property(
        fc.array(width, { minLength: 1, maxLength: 8 }),
        fc.double({ min: -1, max: 1, noNaN: true }),
        (widths, place) => {
          const x = Math.round(place * widths.reduce((sum, each) => sum + each, 0))
          expect(Math.abs(distributionOf(uniform(widths)).below(x) - exactBelow(widths, x))).toBeLessThan(1e-6)
        },
      ),
      { numRuns: 1500, seed: 20261202 },
    )
  })

  it.each([
    [[1_000_000, 1], 999_999],
    [[1_000_000, 1, 1], 999_999],
    [[1_000_000, 1_000_000, 3, 1], 1_999_990],
    [[1_000_000, 40_000, 900, 30, 1], 999_000],
    [[20, 20, 20, 20, 20, 20, 20, 20], 90],
  ])('agree for half-widths %j near their worst case', (widths, x) => {
    expect(Math.abs(distributionOf(uniform(widths)).below(x) - exactBelow(widths, x))).toBeLessThan(1e-6)
    expect(Math.abs(distributionOf(uniform(widths)).below(-x) - exactBelow(widths, -x))).toBeLessThan(1e-6)
  })
})

describe('shares of builds with normal sources', () => {
  /** Uniform ±a plus a normal: the mean of Φ over the uniform, in closed form. */
  const exact = (a: number, sigma: number, x: number): number => {
    const integral = (z: number): number => z * normalCumulative(z) + normalDensity(z)
    return (sigma / (2 * a)) * (integral((x + a) / sigma) - integral((x - a) / sigma))
  }

  it('agree with the closed form of a uniform and a normal, whichever is wider', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -3, max: 1, noNaN: true }),
        fc.double({ min: -1.2, max: 1.2, noNaN: true }),
        (power, place) => {
          const halfWidth = 10 ** power
          const d = dimension(0, [source('u', 1, 1), source('n', -1, halfWidth, 'normal')])
          const x = place * (1 + halfWidth)
          expect(Math.abs(distributionOf(d).below(x) - exact(1, halfWidth / 3, x))).toBeLessThan(1e-6)
        },
      ),
      { numRuns: 500 },
    )
  })

  it('agree with three uniforms and a normal integrated step by step', () => {
    const widths = [50, 30, 20]
    const sigma = 12
    const d = dimension(0, [...uniform(widths).sources, source('n', 1, 3 * sigma, 'normal')])
    for (const x of [-110, -60, -13, 0, 41, 88]) {
      let sum = 0
      for (let step = -96; step <= 96; step += 1)
        sum += exactBelow(widths, x - step) * normalDensity(step / sigma) * (1 / sigma)
      expect(distributionOf(d).below(x)).toBeCloseTo(sum, 6)
    }
  })

  it('add up like one normal', () => {
    const d = dimension(1, [source('a', 1, 0.9, 'normal'), source('b', -2, 0.6, 'normal')])
    expect(distributionOf(d).below(0.2)).toBeCloseTo(normalCumulative(-0.8 / 0.5), 12)
  })
})

describe('limits met exactly', () => {
  it('are met by what does not vary, rounding or not', () => {
    const left = distributionOf(constant(0.6 - 0.2 - 0.4))
    expect(0.6 - 0.2 - 0.4).not.toBe(0)
    expect([left.below(0), left.above(0)]).toEqual([0, 0])
    expect([left.below(0.001), left.above(-0.001)]).toEqual([1, 1])
    expect(left.quantile(0.3)).toBeCloseTo(0, 12)
  })

  it('above and below share all builds where something varies', () => {
    const d = distributionOf(uniform([0.3, 0.1], 2))
    for (const x of [1.5, 1.7, 2, 2.39, 2.5]) expect(d.below(x) + d.above(x)).toBe(1)
  })

  it('a source of half-width zero changes nothing', () => {
    const marked = dimension(2, [source('measure', 5, 0), source('cut', 1, 0.3)])
    expect(distributionOf(marked).below(1.9)).toBe(distributionOf(uniform([0.3], 2)).below(1.9))
  })
})
