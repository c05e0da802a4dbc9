import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { readSet } from '../../../shared/template/read-set.ts'
import { emptyWorkspace, readWorkspace } from '../../../shared/template/read-workspace.ts'
import { card, fits, pieces } from './malformed/malformed-case.ts'
import type { SetReading } from '../../../shared/template/template-model.ts'
import { createRandom, mutate } from './mutate.ts'
import { exampleText } from './support.ts'

const plain = (text: string): string => text.replace(/[«»]/g, '')

/** Numbers anywhere in a value, through maps and lists. */
function* numbersIn(value: unknown): Generator<number> {
  if (typeof value === 'number') yield value
  else if (value instanceof Map) for (const one of value.values()) yield* numbersIn(one)
  else if (typeof value === 'object' && value !== null) for (const one of Object.values(value)) yield* numbersIn(one)
}

/** What is not as promised of what a text was read as; empty where all is. */
function brokenPromises(text: string, { set, problems }: SetReading): readonly string[] {
  const broken: string[] = []
  const promise = (isKept: boolean, what: string): void => {
    if (!isKept) broken.push(what)
  }
  promise((set === null) === problems.length > 0, 'a set or problems, never both or neither')
  const lines = text.replace(/^\uFEFF/, '').split('\n')
  for (const { code, message, hint, at } of problems) {
    promise(/^[a-z]+(-[a-z]+)*$/.test(code), `the code ${code}`)
    promise(message !== '' && hint !== '', 'a message and a hint')
    promise(at.line >= 1 && at.line <= lines.length, 'a line of the file')
    promise(at.column >= 1 && at.column <= (lines[at.line - 1] ?? '').length + 1, 'a column of the line')
    promise(at.endLine > at.line || (at.endLine === at.line && at.endColumn >= at.column), 'an end after the beginning')
  }
  if (set !== null) for (const number of numbersIn(set)) promise(Number.isFinite(number), 'finite numbers')
  return broken
}

const read = (text: string): SetReading => readSet(text, 'trial.yaml', emptyWorkspace())

/** Reads a text and holds what comes back against what is promised. */
const expectSetOrProblems = (text: string): void => {
  expect(brokenPromises(text, read(text))).toEqual([])
}

const sound = [
  card(
    'folded: 148 x 105, fold: long-edge, raised: 0.8 mm ± 5 %, layers: [{ stock: thin, size: 90 x 60, at: [0, -3] }]',
  ),
  pieces(
    'e: { kind: envelope, style: baronial, stock: thin, blank: 210 x 210, corners: { sides: [101, 100], bottom: 126, flap: 126 } }',
  ),
  pieces(
    'base: { kind: box, stock: smooth, blank: &b 200 x 158, wall: { length: [20, 20], width: 22 }, tabs: { at: ends, taper: 5° } }',
    'lid: { kind: lid, stock: smooth, blank: *b, wall: 14 }',
  ),
  pieces(
    'tag:\n    kind: custom\n    stock: smooth\n    outline:\n      - [0, 0]\n      - [90, 0]\n      - [90, 60]\n    outside: 90 x 60',
  ),
  pieces(
    'tube: { kind: sleeve, stock: smooth, blank: 300 x 60, scores: [80, 100, 180, 200] }',
    'bag: { kind: bag, stock: thin, inside: 180 x 80 x 220 }',
  ),
  fits(
    'pack: { put: cover, holding: card, count: 6, in: base, clearance: 0.5..12 mm }',
    'stack: { put: [4 card, 4 cover], in: base }',
    'shut: { put: lid, over: base, paper: [thin] }',
  ),
]

