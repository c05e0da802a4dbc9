import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  add,
  constant,
  dimension,
  multiply,
  scale,
  shift,
  source,
  subtract,
  withScaledHalfWidths,
} from '../../../shared/uncertainty/arithmetic.ts'
import type { Dimension } from '../../../shared/uncertainty/dimension.ts'
import { distributionOf } from '../../../shared/uncertainty/distribution.ts'
import { jointProbability } from '../../../shared/uncertainty/joint.ts'
import { shares, sigma, worstCase } from '../../../shared/uncertainty/moments.ts'
import { normalCumulative, normalQuantile } from '../../../shared/uncertainty/normal.ts'
import { normalFrom, seededRandom } from '../../support/random.ts'
import { exactBelow } from './exact-below.ts'

const uniform = (widths: readonly number[], nominal = 0): Dimension =>
  dimension(
    nominal,
    widths.map((width, index) => source(`s${String(index)}`, 1, width)),
  )

describe('shares of builds against exact sums of uniforms', () => {
  it('agree within 1e-4 everywhere, and in fact within 1e-6', () => {
    let worst = 0
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 1, max: 400 }), { minLength: 1, maxLength: 8 }),
        fc.integer({ min: -1200, max: 1200 }),
        (widths, x) => {
          const mine = distributionOf(uniform(widths)).below(x)
          worst = Math.max(worst, Math.abs(mine - exactBelow(widths, x)))
          return Math.abs(mine - exactBelow(widths, x)) < 1e-4
        },
      ),
      { numRuns: 600, seed: 11 },
    )
    expect(worst).toBeLessThan(1e-6)
  })

  it('also where one source dwarfs the others', () => {
    for (const x of [0, 250, 490, 499, 500, 501]) {
      expect(Math.abs(distributionOf(uniform([500, 1, 2, 1])).below(x) - exactBelow([500, 1, 2, 1], x))).toBeLessThan(
        1e-4,
      )
    }
  })

  it('a triangular source is two uniforms of half its width', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.05, max: 2, noNaN: true }),
        fc.double({ min: 0.05, max: 2, noNaN: true }),
        fc.double({ min: -3, max: 3, noNaN: true }),
        (a, b, x) => {
          const triangle = dimension(0, [source('t', 1, a, 'triangular'), source('u', 1, b)])
          return (
            Math.abs(distributionOf(triangle).below(x) - distributionOf(uniform([a / 2, a / 2, b])).below(x)) < 2e-5
          )
        },
      ),
    )
  })

  it('is certain outside the worst case and never leaves 0..1 inside', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0.001, max: 3, noNaN: true }), { minLength: 1, maxLength: 6 }),
        fc.double({ min: -20, max: 20, noNaN: true }),
        (widths, x) => {
          const d = uniform(widths, 1)
          const { min, max } = worstCase(d)
          const below = distributionOf(d).below(x)
          if (x <= min) expect(below).toBe(0)
          else if (x > max) expect(below).toBe(1)
          else expect(below >= 0 && below <= 1).toBe(true)
        },
      ),
    )
  })

  it('rises with the limit, and quantiles give it back', () => {
    const d = uniform([0.35, 0.25, 0.25, 0.08], 1.2)
    const values = Array.from({ length: 40 }, (_, index) => distributionOf(d).below(0.2 + index * 0.05))
    expect(values).toEqual([...values].sort((a, b) => a - b))
    for (const share of [0.05, 0.15, 0.5, 0.95])
      expect(distributionOf(d).below(distributionOf(d).quantile(share))).toBeCloseTo(share, 5)
  })
})

