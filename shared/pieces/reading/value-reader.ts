import { parseLength, type ParseOptions } from '../../units/parse-length.ts'
import { parseRange } from '../../units/parse-range.ts'
import { parseSize } from '../../units/parse-size.ts'
import {
  parseTolerancedLength,
  parseTolerancedSize,
  type TolerancedOptions,
} from '../../units/parse-toleranced-length.ts'
import type { Millimetres, Range, Reading, RulerUnit, TolerancedLength } from '../../units/units.ts'
import type { GivenSize, Open } from '../piece-base.ts'
import type { Path, ReportProblem } from './report-problem.ts'

export interface SpaceOptions {
  /** How many extents there may be. */
  readonly extents: 3 | '2 or 3'
  readonly allowTolerance: boolean
}

/** Names that values may refer to, and the unit of lengths without one. */
export interface Vocabulary {
  readonly units: RulerUnit
  readonly stocks: ReadonlySet<string>
  readonly makers: ReadonlySet<string>
  readonly clearances: ReadonlySet<string>
  readonly pieces: ReadonlySet<string>
  /** Names of sizes that the author gave. */
  readonly sizes: ReadonlySet<string>
  /** The name a word was probably meant to be. */
  nearest(word: string, names: Iterable<string>): string | null
  /** A size by name, the author's own or one built in; what is wrong with the name where there is none. */
  sizeNamed(name: string): Reading<GivenSize>
}

/**
 * Reads the values of one thing in a file, reporting what is wrong with each at its place. What cannot be read comes
 * back as NaN, so that one mistake does not beget others; a file with problems is never judged.
 * `keys` lead from the thing to the value.
 */
export interface ValueReader {
  report(keys: Path, code: string, message: string, hint: string, side?: 'key' | 'value'): void
  /** Reads any other measure; `null` where it cannot be read. */
  parse<T>(keys: Path, written: string, read: (text: string) => Reading<T>): T | null
  length(keys: Path, written: string, options?: ParseOptions): Millimetres
  lengthOr<T>(keys: Path, written: string | undefined, fallback: T, options?: ParseOptions): Millimetres | T
  lengthOrFit(keys: Path, written: string): Millimetres | Open
  lengths(keys: Path, written: readonly string[]): readonly Millimetres[]
  /** A place along an axis, which may be zero or negative. */
  coordinate(keys: Path, written: string): Millimetres
  toleranced(keys: Path, written: string, options?: TolerancedOptions): TolerancedLength
  range(keys: Path, written: string): Range
  size(keys: Path, written: string): GivenSize
  sizeOrFit(keys: Path, written: string): GivenSize | Open
  /** Two or three extents; empty where they cannot be read. */
  space(keys: Path, written: string, options: SpaceOptions): readonly TolerancedLength[]
  count(keys: Path, written: string, least: number, most: number): number
  /** Degrees. */
  angle(keys: Path, written: string, least: number, most: number): number
  stock(keys: Path, name: string): string
  maker(keys: Path, name: string): string
  clearance(keys: Path, name: string): string
  piece(keys: Path, name: string): string
  /** Notes that a size is left to sizing. */
  leaveOpen(keys: Path): void
}

/** Words that look like names rather than measures: they begin with a letter, or hold nothing but words and hyphens. */
const looksLikeName = (text: string): boolean =>
  /^[a-z_\u00c0-\uffff][\w\u00c0-\uffff-]*$/i.test(text) || /^\d+(-[a-z][a-z0-9]*)+$/i.test(text)

/** Longer than any measure. */
const longestValue = 120

const sentence = (text: string): string =>
  `${text.charAt(0).toUpperCase()}${text.slice(1)}${/[.!?]$/.test(text) ? '' : '.'}`

const knownWords = (names: ReadonlySet<string>): string => {
  const shown = [...names].slice(0, 8).map((name) => `“${name}”`)
  return shown.length < names.size ? `${shown.join(', ')} and others` : shown.join(', ')
}

