import type { Path, ReportProblem } from '../pieces/reading/report-problem.ts'
import { createValueReader, type ValueReader, type Vocabulary } from '../pieces/reading/value-reader.ts'
import { nearestName } from '../units/did-you-mean.ts'
import type { Ruler, RulerUnit } from '../units/units.ts'
import { usualRuler } from './built-in-tokens.ts'
import { checkMap, checkShape } from './check-shape.ts'
import { isRawMap, type RawMap } from './raw-value.ts'
import { readClearance } from './read-clearance.ts'
import { readGroup, readNamedGroup } from './read-frame.ts'
import { readHumidity, readShare } from './read-share.ts'
import { readStock } from './read-stock.ts'
import { createSizeLookup } from './size-vocabulary.ts'
import type { Clearance, Maker, NamedSize, RuleLevel, Stock, Tokens } from './template-model.ts'
import { clearanceShape, levelShape, makerSpec, namedSizeShape, stockSpec, type RulerWritten } from './token-shapes.ts'

/** The keys of a file that hold one token each, as they are written. */
export interface TokenFrame {
  readonly units?: RulerUnit | undefined
  readonly ruler?: RulerWritten | undefined
  readonly workmanship?: string | undefined
  readonly target?: string | undefined
  readonly floor?: string | undefined
  readonly humidity?: string | undefined
}

export interface TokenReading {
  readonly tokens: Tokens
  readonly vocabulary: Vocabulary
}

/** Suggestions offered for one file: searching for the nearest name takes time, and a hostile file could ask for many. */
const mostSuggestions = 60

function createNearest(): Vocabulary['nearest'] {
  let left = mostSuggestions
  return (word, names) => {
    left -= 1
    return left < 0 ? null : nearestName(word, names)
  }
}

const keysOf = (data: RawMap, group: string): readonly string[] => {
  const entries = data[group]
  return isRawMap(entries) ? Object.keys(entries) : []
}

const nothingOpen = (): void => undefined

function readRuler(written: RulerWritten | undefined, frame: TokenFrame, below: Tokens, read: ValueReader): Ruler {
  if (written === undefined) {
    // A ruler has the marks of one unit: a set in the other one does not take the workspace's.
    return frame.units === undefined || frame.units === below.units ? below.ruler : usualRuler(frame.units)
  }
  if (typeof written !== 'string')
    return { cut: read.length(['cut'], written.cut), score: read.length(['score'], written.score) }
  const mark = read.length([], written)
  return { cut: mark, score: mark }
}

function readMakers(
  data: RawMap,
  below: Tokens,
  readerAt: (path: Path) => ValueReader,
  report: ReportProblem,
): ReadonlyMap<string, Maker> {
  const makers = new Map(below.makers)
  const homeFence = makers.get('home')?.fence ?? 0
  for (const [name, raw] of readNamedGroup(data, 'makers', 'makers', report)) {
    const written = checkMap(makerSpec, raw, ['makers', name], 'a maker', report)
    const read = readerAt(['makers', name])
    const half = (key: 'cut' | 'score'): number =>
      written === null ? NaN : read.length([key], written[key], { allowZero: true })
    makers.set(name, {
      name,
      cut: half('cut'),
      score: half('score'),
      fence: read.lengthOr(['fence'], written?.fence, homeFence, { allowZero: true }),
    })
  }
  return makers
}

function readChecks(
  data: RawMap,
  below: Tokens,
  knownRules: readonly string[] | null,
  nearest: Vocabulary['nearest'],
  report: ReportProblem,
) {
  const checks = new Map<string, RuleLevel>(below.checks)
  for (const [rule, raw] of readGroup(data, 'checks', 'levels', report)) {
    const level = checkShape(levelShape(), raw, ['checks', rule], `the level of “${rule}”`, report)
    checkRule(rule, ['checks', rule], 'key', knownRules, nearest, report)
    if (level !== null) checks.set(rule, level)
  }
  return checks
}