describe('a million builds drawn at random', () => {
  const draws = 1_000_000
  const within = (share: number, exact: number): void => {
    expect(Math.abs(share - exact)).toBeLessThanOrEqual(4 * Math.sqrt((exact * (1 - exact)) / draws))
  }

  it('bind as often as reckoned, within four standard errors', () => {
    const d = dimension(0.5, [
      source('a', 1, 0.35),
      source('b', -1, 0.25),
      source('c', 2, 0.1, 'triangular'),
      source('d', 1, 0.3, 'normal'),
    ])
    const random = seededRandom(20261201)
    let below = 0
    for (let draw = 0; draw < draws; draw += 1) {
      const value =
        0.5 +
        (2 * random() - 1) * 0.35 -
        (2 * random() - 1) * 0.25 +
        2 * (random() + random() - 1) * 0.1 +
        normalFrom(random) * 0.1
      if (value < 0) below += 1
    }
    within(below / draws, distributionOf(d).below(0))
  })

  it('close together as often as reckoned where axes share sources', () => {
    const shared = source('caliper', -2, 0.1)
    const conditions = [
      { dimension: dimension(0.5, [shared, source('cut x', 1, 0.4), source('score', -1, 0.2)]), atLeast: 0 },
      { dimension: dimension(0.4, [shared, source('cut y', 1, 0.4), source('score', -1, 0.2)]), atLeast: 0 },
      { dimension: dimension(0.6, [source('score', 1, 0.2), source('loft', 3, 0.3)]), atLeast: 0 },
    ]
    const random = seededRandom(7)
    const even = (half: number): number => (2 * random() - 1) * half
    let closes = 0
    for (let draw = 0; draw < draws; draw += 1) {
      const caliper = -2 * even(0.1)
      const score = even(0.2)
      if (
        0.5 + caliper + even(0.4) - score >= 0 &&
        0.4 + caliper + even(0.4) - score >= 0 &&
        0.6 + score + 3 * even(0.3) >= 0
      )
        closes += 1
    }
    // The integration over what is shared is good to a thousandth.
    expect(Math.abs(closes / draws - jointProbability(conditions))).toBeLessThan(1e-3 + 4 * Math.sqrt(0.25 / draws))
  })
})

describe('joint shares', () => {
  it('of independent axes multiply', () => {
    const one = { dimension: uniform([1, 0.5], 0.9), atLeast: 0 }
    const other = { dimension: dimension(0.9, [source('x', 1, 1), source('y', 1, 0.5)]), atLeast: 0 }
    const single = jointProbability([one])
    expect(jointProbability([one, other])).toBeCloseTo(single * single, 3)
  })

  it('of one thing asked twice are its own', () => {
    const one = { dimension: uniform([1, 0.5, 0.2], 0.9), atLeast: 0 }
    expect(jointProbability([one, one])).toBeCloseTo(jointProbability([one]), 2)
  })

  it('lie between what the worst axis allows and what all failures add up to, and order changes nothing', () => {
    const half: Readonly<Record<string, number>> = {
      caliper: 0.1,
      'cut x': 0.35,
      'cut y': 0.35,
      score: 0.25,
      loft: 0.3,
    }
    const axis = fc.record({
      nominal: fc.double({ min: -0.3, max: 1.5, noNaN: true }),
      entries: fc.uniqueArray(fc.tuple(fc.constantFrom(...Object.keys(half)), fc.constantFrom(-2, -1, 1, 2)), {
        minLength: 1,
        maxLength: 4,
        selector: ([name]) => name,
      }),
    })
    fc.assert(
      fc.property(fc.array(axis, { minLength: 2, maxLength: 4 }), (axes) => {
        const conditions = axes.map(({ nominal, entries }) => ({
          dimension: dimension(
            nominal,
            entries.map(([name, coefficient]) => source(name, coefficient, half[name] ?? 0)),
          ),
          atLeast: 0,
        }))
        const fails = conditions.map((condition) => distributionOf(condition.dimension).below(0))
        const joint = jointProbability(conditions)
        expect(joint).toBeLessThanOrEqual(1 - Math.max(...fails) + 1e-9)
        expect(joint).toBeGreaterThanOrEqual(Math.max(0, 1 - fails.reduce((sum, each) => sum + each, 0)) - 1e-9)
        expect(jointProbability([...conditions].reverse())).toBeCloseTo(joint, 9)
      }),
      { numRuns: 200 },
    )
  })
})

