import { describe, expect, it } from 'vitest'
import { parseTolerancedLength, parseTolerancedSize } from '../../../shared/units/parse-toleranced-length.ts'
import type { RulerUnit } from '../../../shared/units/units.ts'
import { refusalOf, valueOf } from './reading-of.ts'

const read = (text: string, unit: RulerUnit = 'mm', allowStack = false): readonly [number, number | null] => {
  const { nominal, halfWidth } = valueOf(parseTolerancedLength(text, unit, { allowStack }))
  return [nominal, halfWidth]
}

function expectNear([nominal, halfWidth]: readonly [number, number | null], wanted: readonly [number, number]): void {
  expect(nominal).toBeCloseTo(wanted[0], 12)
  expect(halfWidth ?? NaN).toBeCloseTo(wanted[1], 12)
}

describe('lengths with a tolerance', () => {
  it('have none where none is written', () => {
    expect(read('0.37 mm')).toEqual([0.37, null])
    expect(read('3/4', 'in')).toEqual([19.05, null])
  })

  it.each([
    ['0.37 mm ± 5 %', 0.37, 0.0185],
    ['0.37 mm ±5%', 0.37, 0.0185],
    ['0.37 mm ± 2.5 %', 0.37, 0.00925],
    ['0.37 mm +- 0.02 mm', 0.37, 0.02],
    ['0.37 mm +/- 0.02 mm', 0.37, 0.02],
    ['0.37 ± 0.02 mm', 0.37, 0.02],
    ['0.37 mm ± 20 um', 0.37, 0.02],
    ['13 pt ± 1/2 pt', 0.3302, 0.0127],
    ['13 pt ± 1', 0.3302, 0.0254],
    ['8-1/4 in ± 1/16', 209.55, 1.5875],
    ['0.37 mm ± 0', 0.37, 0],
  ])('%s is even about what is written', (text, nominal, halfWidth) => {
    expectNear(read(text), [nominal, halfWidth])
  })

  it.each([
    ['0.37 +0.03/-0.01 mm', 0.38, 0.02],
    ['0.37 mm +0.03 / -0.01 mm', 0.38, 0.02],
    ['0.37 mm +0.03/−0.01', 0.38, 0.02],
    ['0.37 mm +0/-0.04', 0.35, 0.02],
    ['3 1/2 +1/16/-1/32 in', 88.9 + 0.396875, 1.190625],
    ['3-1/2 in +1/16 in/-0.5 mm', 88.9 + 0.54375, 1.04375],
  ])('%s is moved to its middle', (text, nominal, halfWidth) => {
    expectNear(read(text), [nominal, halfWidth])
  })

  it('take the file’s unit where there is none, and the text’s own where there is one', () => {
    expectNear(read('1 ± 1/8', 'in'), [25.4, 3.175])
    expectNear(read('1 mm ± 0.1', 'in'), [1, 0.1])
    expectNear(read('1 +0.1/-0.1 mm', 'in'), [1, 0.1])
  })

  it('keep the text', () => {
    expect(valueOf(parseTolerancedLength(' 0.37 mm ± 5 % ', 'mm')).text).toBe('0.37 mm ± 5 %')
  })

  it.each([
    ['0.37 mm ± 100 %', 'tolerance-too-large', 'write a smaller tolerance'],
    ['0.37 mm ± 0.37 mm', 'tolerance-too-large', 'write a smaller tolerance'],
    ['1 mm +0/-1 mm', 'tolerance-too-large', 'write a smaller tolerance'],
    ['0.37 mm +0/-0.8', 'tolerance-too-large', 'write a smaller tolerance'],
    ['0.37 mm ±', 'tolerance-missing', 'write one, such as ± 5 %'],
    ['0.37 mm ± 5,5 %', 'tolerance-not-understood', 'write it such as 5.5 %'],
    ['0.37 mm ± some %', 'tolerance-not-understood', 'write it such as 5 % or 2.5 %'],
    [
      '0.37 mm +0.03',
      'tolerance-not-understood',
      'write it such as 0.37 mm ± 5 %, 0.37 mm +- 0.02 mm or 0.37 +0.03/-0.01 mm',
    ],
    [
      '0.37 mm ± 1 % ± 2 %',
      'tolerance-not-understood',
      'write it such as 0.37 mm ± 5 %, 0.37 mm +- 0.02 mm or 0.37 +0.03/-0.01 mm',
    ],
    ['± 5 %', 'length-empty', 'write a number with a unit, such as 148 mm'],
    ['0.37 mm ± 0,02 mm', 'length-decimal-comma', 'write a dot: 0.02'],
    ['0.37 mm ± -0.02 mm', 'length-negative', 'only a clearance may be; write the length without the sign'],
    ['0,37 mm ± 5 %', 'length-decimal-comma', 'write a dot: 0.37'],
    ['0 ± 5 %', 'length-zero', 'write a length larger than nought'],
    ['3.2 mm / 10', 'length-not-understood', 'write a number with a unit, such as 148 mm, 8 1/4 in or 0.32 mm'],
  ])('%s is refused', (text, code, remedy) => {
    expect(refusalOf(parseTolerancedLength(text, 'mm'))).toEqual({ code, remedy })
  })
})

