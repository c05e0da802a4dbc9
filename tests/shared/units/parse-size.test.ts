import { describe, expect, it } from 'vitest'
import { parseSize } from '../../../shared/units/parse-size.ts'
import { refusalOf, valueOf } from './reading-of.ts'

const size = (text: string, dimensions: 2 | 3 | '2 or 3' = '2 or 3', unit: 'mm' | 'in' = 'mm'): readonly number[] =>
  valueOf(parseSize(text, unit, dimensions)).map((length) => length.mm)

describe('sizes', () => {
  it.each([
    ['105 x 148 mm', [105, 148]],
    ['105x148mm', [105, 148]],
    ['105 X 148 mm', [105, 148]],
    ['105 × 148', [105, 148]],
    ['12x12in', [304.8, 304.8]],
    ['9 x 7 3/4 in', [228.6, 196.85]],
    ['5¾ x 4⅜"', [146.05, 111.125]],
    ['152 × 120 × 38', [152, 120, 38]],
    ['152 x 120 x 3.8 cm', [1520, 1200, 38]],
  ])('%s', (text, lengths) => {
    expect(size(text)).toEqual(lengths)
  })

  it('take the last unit for those before it that have none, and keep those that have one', () => {
    expect(size('9 in x 196.85 mm')).toEqual([228.6, 196.85])
    expect(size('1 in x 2 x 3 cm')).toEqual([25.4, 20, 30])
    expect(size('9 x 7 3/4', 2, 'in')).toEqual([228.6, 196.85])
    expect(size('105 x 148 mm', 2, 'in')).toEqual([105, 148])
  })

  it.each([
    ['148', 2, 'size-parts', 'write A x B, such as 148 x 105 mm'],
    ['148 x 105 x 2', 2, 'size-parts', 'write A x B, such as 148 x 105 mm'],
    ['160 x 118', 3, 'size-parts', 'write A x B x D, such as 152 x 120 x 38 mm'],
    ['1 x 2 x 3 x 4', '2 or 3', 'size-parts', 'write A x B or A x B x D, such as 148 x 105 mm'],
    ['148 x', 2, 'size-parts', 'write A x B, such as 148 x 105 mm'],
    ['x 148', 2, 'size-parts', 'write A x B, such as 148 x 105 mm'],
    ['', 2, 'size-parts', 'write A x B, such as 148 x 105 mm'],
    ['148 by 105', 2, 'size-parts', 'write A x B, such as 148 x 105 mm'],
    ['148 x 0', 2, 'length-zero', 'write a length larger than nought'],
    ['148 x -105', 2, 'length-negative', 'only a clearance may be; write the length without the sign'],
    ['148 x 105,5', 2, 'length-decimal-comma', 'write a dot: 105.5'],
    ['148 x 105 mn', 2, 'length-unknown-unit', 'did you mean mm?'],
    ['148 x 105 ± 1', 2, 'length-tolerance', 'write the length without its tolerance'],
  ] as const)('%s as %s lengths is refused', (text, dimensions, code, remedy) => {
    expect(refusalOf(parseSize(text, 'mm', dimensions))).toEqual({ code, remedy })
  })
})
