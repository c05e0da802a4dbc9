import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dimension, shift, source } from '../../../shared/uncertainty/arithmetic.ts'
import type { Condition } from '../../../shared/uncertainty/condition.ts'
import type { Source } from '../../../shared/uncertainty/dimension.ts'
import { distributionOf } from '../../../shared/uncertainty/distribution.ts'
import { jointProbability } from '../../../shared/uncertainty/joint.ts'
import { normalFrom, seededRandom } from '../../support/random.ts'

const needs = (nominal: number, sources: readonly Source[], atLeast = 0): Condition => ({
  dimension: dimension(nominal, sources),
  atLeast,
})
const passing = ({ dimension: d, atLeast }: Condition): number => distributionOf(d).above(atLeast)

/** A set as sets are: an envelope in a box with a lid, both axes, headspace and band, sharing papers, scores and fence. */
function boxedSet(failing: number): readonly Condition[] {
  const cut = (piece: string, axis: string, by: number): Source => source(`cut(${piece}, ${axis})`, by, 0.35)
  const score = (piece: string, axis: string, n: number, by: number): Source =>
    source(`score(${piece}, ${axis}, ${String(n)})`, by, 0.25)
  const between = (piece: string, axis: string, by: number): readonly Source[] => [
    cut(piece, axis, by),
    score(piece, axis, 1, -by),
    score(piece, axis, 2, -by),
    source('fence', -2 * by, 0.25),
  ]
  const card = (by: number): Source => source('caliper(card)', by, 0.03)
  const text = (by: number): Source => source('caliper(text)', by, 0.013)
  const hinge = (by: number): Source => source('hinge90', by * 0.3, 0.25)
  const loft = (by: number): Source => source('loft', by, 0.25)
  const forms: Source[][] = ['length', 'width'].flatMap((axis, turn) => [
    [...between('envelope', axis, 1), text(-2), cut('note', axis, -1)],
    [...between('base', axis, 1), card(-1 - turn), hinge(-2), ...between('envelope', axis, -1)],
    [...between('lid', axis, 1), ...between('base', axis, -1), card(-2 - 2 * turn), source('tab(lid)', 2 * turn, 0.15)],
  ])
  forms.push(
    [score('base', 'length', 1, 1), source('fence', 1, 0.25), loft(-6), text(-12), source('compression', -7, 0.03)],
    [score('lid', 'length', 1, 1), source('fence', 1, 0.25), card(-2), loft(-3), source('humidity', 1, 0.4, 'normal')],
    [cut('band', 'length', 1), ...between('base', 'length', -2), ...between('base', 'width', -2), card(-6)],
    [source('sleeve', 1, 0.2, 'triangular'), source('fence', 1, 0.25), ...between('base', 'width', -1)],
  )
  return forms.map((sources) => {
    const centred = dimension(0, sources)
    return { dimension: shift(centred, -distributionOf(centred).quantile(failing)), atLeast: 0 }
  })
}

/** Share of builds drawn at random that meet all conditions. */
function drawn(conditions: readonly Condition[], draws: number, seed: number): number {
  const random = seededRandom(seed)
  const sources = new Map(conditions.flatMap((each) => each.dimension.sources.map((entry) => [entry.name, entry])))
  const places = new Map([...sources.keys()].map((name, index) => [name, index]))
  const forms = conditions.map(({ dimension: d, atLeast }) => ({
    margin: d.nominal - atLeast,
    terms: d.sources.map((entry) => [places.get(entry.name) ?? 0, entry.coefficient] as const),
  }))
  const list = [...sources.values()]
  const values = new Float64Array(list.length)
  const isMet = ({ margin, terms }: (typeof forms)[number]): boolean => {
    let sum = margin
    for (const [place, by] of terms) sum += by * (values[place] ?? 0)
    return sum >= 0
  }
  let met = 0
  for (let draw = 0; draw < draws; draw += 1) {
    for (let index = 0; index < list.length; index += 1) {
      const { shape, halfWidth } = list[index] ?? { shape: 'uniform', halfWidth: 0 }
      if (shape === 'uniform') values[index] = (2 * random() - 1) * halfWidth
      else if (shape === 'triangular') values[index] = (random() + random() - 1) * halfWidth
      else values[index] = (normalFrom(random) * halfWidth) / 3
    }
    if (forms.every(isMet)) met += 1
  }
  return met / draws
}

