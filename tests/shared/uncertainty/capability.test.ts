import { describe, expect, it } from 'vitest'
import {
  capabilityOf,
  cpInterval,
  cpkInterval,
  shareMeeting,
  sideLowerBound,
} from '../../../shared/uncertainty/capability.ts'
import {
  buildsNeeded,
  deviationInterval,
  failingBound,
  fittingInterval,
  meanInterval,
  measure,
  toleranceFactor,
} from '../../../shared/uncertainty/measured-builds.ts'
import { normalCumulative } from '../../../shared/uncertainty/normal.ts'
import { chiSquareQuantile, noncentralStudentBelow, studentQuantile } from '../../../shared/uncertainty/quantiles.ts'

describe('capability of measured builds', () => {
  it('agrees with the worked example of a handbook', () => {
    // NIST/SEMATECH e-Handbook 6.1.6 (figures from memory): limits 8 and 20, mean 16, deviation 2, target 14.
    const found = capabilityOf({ count: 50, mean: 16, deviation: 2 }, { min: 8, max: 20 })
    expect(found.cp).toBeCloseTo(1, 12)
    expect(found.upper).toBeCloseTo(0.6667, 4)
    expect(found.lower).toBeCloseTo(1.3333, 4)
    expect(found.cpk).toBeCloseTo(0.6667, 4)
    expect(found.cpm).toBeCloseTo(0.7071, 4)
  })

  it('has one side where there is one limit, and none without', () => {
    const measured = { count: 12, mean: 0.46, deviation: 0.13 }
    expect(capabilityOf(measured, { min: 0.1, max: null })).toEqual({
      cp: null,
      lower: expect.closeTo(0.923077, 6) as number,
      upper: null,
      cpk: expect.closeTo(0.923077, 6) as number,
      cpm: null,
    })
    expect(capabilityOf(measured, { min: null, max: null }).cpk).toBeNull()
  })

  it('has no bound where nothing varies', () => {
    expect(capabilityOf({ count: 3, mean: 1, deviation: 0 }, { min: 0, max: 2 }).cpk).toBe(Infinity)
    expect(capabilityOf({ count: 3, mean: 3, deviation: 0 }, { min: 0, max: 2 }).cpk).toBe(-Infinity)
  })

  it('has the intervals derived for twelve builds', () => {
    const { cp, cpk, upper } = capabilityOf({ count: 12, mean: 0.46, deviation: 0.13 }, { min: 0.1, max: 1 })
    expect(cp).toBeCloseTo(1.153846, 6)
    expect(upper).toBeCloseTo(1.384615, 6)
    const ofCp = cpInterval(cp ?? 0, 12)
    expect(ofCp.low).toBeCloseTo(0.679581, 6)
    expect(ofCp.high).toBeCloseTo(1.6288, 4)
    const ofCpk = cpkInterval(cpk ?? 0, 12)
    expect(ofCpk.low).toBeCloseTo(0.493716, 6)
    expect(ofCpk.high).toBeCloseTo(1.352438, 6)
    const bound = sideLowerBound(cpk ?? 0, 12)
    expect(bound).toBeCloseTo(0.5558, 4)
    expect(shareMeeting(bound)).toBeCloseTo(0.952274, 6)
    expect(shareMeeting(cpk ?? 0)).toBeCloseTo(normalCumulative((0.46 - 0.1) / 0.13), 12)
  })

  it.each([
    [10, 0.68, 1.98],
    [20, 0.88, 1.78],
    [30, 0.97, 1.69],
    [50, 1.05, 1.61],
  ])('of 1.33 in %i builds lies roughly between %d and %d', (count, low, high) => {
    const interval = cpkInterval(1.33, count)
    expect(interval.low).toBeCloseTo(low, 2)
    expect(interval.high).toBeCloseTo(high, 2)
  })

  it.each([
    [1, 2699.8, 1],
    [4 / 3, 63.34, 2],
    [1.5, 6.795, 3],
    [5 / 3, 0.5733, 4],
    [2, 0.00197, 5],
  ])('of %d, centred, leaves %d in a million outside', (cp, outside, digits) => {
    expect(2e6 * normalCumulative(-3 * cp)).toBeCloseTo(outside, digits)
  })
})

describe('what so many builds show', () => {
  it.each([
    // n, half-width of the mean's interval in s, interval of s, Howe's factor
    [3, 2.48, 0.52, 6.28, 9.99],
    [5, 1.24, 0.6, 2.87, 5.09],
    [10, 0.72, 0.69, 1.83, 3.38],
    [20, 0.47, 0.76, 1.46, 2.75],
    [30, 0.37, 0.8, 1.34, 2.55],
  ])('%i builds', (count, half, low, high, factor) => {
    const measured = { count, mean: 0, deviation: 1 }
    expect(meanInterval(measured).high).toBeCloseTo(half, 2)
    expect(deviationInterval(measured).low).toBeCloseTo(low, 2)
    // One table entry (6.285) is rounded down.
    expect(Math.abs(deviationInterval(measured).high - high)).toBeLessThan(0.0055)
    expect(Math.abs(toleranceFactor(count) - factor)).toBeLessThan(0.0055)
  })

  it('none of twelve failing leaves 22 in 100 possible; 59 are needed for 5 in 100', () => {
    expect(failingBound(12)).toBeCloseTo(0.220922, 6)
    expect(buildsNeeded(0.05)).toBe(59)
    expect(failingBound(59)).toBeLessThan(0.05)
    expect(failingBound(58)).toBeGreaterThan(0.05)
  })

  it('nine of ten fitting means between 55 and 99.7 in a hundred', () => {
    const { low, high } = fittingInterval(9, 10)
    expect(low).toBeCloseTo(0.554984, 6)
    expect(high).toBeCloseTo(0.997471, 6)
    expect(fittingInterval(0, 10).low).toBe(0)
    expect(fittingInterval(10, 10).high).toBe(1)
  })

  it('readings have a mean and a deviation over n − 1', () => {
    expect(measure([0.4, 0.5, 0.3, 0.6])).toEqual({
      count: 4,
      mean: expect.closeTo(0.45, 12) as number,
      deviation: expect.closeTo(0.129099, 6) as number,
    })
    expect(measure([0.4])).toEqual({ count: 1, mean: 0.4, deviation: 0 })
    expect(measure([])).toBeNull()
  })
})

describe('quantiles as tables give them', () => {
  it.each([
    [0.975, 11, 21.920049],
    [0.95, 1, 3.841459],
    [0.05, 10, 3.940299],
    [0.99, 100, 135.806723],
  ])('χ² below which %d lie, %i degrees', (share, freedom, value) => {
    expect(chiSquareQuantile(share, freedom)).toBeCloseTo(value, 5)
  })

  it.each([
    [0.975, 1, 12.706205],
    [0.975, 10, 2.228139],
    [0.95, 30, 1.697261],
    [0.025, 10, -2.228139],
  ])('t below which %d lie, %i degrees', (share, freedom, value) => {
    expect(studentQuantile(share, freedom)).toBeCloseTo(value, 6)
  })

  it('a noncentral t without shift is Student’s, and bounds cover as often as they say', () => {
    expect(noncentralStudentBelow(2.228139, 10, 0)).toBeCloseTo(0.975, 7)
    // Index 0.9231 seen in twelve builds: were the true one its lower bound, so high a value came in 5 of 100.
    const bound = sideLowerBound(0.923077, 12)
    expect(noncentralStudentBelow(3 * Math.sqrt(12) * 0.923077, 11, 3 * Math.sqrt(12) * bound)).toBeCloseTo(0.95, 9)
  })
})
