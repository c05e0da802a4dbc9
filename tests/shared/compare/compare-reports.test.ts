import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { compareReports, hasRegression } from '../../../shared/compare/compare-reports.ts'
import { boxedNotes } from '../../support/boxed-notes.ts'
import { checkText } from '../../support/check-text.ts'

const usual = checkText(boxedNotes())
const variants = fc.record(
  {
    lidWall: fc.integer({ min: 11, max: 16 }),
    baseWall: fc.integer({ min: 18, max: 22 }),
    count: fc.integer({ min: 4, max: 9 }),
    caliper: fc.constantFrom(0.28, 0.32, 0.36),
    pocket: fc.constantFrom('156 x 112', '152 x 109', '150 x 107'),
  },
  { requiredKeys: [] },
)

describe('a comparison', () => {
  it('of a report with itself is empty', () => {
    fc.assert(
      fc.property(variants, (changes) => {
        const report = checkText(boxedNotes(changes))
        const comparison = compareReports(report, report)
        expect(comparison.isEmpty).toBe(true)
        expect(comparison.matings).toEqual([])
        expect(comparison.proposal.step).toBe('none')
        expect(hasRegression(comparison)).toBe(false)
      }),
      { numRuns: 12 },
    )
  })

  it('swapped is mirrored', () => {
    fc.assert(
      fc.property(variants, (changes) => {
        const other = checkText(boxedNotes(changes))
        const there = compareReports(usual, other)
        const back = compareReports(other, usual)
        const key = (change: { piece: string; what: string }): string => `${change.piece} ${change.what}`
        expect(back.dimensions.map(key).toSorted()).toEqual(there.dimensions.map(key).toSorted())
        for (const change of there.dimensions) {
          const mirrored = back.dimensions.find((candidate) => key(candidate) === key(change))
          expect(mirrored?.before).toBe(change.after)
          expect(mirrored?.delta ?? 0).toBeCloseTo(-(change.delta ?? 0), 9)
        }
        expect(back.changes.map((change) => [change.fingerprint, change.after, change.before]).toSorted()).toEqual(
          there.changes.map((change) => [change.fingerprint, change.before, change.after]).toSorted(),
        )
        expect(back.margins.length).toBe(there.margins.length)
        // The old lid on the new base is the same question asked from the other side.
        for (const mating of there.matings) {
          const mirrored = back.matings.find(
            (candidate) => candidate.fit === mating.fit && candidate.putFrom !== mating.putFrom,
          )
          expect(mirrored?.closes ?? 0).toBeCloseTo(mating.closes ?? 0, 6)
        }
      }),
      { numRuns: 12 },
    )
  })

  it('sees a renamed piece as one gone and one new', () => {
    const renamed = checkText(boxedNotes().replaceAll('band:', 'belt:').replace('put: band', 'put: belt'))
    const { dimensions, proposal } = compareReports(usual, renamed)
    expect(dimensions.filter((change) => change.piece === 'band').every((change) => change.after === null)).toBe(true)
    expect(dimensions.filter((change) => change.piece === 'belt').every((change) => change.before === null)).toBe(true)
    expect(proposal.step).toBe('major')
  })

  it('sees nothing in another order of pieces, fits and keys', () => {
    const lines = boxedNotes().split('\n')
    const at = (word: string): number => lines.findIndex((line) => line.startsWith(word))
    const block = (from: string, to: number): readonly string[] => lines.slice(at(from) + 1, to)
    const pieces = block('pieces:', at('fits:')).toReversed()
    const fits = block('fits:', lines.length - 1).toReversed()
    const reordered = [...lines.slice(0, at('pieces:') + 1), ...pieces, 'fits:', ...fits, ''].join('\n')
    expect(compareReports(usual, checkText(reordered)).isEmpty).toBe(true)
    expect(checkText(reordered).digest).toBe(usual.digest)
  })

  it('tells that a deepened score makes the lid bind, why, and that the new lid does not fit old boxes', () => {
    const deeper = checkText(boxedNotes({ lidWall: 15 }))
    const comparison = compareReports(usual, deeper)
    expect(hasRegression(comparison)).toBe(true)
    expect(comparison.sentence).toMatch(/newly fail|newly warn/)
    const flipped = comparison.changes.find((change) => change.subject === 'lid-on-base:width')
    expect(flipped?.isRegression).toBe(true)
    expect(flipped?.causes[0]).toContain('wall of lid +1 mm')
    expect(
      comparison.matings.find((mating) => mating.fit === 'lid-on-base' && mating.putFrom === 'after')?.verdict,
    ).not.toBe('pass')
    expect(
      comparison.matings.find((mating) => mating.fit === 'lid-on-base' && mating.putFrom === 'before')?.verdict,
    ).toBe('pass')
  })

  it('judges a crossing as the engine judges the same pieces in one set', () => {
    // Lid of one version, base of the other: the same set written out whole.
    const newBase = { base: '202 x 160', baseWall: 20 }
    const before = checkText(boxedNotes())
    const after = checkText(boxedNotes(newBase))
    const crossing = compareReports(before, after).matings.find(
      (mating) => mating.fit === 'lid-on-base' && mating.putFrom === 'before',
    )
    const whole = checkText(boxedNotes(newBase)).fits.find((fit) => fit.id === 'lid-on-base')
    expect(crossing?.closes).toBeCloseTo(1 - Math.max(...(whole?.axes ?? []).map((axis) => axis.binds)), 4)
  })

  it('does not compare what two engines said', () => {
    const comparison = compareReports({ ...usual, engine: '0.9.0' }, usual)
    expect(comparison.isComparable).toBe(false)
    expect(comparison.sentence).toContain('not comparable')
    expect(comparison.changes).toEqual([])
  })

  it('does not count a known failure, nor a waiver, as worse', () => {
    const failing = checkText(boxedNotes({ lidWall: 15 }))
    expect(hasRegression(compareReports(failing, failing))).toBe(false)
    const waived = checkText(
      `${boxedNotes({ lidWall: 15 })}waivers:\n  - { rule: fit/clearance, subject: lid-on-base, reason: "being redrawn", until: 2027-01-31 }\n`,
    )
    expect(
      compareReports(failing, waived).changes.find((change) => change.subject === 'lid-on-base:width')?.isRegression,
    ).toBe(false)
  })
})