describe('joint shares of a whole set', () => {
  it.each([0.002, 0.02, 0.1])(
    'agree with a million builds drawn at random, each clearance failing in a share of %d',
    (failing) => {
      const draws = 1_000_000
      const conditions = boxedSet(failing)
      const joint = jointProbability(conditions)
      const error = Math.abs(joint - drawn(conditions, draws, 31))
      // A thousandth is the integration's, four standard errors are the drawing's.
      expect(error).toBeLessThan(1e-3 + 4 * Math.sqrt((joint * (1 - joint)) / draws))
    },
    20_000,
  )

  it('are the same every time and in any order', () => {
    const conditions = boxedSet(0.05)
    const joint = jointProbability(conditions)
    expect(jointProbability(conditions)).toBe(joint)
    expect(jointProbability(conditions.toReversed())).toBeCloseTo(joint, 9)
  })

  it('fall as a requirement grows', () => {
    const conditions = boxedSet(0.03)
    fc.assert(
      fc.property(
        fc.nat({ max: conditions.length - 1 }),
        fc.double({ min: 0, max: 0.8, noNaN: true }),
        fc.double({ min: 0.02, max: 0.8, noNaN: true }),
        (which, atLeast, more) => {
          const asking = (least: number): readonly Condition[] =>
            conditions.map((each, index) => (index === which ? { ...each, atLeast: least } : each))
          // Two integrations may each be off by a thousandth.
          expect(jointProbability(asking(atLeast + more))).toBeLessThanOrEqual(jointProbability(asking(atLeast)) + 2e-3)
        },
      ),
      { numRuns: 60 },
    )
  })
})

describe('joint shares known exactly', () => {
  const x = source('x', 1, 1)
  const y = source('y', 1, 1)
  const against = source('x', -1, 1)

  it('count the harder of two conditions that move as one', () => {
    const [easy, hard] = [needs(0.9, [x, y]), needs(1.6, [source('x', 2, 1), source('y', 2, 1)], 0.4)]
    expect(jointProbability([easy, hard])).toBe(Math.min(passing(easy), passing(hard)))
  })

  it('add the failures of two limits of one clearance', () => {
    const clearance = [x, source('y', 1, 0.4)]
    const opposite = clearance.map((entry) => ({ ...entry, coefficient: -entry.coefficient }))
    const [low, high] = [needs(1, clearance), needs(1.1, opposite)]
    expect(jointProbability([low, high])).toBeCloseTo(passing(low) + passing(high) - 1, 4)
  })

  it('are an area where two conditions share two sources', () => {
    // x + y ≥ −1 and x − y ≥ −1 on a square of side 2 cut off two right triangles of legs 1: 1 − 2·(1/2)/4.
    const joint = jointProbability([needs(1, [x, y]), needs(1, [x, source('y', -1, 1)])])
    expect(Math.abs(joint - 0.75)).toBeLessThan(1e-3)
  })

  it('are an interval where one source pulls two conditions apart', () => {
    // −0.5 ≤ x ≤ 0.6 of x between −1 and 1.
    expect(jointProbability([needs(0.5, [x]), needs(0.6, [against])])).toBeCloseTo(0.55, 4)
  })

  it('multiply where nothing is shared', () => {
    const other = [source('u', 1, 1), source('v', 1, 0.5)]
    const [a, b] = [needs(0.7, [x, y]), needs(0.6, other)]
    expect(jointProbability([a, b])).toBeCloseTo(passing(a) * passing(b), 4)
  })

  it('are nothing where one condition never holds and everything where all always do', () => {
    expect(jointProbability([needs(5, [x]), needs(-1.2, [y])])).toBe(0)
    expect(jointProbability([needs(1, [x]), needs(2, [y])])).toBe(1)
    expect(jointProbability([])).toBe(1)
  })

  it('ignore conditions that always hold', () => {
    const one = needs(0.3, [x, y])
    expect(jointProbability([one, needs(9, [x])])).toBe(passing(one))
  })
})
