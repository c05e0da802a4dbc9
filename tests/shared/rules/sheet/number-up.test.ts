import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { numberUp } from '../../../../shared/rules/sheet/number-up.ts'

const inch = 25.4
const effort = { guillotine: 24, knife: 12 }
const size = (length: number, width: number) => ({ length: Math.max(length, width), width: Math.min(length, width) })

/** Every cut from edge to edge at whole numbers, tried one by one. */
function exhaustive(a: number, b: number, x: number, y: number, known = new Map<string, number>()): number {
  if (Math.max(x, y) < Math.max(a, b) || Math.min(x, y) < Math.min(a, b)) return 0
  const key = `${String(x)},${String(y)}`
  const found = known.get(key)
  if (found !== undefined) return found
  let best = 1
  for (let cut = 1; cut <= x / 2; cut += 1)
    best = Math.max(best, exhaustive(a, b, cut, y, known) + exhaustive(a, b, x - cut, y, known))
  for (let cut = 1; cut <= y / 2; cut += 1)
    best = Math.max(best, exhaustive(a, b, x, cut, known) + exhaustive(a, b, x, y - cut, known))
  known.set(key, best)
  return best
}

describe('the number of pieces a sheet yields', () => {
  it('is 3 by guillotine and 4 by knife for 5 x 7 in on 12 x 12 in (worked example of the physics note)', () => {
    expect(numberUp(size(7 * inch, 5 * inch), size(12 * inch, 12 * inch), effort)).toMatchObject({
      guillotine: 3,
      knife: 4,
      isSearched: true,
    })
  })

  it.each([
    ['4 1/4 x 5 1/2 in on letter', 5.5 * inch, 4.25 * inch, 11 * inch, 8.5 * inch, 4],
    ['the same within quarter-inch margins', 5.5 * inch, 4.25 * inch, 10.5 * inch, 8 * inch, 2],
    ['A6 on A4', 148, 105, 297, 210, 4],
    ['A6 on A4 within 5 mm margins', 148, 105, 287, 200, 2],
    ['nothing where the piece is larger than the sheet', 300, 200, 297, 210, 0],
  ])('is the published count for %s', (_, a, b, x, y, count) => {
    expect(numberUp(size(a, b), size(x, y), effort).guillotine).toBe(count)
  })

  it('equals an exhaustive search of all cuts', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 3, max: 12 }),
        fc.integer({ min: 3, max: 12 }),
        fc.integer({ min: 10, max: 32 }),
        fc.integer({ min: 10, max: 32 }),
        (a, b, x, y) => {
          const counted = numberUp(size(a, b), size(x, y), { guillotine: 1000, knife: 0 })
          expect(counted.guillotine).toBe(exhaustive(a, b, x, y))
        },
      ),
      { numRuns: 60 },
    )
  })

  it('never yields more paper than there is, nor fewer by knife, nor more without a search', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 150, noNaN: true }),
        fc.double({ min: 20, max: 150, noNaN: true }),
        fc.double({ min: 60, max: 420, noNaN: true }),
        fc.double({ min: 60, max: 420, noNaN: true }),
        (a, b, x, y) => {
          const searched = numberUp(size(a, b), size(x, y), { guillotine: 30, knife: 8 })
          expect(searched.knife * a * b).toBeLessThanOrEqual(x * y * (1 + 1e-6))
          expect(searched.knife).toBeGreaterThanOrEqual(searched.guillotine)
          const quick = numberUp(size(a, b), size(x, y), { guillotine: 0, knife: 0 })
          if (searched.isSearched) expect(quick.guillotine).toBeLessThanOrEqual(searched.guillotine)
        },
      ),
    )
  })
})