describe('a text changed at random', () => {
  // The parser makes an error object for every mistake; tracing where it was made takes most of the time.
  const traced = Error.stackTraceLimit
  beforeAll(() => {
    Error.stackTraceLimit = 0
  })
  afterAll(() => {
    Error.stackTraceLimit = traced
  })

  it('comes back as a set or as problems, ten thousand times over, and never as an error', () => {
    const random = createRandom(20_261_201)
    let sets = 0
    for (let round = 0; round < 10_000; round += 1) {
      const text = mutate(sound[round % sound.length] ?? '', random)
      let reading: SetReading
      try {
        reading = read(text)
      } catch (error) {
        throw new Error(`round ${String(round)}: ${JSON.stringify(text)}`, { cause: error })
      }
      const broken = brokenPromises(text, reading)
      if (broken.length > 0) expect.fail(`round ${String(round)}: ${broken.join(', ')}: ${JSON.stringify(text)}`)
      sets += reading.set === null ? 0 : 1
    }
    // Some changes do no harm: were there none, the changes would be too coarse to reach the readers.
    expect(sets).toBeGreaterThan(300)
  })

  it('comes back as a workspace, with its problems', () => {
    const random = createRandom(7)
    for (let round = 0; round < 1000; round += 1) {
      const { tokens, problems } = readWorkspace(mutate(exampleText('foldgauge'), random), 'foldgauge.yaml')
      if (problems.length === 0) for (const number of numbersIn(tokens)) expect(Number.isFinite(number)).toBe(true)
    }
  })
})

describe('a hostile text', () => {
  const long = 100_000
  const bomb = `a: &a [x, x, x, x, x, x, x, x, x]\n${'bcdefghi'
    .split('')
    .map((name, index) => `${name}: &${name} [${`*${'abcdefghi'[index] ?? ''}, `.repeat(9)}]\n`)
    .join('')}`

  it.each([
    ['open brackets', '['.repeat(long)],
    ['open braces', '{a: '.repeat(long / 4)],
    ['dashes', '- '.repeat(long / 2)],
    ['question marks', '? '.repeat(long / 2)],
    ['colons', ': '.repeat(long / 2)],
    ['commas', `[${','.repeat(long)}]`],
    ['exclamation marks', '!'.repeat(long)],
    ['ampersands', '&'.repeat(long)],
    ['document marks', '---\n'.repeat(long / 4)],
    ['empty lines', '\n'.repeat(long)],
    ['comments', '#\n'.repeat(long / 2)],
    ['spaces', `${' '.repeat(long)}a`],
    ['spaces inside a measure', card(`folded: "1${' '.repeat(long)}x"`)],
    ['stars', `[${'*a,'.repeat(long / 3)}]`],
    ['escapes', `"${'\\x'.repeat(long / 2)}"`],
    ['a bomb of aliases', bomb],
    ['a bomb of aliases in pieces', `set: trial\npieces:\n${bomb.replace(/^/gm, '  ')}`],
    ['keys upon keys', Array.from({ length: long / 12 }, (_, index) => `k${String(index)}: 1`).join('\n')],
    [
      'pieces upon pieces',
      pieces(
        ...Array.from(
          { length: 4000 },
          (_, index) => `p${String(index)}: { kind: insert, stock: nothing, size: 3 x 2 }`,
        ),
      ),
    ],
    [
      'fits upon fits',
      fits(...Array.from({ length: 2500 }, (_, index) => `f${String(index)}: { put: card, in: cover }`)),
    ],
    ['indents within indents', Array.from({ length: 600 }, (_, index) => `${' '.repeat(index)}a:`).join('\n')],
  ])('of %s is answered', (_says, text) => {
    const start = performance.now()
    expectSetOrProblems(plain(text))
    // Generous, for busy machines: what it rules out takes minutes.
    expect(performance.now() - start).toBeLessThan(15_000)
  })

  it.each(['__proto__', 'constructor', 'toString', 'hasOwnProperty', 'valueOf', 'prototype'])(
    'may use the name %s and changes nothing else',
    (name) => {
      expectSetOrProblems(pieces(`${name}: { kind: insert, stock: smooth, size: 3 x 2 }`))
      expectSetOrProblems(card(`folded: 148 x 105, ${name}: { polluted: true }`))
      expectSetOrProblems(fits(`${name}: { put: ${name}, in: ${name}, clearance: ${name} }`))
      expectSetOrProblems(
        `${card('folded: 148 x 105')}checks: { ${name}: off }\nmakers: { ${name}: { cut: 1, score: 1 } }\nsheet: ${name}\nmail: ${name}\n`,
      )
      expectSetOrProblems(pieces(`p: { kind: ${name}, stock: ${name}, size: ${name} }`))
      expect(({} as Record<string, unknown>).polluted).toBeUndefined()
    },
  )

  it('reads the bomb’s fuse as too many values', () => {
    const { problems } = readSet(`set: trial\n${bomb}`, 'trial.yaml', emptyWorkspace())
    expect(problems.map(({ code }) => code)).toEqual(['too-many-values'])
  })
})