/** Reports a rule that there is none of. */
export function checkRule(
  rule: string,
  path: Path,
  side: 'key' | 'value',
  knownRules: readonly string[] | null,
  nearest: Vocabulary['nearest'],
  report: ReportProblem,
): void {
  if (knownRules === null ? /^[a-z][a-z-]*\/[a-z][a-z-]*$/.test(rule) : knownRules.includes(rule)) return
  const meant = knownRules === null ? null : nearest(rule, knownRules)
  report(
    path,
    'unknown-rule',
    `There is no rule called “${rule.slice(0, 60)}”.`,
    meant === null ? 'Write the rule as a report names it, such as “fit/clearance”.' : `Did you mean “${meant}”?`,
    side,
  )
}

/**
 * Reads the design tokens that a file holds, over those that hold already: nearer wins, entry by entry.
 * @param below the workspace's tokens, or those built in
 * @param knownRules identities of all rules; `null` where they are not known here
 */
export function readTokens(
  data: RawMap,
  frame: TokenFrame,
  below: Tokens,
  knownRules: readonly string[] | null,
  report: ReportProblem,
): TokenReading {
  const units = frame.units ?? below.units
  const nearest = createNearest()
  const sizes = new Map<string, NamedSize>(below.sizes)
  const makerNames = new Set([...below.makers.keys(), ...keysOf(data, 'makers')])
  const vocabulary = (siblings: ReadonlySet<string>): Vocabulary => ({
    units,
    stocks: new Set([...below.stocks.keys(), ...keysOf(data, 'stocks')]),
    makers: makerNames,
    clearances: new Set([...below.clearances.keys(), ...keysOf(data, 'clearances')]),
    pieces: new Set(keysOf(data, 'pieces')),
    sizes: new Set([...sizes.keys(), ...siblings]),
    nearest,
    sizeNamed: createSizeLookup(sizes, siblings, nearest),
  })

  const siblings = new Set(keysOf(data, 'sizes'))
  const ownSizes = readNamedGroup(data, 'sizes', 'sizes', report).flatMap(
    ([name, raw]): readonly (readonly [string, NamedSize])[] => {
      const path = ['sizes', name]
      const written = checkShape(namedSizeShape(), raw, path, 'a size', report)
      if (name === 'fit')
        report(
          path,
          'bad-name',
          '“fit” cannot be the name of a size.',
          'It leaves a size to sizing; choose another name.',
          'key',
        )
      const size =
        written === null
          ? { length: NaN, width: NaN }
          : createValueReader(path, vocabulary(siblings), report, nothingOpen).size([], written)
      return [[name, size]]
    },
  )
  for (const [name, size] of ownSizes) sizes.set(name, size)

  const words = vocabulary(new Set())
  const readerAt = (path: Path): ValueReader => createValueReader(path, words, report, nothingOpen)
  const stocks = new Map<string, Stock>(below.stocks)
  for (const [name, raw] of readNamedGroup(data, 'stocks', 'stocks', report)) {
    const written = checkMap(stockSpec, raw, ['stocks', name], 'a stock', report)
    if (written !== null) stocks.set(name, readStock(name, written, readerAt(['stocks', name])))
  }
  const clearances = new Map<string, Clearance>(below.clearances)
  for (const [name, raw] of readNamedGroup(data, 'clearances', 'clearances', report)) {
    const written = checkShape(clearanceShape(), raw, ['clearances', name], 'a clearance', report)
    if (written !== null) clearances.set(name, readClearance([], name, written, readerAt(['clearances', name])))
  }

  const read = readerAt([])
  const share = (key: 'target' | 'floor'): number => {
    const written = frame[key]
    return written === undefined ? below[key] : (read.parse([key], written, readShare) ?? NaN)
  }
  const target = share('target')
  const floor = share('floor')
  if (floor > target) {
    report(
      [frame.floor === undefined ? 'target' : 'floor'],
      'floor-above-target',
      'The floor lies above the target.',
      'Write a “floor” that is no more than the “target”.',
      'value',
    )
  }
  const tokens: Tokens = {
    units,
    ruler: readRuler(frame.ruler, frame, below, readerAt(['ruler'])),
    stocks,
    sizes,
    clearances,
    makers: readMakers(data, below, readerAt, report),
    workmanship: frame.workmanship === undefined ? below.workmanship : read.maker(['workmanship'], frame.workmanship),
    checks: readChecks(data, below, knownRules, nearest, report),
    target,
    floor,
    humidity: frame.humidity === undefined ? below.humidity : read.parse(['humidity'], frame.humidity, readHumidity),
  }
  return { tokens, vocabulary: words }
}
