import { describe, expect, it } from 'vitest'
import { parseRange } from '../../../shared/units/parse-range.ts'
import { refusalOf, valueOf } from './reading-of.ts'

describe('ranges', () => {
  it.each([
    ['1/8..1/2 in', { min: 3.175, max: 12.7 }],
    ['1/8 .. 1/2 in', { min: 3.175, max: 12.7 }],
    ['0.4.. mm', { min: 0.4, max: null }],
    ['0.4..', { min: 0.4, max: null }],
    ['0.4 mm..', { min: 0.4, max: null }],
    ['..3 mm', { min: null, max: 3 }],
    ['..⅛"', { min: null, max: 3.175 }],
    ['-0.3..4 mm', { min: -0.3, max: 4 }],
    ['-1/8..1/2 in', { min: -3.175, max: 12.7 }],
    ['-4..-0.3 mm', { min: -4, max: -0.3 }],
    ['0..2 mm', { min: 0, max: 2 }],
    ['2..2 mm', { min: 2, max: 2 }],
    ['.2.. .3', { min: 0.2, max: 0.3 }],
    ['1 mm..1/2 in', { min: 1, max: 12.7 }],
  ])('%s', (text, range) => {
    expect(valueOf(parseRange(text, 'mm'))).toEqual(range)
  })

  it('without a unit are in the file’s', () => {
    expect(valueOf(parseRange('1/8..1/2', 'in'))).toEqual({ min: 3.175, max: 12.7 })
    expect(valueOf(parseRange('0.4.. mm', 'in'))).toEqual({ min: 0.4, max: null })
  })

  it.each([
    ['..', 'range-empty', 'write at least one end, such as 0.4.. mm'],
    ['.. mm', 'range-empty', 'write at least one end, such as 0.4.. mm'],
    ['2 mm', 'range-not-understood', 'write two ends with two dots between, such as 0.2..3 mm, 0.4.. mm or ..3 mm'],
    [
      '0.2...3 mm',
      'range-not-understood',
      'write two ends with two dots between, such as 0.2..3 mm, 0.4.. mm or ..3 mm',
    ],
    ['3..0.2 mm', 'range-reversed', 'write the smaller end first: 0.2..3 mm'],
    ['3..0.2', 'range-reversed', 'write the smaller end first: 0.2..3'],
    ['-1..-2 mm', 'range-reversed', 'write the smaller end first: -2..-1 mm'],
    ['1 in..3 mm', 'range-reversed', 'write the smaller end first: 3 mm..1 in'],
    ['0,2..3 mm', 'length-decimal-comma', 'write a dot: 0.2'],
    ['0.2..3 mn', 'length-unknown-unit', 'did you mean mm?'],
    ['1..2..3 mm', 'length-not-understood', 'write one length, such as 148 mm'],
  ])('%s is refused', (text, code, remedy) => {
    expect(refusalOf(parseRange(text, 'mm'))).toEqual({ code, remedy })
  })

  it('turned round as a refusal says are read', () => {
    expect(valueOf(parseRange('3 mm..1 in', 'in'))).toEqual({ min: 3, max: 25.4 })
  })
})