describe('dimensions', () => {
  const part = fc.record({
    nominal: fc.double({ min: -50, max: 50, noNaN: true }),
    entries: fc.array(fc.tuple(fc.constantFrom('a', 'b', 'c', 'd'), fc.double({ min: -3, max: 3, noNaN: true })), {
      maxLength: 5,
    }),
  })
  const halfWidths: Readonly<Record<string, number>> = { a: 0.1, b: 0.25, c: 0.35, d: 0 }
  const dimensionFrom = ({
    nominal,
    entries,
  }: {
    nominal: number
    entries: readonly (readonly [string, number])[]
  }): Dimension =>
    dimension(
      nominal,
      entries.map(([name, coefficient]) => source(name, coefficient, halfWidths[name] ?? 0)),
    )

  it('sum in any order', () => {
    fc.assert(
      fc.property(fc.array(part, { minLength: 2, maxLength: 5 }), (parts) => {
        const all = parts.map(dimensionFrom)
        const [one, other] = [add(...all), add(...[...all].reverse())]
        expect(one.nominal).toBeCloseTo(other.nominal, 9)
        expect(sigma(one)).toBeCloseTo(sigma(other), 9)
      }),
    )
  })

  it('cancel what they share', () => {
    fc.assert(
      fc.property(part, (each) => {
        const d = dimensionFrom(each)
        const nothing = subtract(d, d)
        expect(nothing.nominal).toBeCloseTo(0, 12)
        expect(nothing.sources).toEqual([])
      }),
    )
  })

  it('scale and shift as numbers do', () => {
    const d = dimension(3, [source('a', 1, 0.2)])
    expect(worstCase(shift(scale(d, -2), 1))).toEqual({ min: -5.4, max: -4.6 })
    expect(multiply(constant(4), d)).toEqual({ nominal: 12, sources: [source('a', 4, 0.2)] })
    expect(sigma(withScaledHalfWidths(d, 1.4, (name) => name === 'a'))).toBeCloseTo((0.28 * 1) / Math.sqrt(3), 12)
  })

  it('say which source spreads them most', () => {
    const list = shares(dimension(0, [source('small', 1, 0.1), source('large', 1, 0.4), source('mark', 5, 0)]))
    expect(list.map((entry) => entry.name)).toEqual(['large', 'small'])
    expect(list.reduce((sum, entry) => sum + entry.share, 0)).toBeCloseTo(1, 12)
  })

  it('refuse one name with two half-widths', () => {
    expect(() => add(dimension(0, [source('a', 1, 0.1)]), dimension(0, [source('a', 1, 0.2)]))).toThrow(
      /source a is given as uniform ±0.1 and as uniform ±0.2/,
    )
  })
})

describe('the normal distribution', () => {
  // Double-precision figures of the standard normal distribution, as any table gives them to fewer places.
  it.each([
    [1, 0.841344746],
    [1.645, 0.950015094],
    [1.96, 0.975002105],
    [2, 0.977249868],
    [2.326, 0.989990725],
    [3, 0.998650102],
  ])('Φ(%d) = %d', (z, value) => {
    expect(normalCumulative(z)).toBeCloseTo(value, 9)
    expect(normalCumulative(-z)).toBeCloseTo(1 - value, 9)
    expect(normalQuantile(normalCumulative(z))).toBeCloseTo(z, 9)
  })

  it('agrees with a published stack of four tolerances', () => {
    // Worked example of an engineering text: 4.020 ± 0.005 less 2.000 ± 0.005, 1.500 ± 0.003 and 0.500 ± 0.002.
    const gap = dimension(0.02, [
      source('housing', 1, 0.005),
      source('a', -1, 0.005),
      source('b', -1, 0.003),
      source('c', -1, 0.002),
    ])
    expect(worstCase(gap)).toEqual({
      min: expect.closeTo(0.005, 12) as number,
      max: expect.closeTo(0.035, 12) as number,
    })
    expect(sigma(gap) * Math.sqrt(3)).toBeCloseTo(0.007937, 6)
  })
})
