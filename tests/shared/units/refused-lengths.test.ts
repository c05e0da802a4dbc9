import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseLength } from '../../../shared/units/parse-length.ts'
import { parseRange } from '../../../shared/units/parse-range.ts'
import { parseSize } from '../../../shared/units/parse-size.ts'
import { parseTolerancedLength, parseTolerancedSize } from '../../../shared/units/parse-toleranced-length.ts'
import { refusalOf } from './reading-of.ts'

const wanted = 'write a number with a unit, such as 148 mm, 8 1/4 in or 0.32 mm'
const units = 'units are mm, cm, in, and for thickness um, mil, pt'

describe('a length that cannot be read is refused with what to write instead', () => {
  it.each([
    ['', 'length-empty', 'write a number with a unit, such as 148 mm'],
    ['   ', 'length-empty', 'write a number with a unit, such as 148 mm'],
    ['0,37', 'length-decimal-comma', 'write a dot: 0.37'],
    ['0,37 mm', 'length-decimal-comma', 'write a dot: 0.37'],
    [',5', 'length-decimal-comma', 'write a dot: 0.5'],
    ['-8,5 in', 'length-decimal-comma', 'write a dot: 8.5'],
    ['0,125 mm', 'length-decimal-comma', 'write a dot: 0.125'],
    ['1,250 mm', 'length-decimal-comma', 'write a dot for decimals: 1.250; or 1250 if the comma parts thousands'],
    ['2e1', 'length-exponent', 'write it out: 20'],
    ['1.5E2 mm', 'length-exponent', 'write it out: 150'],
    ['1e-3 in', 'length-exponent', 'write it out: 0.001'],
    ['1e300', 'length-exponent', 'write it out in ordinary digits'],
    ['0x14', 'length-hexadecimal', 'write it in ordinary digits: 20'],
    ['0x1F mm', 'length-hexadecimal', 'write it in ordinary digits: 31'],
    ['-0x14', 'length-hexadecimal', 'write it in ordinary digits: 20'],
    ['0x mm', 'length-hexadecimal', 'write it in ordinary digits'],
    ['0o24', 'length-octal', 'write it in ordinary digits: 20'],
    ['0777', 'length-octal', 'write 777'],
    ['-0777', 'length-octal', 'write 777'],
    ['08 1/4 in', 'length-octal', 'write 8 1/4'],
    ['00.5', 'length-octal', 'write 0.5'],
    ['3/', 'length-missing-operand', 'write both numbers, such as 3/4'],
    ['3/ in', 'length-missing-operand', 'write both numbers, such as 3/4'],
    ['/4 in', 'length-missing-operand', 'write both numbers, such as 3/4'],
    ['8 1/', 'length-missing-operand', 'write both numbers, such as 3/4'],
    ['8-/4', 'length-missing-operand', 'write both numbers, such as 3/4'],
    ['8-', 'length-missing-operand', 'write both numbers, such as 3/4'],
    ['5.', 'length-missing-operand', 'write 5, or digits after the dot'],
    ['5. mm', 'length-missing-operand', 'write 5, or digits after the dot'],
    ['mm', 'length-missing-operand', 'write one before the unit, such as 12 mm'],
    ['-in', 'length-missing-operand', 'write one before the unit, such as 12 in'],
    ['3/0', 'length-zero-denominator', 'write a fraction such as 3/4'],
    ['8 1/0 in', 'length-zero-denominator', 'write a fraction such as 3/4'],
    ['0', 'length-zero', 'write a length larger than nought'],
    ['0.00 mm', 'length-zero', 'write a length larger than nought'],
    ['0/4', 'length-zero', 'write a length larger than nought'],
    ['-0', 'length-zero', 'write a length larger than nought'],
    ['-20', 'length-negative', 'only a clearance may be; write the length without the sign'],
    ['−1/8 in', 'length-negative', 'only a clearance may be; write the length without the sign'],
    ['20000', 'length-too-long', 'check the unit; templates are made of sheets a hand can turn'],
    ['394 in', 'length-too-long', 'check the unit; templates are made of sheets a hand can turn'],
    ['9'.repeat(60), 'length-too-long', 'check the unit; templates are made of sheets a hand can turn'],
    ['20 mn', 'length-unknown-unit', 'did you mean mm?'],
    ['20 MM', 'length-unknown-unit', 'did you mean mm?'],
    ['½ mn', 'length-unknown-unit', 'did you mean mm?'],
    ['8 inches', 'length-unknown-unit', 'did you mean in?'],
    ['320 microns', 'length-unknown-unit', 'did you mean um?'],
    ['2 m', 'length-unknown-unit', units],
    ['20 furlongs', 'length-unknown-unit', units],
    ['20 x', 'length-unknown-unit', units],
    ['wide', 'length-not-understood', wanted],
    ['about 20 or so mm', 'length-not-understood', wanted],
    ['8 1/4 1/2 in', 'length-not-understood', wanted],
    ['1.5/2', 'length-not-understood', wanted],
    ['1/2/3', 'length-not-understood', wanted],
    ['1.2.3', 'length-not-understood', wanted],
    ['--5', 'length-not-understood', wanted],
    ['8 4', 'length-not-understood', wanted],
    ['8 mm 1/4', 'length-not-understood', wanted],
    ['1_000', 'length-not-understood', wanted],
    ['.', 'length-not-understood', wanted],
    ['1'.repeat(5000), 'length-not-understood', wanted],
    ['105 x 148 mm', 'length-not-understood', 'write one length, such as 148 mm'],
    ['0.2..3 mm', 'length-not-understood', 'write one length, such as 148 mm'],
    ['20 ± 1 mm', 'length-tolerance', 'write the length without its tolerance'],
    ['20 +0.1/-0.2 mm', 'length-tolerance', 'write the length without its tolerance'],
  ])('%j', (text, code, remedy) => {
    expect(refusalOf(parseLength(text, 'mm'))).toEqual({ code, remedy })
  })

  it('quotes the author, cut short where a text goes on and on', () => {
    const fact = (text: string): string => {
      const reading = parseLength(text, 'mm')
      return reading.ok ? '' : reading.fact
    }
    expect(fact('0,37 mm')).toContain('“0,37 mm”')
    expect(fact('z'.repeat(100_000)).length).toBeLessThan(100)
  })
})

