import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { apply, dimension, larger, smaller, source, subtract } from '../../../shared/uncertainty/arithmetic.ts'
import { distributionOf } from '../../../shared/uncertainty/distribution.ts'
import { coefficientOf, shares, sigma, variance, worstCase } from '../../../shared/uncertainty/moments.ts'

describe('the worst case', () => {
  it('contains every build', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.double({ min: -3, max: 3, noNaN: true }), fc.double({ min: 0, max: 2, noNaN: true })), {
          maxLength: 8,
        }),
        fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 8, maxLength: 8 }),
        (terms, places) => {
          const d = dimension(
            10,
            terms.map(([coefficient, halfWidth], index) => source(`s${String(index)}`, coefficient, halfWidth)),
          )
          const build = terms.reduce(
            (sum, [coefficient, halfWidth], index) => sum + coefficient * halfWidth * (places[index] ?? 0),
            10,
          )
          const { min, max } = worstCase(d)
          expect(build).toBeGreaterThanOrEqual(min - 1e-9)
          expect(build).toBeLessThanOrEqual(max + 1e-9)
        },
      ),
    )
  })

  it('counts normal sources to three sigma', () => {
    expect(worstCase(dimension(1, [source('n', 2, 0.3, 'normal')]))).toEqual({ min: 0.4, max: 1.6 })
  })
})

describe('spread', () => {
  it('of one caliper taken four times adds up, of four papers it does not', () => {
    const t = 0.03
    const same = dimension(0, [source('caliper', 4, t)])
    const four = dimension(
      0,
      [1, 2, 3, 4].map((n) => source(`caliper ${String(n)}`, 1, t)),
    )
    expect(sigma(same)).toBeCloseTo(0.069282, 6)
    expect(sigma(four)).toBeCloseTo(0.034641, 6)
  })

  it('is T/√3, T/√6 and T/3 for uniform, triangular and normal sources', () => {
    const of = (shape: 'uniform' | 'triangular' | 'normal'): number =>
      variance(dimension(0, [source('s', 1, 0.6, shape)]))
    expect([of('uniform'), of('triangular'), of('normal')].map((each) => each.toFixed(6))).toEqual([
      '0.120000',
      '0.060000',
      '0.040000',
    ])
  })

  it('of a published stack of three parts in a housing', () => {
    // Engineering text: A 2.000 ± 0.005, B 1.500 ± 0.003, C 0.500 ± 0.002 in 4.020 ± 0.005; root sum square by thirds.
    const part = (name: string, half: number): ReturnType<typeof source> => source(name, -1, half, 'normal')
    const parts = [part('A', 0.005), part('B', 0.003), part('C', 0.002)]
    const gap = dimension(4.02 - 4, [source('housing', 1, 0.005, 'normal'), ...parts])
    expect(gap.nominal).toBeCloseTo(0.02, 12)
    expect(worstCase(gap).min).toBeCloseTo(0.005, 12)
    expect(worstCase(gap).max).toBeCloseTo(0.035, 12)
    expect(3 * sigma(dimension(0, parts))).toBeCloseTo(0.00616, 5)
    expect(3 * sigma(gap)).toBeCloseTo(0.00794, 5)
    expect(distributionOf(gap).below(0.02 - 3 * sigma(gap))).toBeCloseTo(0.0013499, 7)
  })
})

describe('the larger and the smaller of two dimensions', () => {
  const small = dimension(1, [source('a', 1, 0.5)])
  const large = dimension(2, [source('b', 1, 0.1)])
  it('take the sources of the one chosen', () => {
    expect([larger(small, large), larger(large, small)]).toEqual([large, large])
    expect([smaller(small, large), smaller(large, small)]).toEqual([small, small])
  })
})

describe('a function of a dimension', () => {
  it('moves by its derivative', () => {
    const side = dimension(30, [source('cut', 1, 0.35), source('measure', 1, 0)])
    const squared = apply(side, 900, 60)
    expect(squared.nominal).toBe(900)
    expect(coefficientOf(squared, 'cut')).toBe(60)
    expect(coefficientOf(squared, 'measure')).toBe(60)
    expect(coefficientOf(squared, 'other')).toBe(0)
  })
})

describe('what cancels', () => {
  it('is gone, and the shares are of the rest', () => {
    const hinge = source('hinge', 0.6, 0.25)
    const clearance = subtract(
      dimension(151, [hinge, source('score lid', 1, 0.2)]),
      dimension(150, [hinge, source('score base', 1, 0.1)]),
    )
    expect(clearance.sources.map((entry) => entry.name)).toEqual(['score lid', 'score base'])
    expect(shares(clearance).map(({ name, share }) => [name, share.toFixed(2)])).toEqual([
      ['score lid', '0.80'],
      ['score base', '0.20'],
    ])
  })
})