describe('a stack of sheets measured together', () => {
  it.each([
    ['3.2 mm / 10', 0.32],
    ['3.2mm/10', 0.32],
    ['3.2 / 10', 0.32],
    ['1/8 in / 10', 0.3175],
    ['130 pt / 10', 0.3302],
    ['3/10', 0.3],
  ])('%s is that share of it', (text, nominal) => {
    const [caliper, halfWidth] = read(text, 'mm', true)
    expect(caliper).toBeCloseTo(nominal, 12)
    expect(halfWidth).toBeNull()
  })

  it('may have a tolerance in per cent', () => {
    expectNear(read('3.2 mm / 10 ± 5 %', 'mm', true), [0.32, 0.016])
  })

  it('leaves fractions alone', () => {
    expect(read('3/10 mm', 'mm', true)).toEqual([0.3, null])
    expect(read('1/8 in', 'mm', true)).toEqual([3.175, null])
  })

  it.each([
    ['3.2 mm / 0', 'stack-count', 'write how many sheets were measured together, such as 3.2 mm / 10'],
    ['3.2 mm / 10 ± 0.1 mm', 'stack-tolerance', 'write it in per cent, such as 3.2 mm / 10 ± 5 %'],
    ['3.2 mm / 10 +0.1/-0.2', 'stack-tolerance', 'write it in per cent, such as 3.2 mm / 10 ± 5 %'],
    ['0 mm / 10', 'length-zero', 'write a length larger than nought'],
  ])('%s is refused', (text, code, remedy) => {
    expect(refusalOf(parseTolerancedLength(text, 'mm', { allowStack: true }))).toEqual({ code, remedy })
  })
})

describe('sizes with tolerances', () => {
  const readSize = (text: string, unit: RulerUnit = 'mm'): readonly (readonly [number, number | null])[] =>
    valueOf(parseTolerancedSize(text, unit, '2 or 3')).map(({ nominal, halfWidth }) => [nominal, halfWidth])

  it('take one at the end for all lengths', () => {
    expect(readSize('162 x 114 mm ± 0.8 mm')).toEqual([
      [162, 0.8],
      [114, 0.8],
    ])
    expect(readSize('162 x 114 x 10 mm ± 0.8 mm')).toEqual([
      [162, 0.8],
      [114, 0.8],
      [10, 0.8],
    ])
    expect(readSize('200 x 100 ± 1 %')).toEqual([
      [200, 2],
      [100, 1],
    ])
    expect(readSize('162 x 114 +0.5/-0.3 mm')).toEqual([
      [162.1, 0.4],
      [114.1, 0.4],
    ])
    expect(readSize('8 x 4 ± 1/16 in')).toEqual([
      [203.2, 1.5875],
      [101.6, 1.5875],
    ])
    expect(readSize('114 x 114 ± 0.8')).toEqual([
      [114, 0.8],
      [114, 0.8],
    ])
  })

  it('take each its own', () => {
    expect(readSize('162 ± 1 x 114 ± 0.8 mm')).toEqual([
      [162, 1],
      [114, 0.8],
    ])
    expect(readSize('162 ± 1 x 114 mm', 'in')).toEqual([
      [162, 1],
      [114, null],
    ])
    expect(readSize('114 ± 1 x 114 ± 1 mm')).toEqual([
      [114, 1],
      [114, 1],
    ])
  })

  it('may have none', () => {
    expect(readSize('5 3/4 x 4 3/8', 'in')).toEqual([
      [146.05, null],
      [111.125, null],
    ])
  })

  it.each([
    ['162 ± 1', 'size-parts'],
    ['162 x 114 mm ±', 'tolerance-missing'],
    ['162 x 114 mm ± 120 mm', 'tolerance-too-large'],
    ['162 x 114,5 mm', 'length-decimal-comma'],
  ])('%s is refused', (text, code) => {
    expect(refusalOf(parseTolerancedSize(text, 'mm', 2)).code).toBe(code)
  })
})
