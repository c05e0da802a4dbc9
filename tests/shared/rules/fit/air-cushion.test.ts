import { describe, expect, it } from 'vitest'
import { sinkingTime } from '../../../../shared/rules/fit/air-cushion/air-cushion.ts'

describe('the air cushion under a lid', () => {
  it.each([
    [0.2, 19.32],
    [0.3, 5.724405],
    [0.5, 1.2365],
    [0.8, 0.3019],
  ])(
    'lets a lid of 15 g sink 20 mm through a gap of %s mm in %s s (worked example of the physics note)',
    (gap, seconds) => {
      const sides = { length: 150, width: 110, lengthGap: gap, widthGap: gap }
      expect(sinkingTime(sides, 20, 15)).toBeCloseTo(seconds, gap === 0.2 ? 2 : 4)
    },
  )

  it('takes eight times as long through half the gap', () => {
    const at = (gap: number): number => sinkingTime({ length: 150, width: 110, lengthGap: gap, widthGap: gap }, 20, 15)
    expect(at(0.25) / at(0.5)).toBeCloseTo(8, 9)
  })
})