export function createValueReader(
  base: Path,
  vocabulary: Vocabulary,
  reportProblem: ReportProblem,
  onOpen: (path: Path) => void,
): ValueReader {
  const report: ValueReader['report'] = (keys, code, message, hint, side = 'key') => {
    reportProblem([...base, ...keys], code, message, hint, side)
  }

  /** Reads a text; `null` where it cannot be read, which is reported. */
  function parse<T>(keys: Path, written: string, read: (text: string) => Reading<T>): T | null {
    const text = written.trim()
    if (text.length > longestValue) {
      report(
        keys,
        'value-too-long',
        `This value is ${String(text.length)} characters long.`,
        'Write a measure, such as “148 mm”.',
        'value',
      )
      return null
    }
    const reading = read(text)
    if (reading.ok) return reading.value
    report(keys, reading.code, sentence(reading.fact), sentence(reading.remedy), 'value')
    return null
  }

  function named(keys: Path, name: string, names: ReadonlySet<string>, noun: string, group: string): string {
    if (names.has(name)) return name
    const nearest = vocabulary.nearest(name, names)
    report(
      keys,
      `unknown-${noun}`,
      `There is no ${noun} called “${name}”.`,
      nearest !== null
        ? `Did you mean “${nearest}”?`
        : names.size === 0
          ? `Add it under “${group}”.`
          : `Add it under “${group}”, or use one of ${knownWords(names)}.`,
      'value',
    )
    return name
  }

  function refuseFit(keys: Path, written: string, instead: string): boolean {
    if (written.trim() !== 'fit') return false
    report(
      keys,
      'cannot-be-fit',
      '“fit” leaves a size to sizing, to which this one cannot be left.',
      `Write ${instead}.`,
      'value',
    )
    return true
  }

  const length: ValueReader['length'] = (keys, written, options = {}) => {
    if (refuseFit(keys, written, 'a length, such as “20 mm”')) return NaN
    return parse(keys, written, (text) => parseLength(text, vocabulary.units, options))?.mm ?? NaN
  }

  const isFit = (keys: Path, written: string): boolean => {
    if (written.trim() !== 'fit') return false
    onOpen([...base, ...keys])
    return true
  }

  const isSizeName = (text: string): boolean => vocabulary.sizes.has(text) || looksLikeName(text)

  const unreadSize: GivenSize = { length: NaN, width: NaN }

  const size: ValueReader['size'] = (keys, written) => {
    if (refuseFit(keys, written, 'a size, such as “148 x 105 mm”')) return unreadSize
    const read = parse(keys, written, (text): Reading<GivenSize> => {
      if (isSizeName(text)) return vocabulary.sizeNamed(text)
      const reading = parseSize(text, vocabulary.units, 2)
      if (!reading.ok) return reading
      const [first, second] = reading.value
      return { ok: true, value: { length: first?.mm ?? NaN, width: second?.mm ?? NaN } }
    })
    return read ?? unreadSize
  }

  const whole = (keys: Path, written: string, least: number, most: number, pattern: RegExp, noun: string): number => {
    const digits = pattern.exec(written.trim())?.[1]
    const value = digits === undefined ? NaN : Number(digits)
    if (value >= least && value <= most) return value
    report(
      keys,
      'not-a-number',
      digits === undefined
        ? `“${written}” is not ${noun}.`
        : `“${written}” is ${value < least ? 'less than' : 'more than'} it can be.`,
      `Write ${noun} from ${String(least)} to ${String(most)}.`,
      'value',
    )
    return NaN
  }

  return {
    report,
    parse,
    length,
    lengthOr: (keys, written, fallback, options) => (written === undefined ? fallback : length(keys, written, options)),
    lengthOrFit: (keys, written) => (isFit(keys, written) ? 'fit' : length(keys, written)),
    lengths: (keys, written) => written.map((one, index) => length([...keys, index], one)),
    coordinate: (keys, written) => length(keys, written, { allowZero: true, allowNegative: true }),
    toleranced: (keys, written, options = {}) =>
      parse(keys, written, (text) => parseTolerancedLength(text, vocabulary.units, options)) ?? {
        nominal: NaN,
        halfWidth: null,
        text: written,
      },
    range: (keys, written) =>
      parse(keys, written, (text) => parseRange(text, vocabulary.units)) ?? { min: NaN, max: NaN },
    size,
    sizeOrFit: (keys, written) => (isFit(keys, written) ? 'fit' : size(keys, written)),
    space: (keys, written, options) => {
      if (refuseFit(keys, written, 'a size, such as “152 x 120 x 38 mm”')) return []
      const read = parse(keys, written, (text): Reading<readonly TolerancedLength[]> => {
        if (options.extents === 3 || !isSizeName(text))
          return parseTolerancedSize(text, vocabulary.units, options.extents)
        const named = vocabulary.sizeNamed(text)
        if (!named.ok) return named
        return {
          ok: true,
          value: [named.value.length, named.value.width].map((nominal) => ({ nominal, halfWidth: null, text })),
        }
      })
      if (!options.allowTolerance && read?.some((extent) => extent.halfWidth !== null) === true) {
        report(
          keys,
          'length-tolerance',
          `“${written}” carries a tolerance, which the size of a thing we make cannot.`,
          'Take the tolerance out; how exactly it is made follows from the workmanship.',
          'value',
        )
      }
      return read ?? []
    },
    count: (keys, written, least, most) => whole(keys, written, least, most, /^(\d{1,9})$/, 'a whole number'),
    angle: (keys, written, least, most) =>
      whole(keys, written, least, most, /^(\d{1,3}(?:\.\d{1,6})?) ?(?:°|deg)?$/, 'an angle in degrees'),
    stock: (keys, name) => named(keys, name, vocabulary.stocks, 'stock', 'stocks'),
    maker: (keys, name) => named(keys, name, vocabulary.makers, 'maker', 'makers'),
    clearance: (keys, name) => named(keys, name, vocabulary.clearances, 'clearance', 'clearances'),
    piece: (keys, name) => named(keys, name, vocabulary.pieces, 'piece', 'pieces'),
    leaveOpen: (keys) => {
      onOpen([...base, ...keys])
    },
  }
}
