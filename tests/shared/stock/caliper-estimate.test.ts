import { describe, expect, it } from 'vitest'
import { apparentDensity, defaultCaliperShare, estimateCaliper } from '../../../shared/stock/caliper-estimate.ts'
import { caliperOf, stockCaliper } from '../../../shared/stock/stock-caliper.ts'
import type { Stock } from '../../../shared/template/template-model.ts'

const stock = (given: Partial<Stock>): Stock => ({
  name: 'smooth',
  title: null,
  grammage: null,
  caliper: null,
  caliperHalfWidth: null,
  grain: null,
  sheet: null,
  ...given,
})

describe('the caliper of a paper', () => {
  it('is estimated at 0.80 g/cm³ where only its weight is known, give or take 15 %', () => {
    expect(estimateCaliper(240)).toBeCloseTo(0.3, 12)
    const estimated = caliperOf(stock({ grammage: 240 }))
    expect(estimated.nominal).toBeCloseTo(0.3, 12)
    expect(estimated.halfWidth).toBeCloseTo(0.045, 12)
    expect(estimated.isEstimated).toBe(true)
  })

  it('gives or takes what its author says', () => {
    expect(caliperOf(stock({ grammage: 270, caliper: 0.32, caliperHalfWidth: 0.0192 }))).toEqual({
      nominal: 0.32,
      halfWidth: 0.0192,
      isEstimated: false,
    })
  })

  it('gives or takes nothing where its author says so', () => {
    expect(caliperOf(stock({ caliper: 0.32, caliperHalfWidth: 0 })).halfWidth).toBe(0)
  })

  it('else gives or takes 10 % up to 300 g/m² and 5 % above', () => {
    expect([120, 300, 300.5, 400].map(defaultCaliperShare)).toEqual([0.1, 0.1, 0.05, 0.05])
    expect(defaultCaliperShare(null)).toBe(0.1)
    expect(caliperOf(stock({ grammage: 350, caliper: 0.4 })).halfWidth).toBeCloseTo(0.02, 12)
  })

  it('is one source of variation for all pieces of that paper', () => {
    expect(stockCaliper(stock({ caliper: 0.4 })).sources.map(({ name }) => name)).toEqual(['caliper(smooth)'])
  })

  // Government specification of index paper, 199 g/m² and 0.2311 mm: bulk 1.156 cm³/g.
  it('and its weight give its apparent density', () => {
    expect(1 / apparentDensity(199.9, 0.2311)).toBeCloseTo(1.156, 3)
    expect(apparentDensity(270, estimateCaliper(270))).toBeCloseTo(0.8, 12)
  })
})