describe('a refusal', () => {
  const fragments = fc.constantFrom(
    '0',
    '8',
    '1/4',
    '¼',
    ' ',
    '-',
    '+',
    '±',
    '..',
    'x',
    '.',
    ',',
    '/',
    '%',
    'mm',
    'in',
    '"',
    'e',
    '0x',
  )
  const texts = fc.oneof(
    fc.string(),
    fc.array(fragments, { maxLength: 9 }).map((parts) => parts.join('')),
  )

  it('is all that any text can lead to: nothing throws, nothing is read as no number, every refusal says what to write', () => {
    fc.assert(
      fc.property(texts, (text) => {
        const one = parseLength(text, 'in')
        const range = parseRange(text, 'mm')
        const size = parseSize(text, 'mm', '2 or 3')
        const toleranced = parseTolerancedLength(text, 'mm', { allowStack: true })
        const tolerancedSize = parseTolerancedSize(text, 'in', '2 or 3')
        for (const reading of [one, range, size, toleranced, tolerancedSize]) {
          if (reading.ok) continue
          expect(reading.code).toMatch(/^[a-z]+(-[a-z]+)+$/)
          expect(reading.fact.length).toBeGreaterThan(5)
          expect(reading.remedy.length).toBeGreaterThan(5)
        }
        const isLength = (value: number): boolean => value > 0 && value <= 10_000
        if (one.ok) expect(one.value.mm).toSatisfy(isLength)
        if (range.ok) expect(range.value.min ?? -Infinity).toBeLessThanOrEqual(range.value.max ?? Infinity)
        if (size.ok) for (const length of size.value) expect(length.mm).toSatisfy(isLength)
        if (toleranced.ok) expect(toleranced.value.nominal - (toleranced.value.halfWidth ?? 0)).toBeGreaterThan(0)
        if (tolerancedSize.ok)
          for (const { nominal, halfWidth } of tolerancedSize.value) expect(nominal).toBeGreaterThan(halfWidth ?? 0)
      }),
      { numRuns: 5000 },
    )
  })

  it('of a text made to be slow comes at once', () => {
    const began = performance.now()
    for (const text of [' '.repeat(50_000) + '!', 'a'.repeat(50_000) + '!', '1 '.repeat(50_000), '± '.repeat(50_000)]) {
      expect(parseLength(text, 'mm').ok).toBe(false)
      expect(parseRange(`${text}..`, 'mm').ok).toBe(false)
      expect(parseSize(text, 'mm', 2).ok).toBe(false)
      expect(parseTolerancedLength(text, 'mm').ok).toBe(false)
      expect(parseTolerancedSize(text, 'mm', 2).ok).toBe(false)
    }
    expect(performance.now() - began).toBeLessThan(1000)
  })
})
