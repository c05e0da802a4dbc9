import { readFileSync } from 'node:fs'
import { Ajv } from 'ajv'
import { XMLParser, XMLValidator } from 'fast-xml-parser'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { githubReporter } from '../../cli/reporters/github.ts'
import { jsonReporter } from '../../cli/reporters/json.ts'
import { junitReporter } from '../../cli/reporters/junit.ts'
import { markdownReporter } from '../../cli/reporters/markdown.ts'
import type { Presentation } from '../../cli/reporters/reporter.ts'
import { sarifReporter } from '../../cli/reporters/sarif.ts'
import { tally } from '../../cli/reporters/text-fits.ts'
import { clearanceText, pictureWidth } from '../../cli/reporters/text-layout.ts'
import { textReporter } from '../../cli/reporters/text.ts'
import { hundredBuilds } from '../../shared/report/hundred-builds.ts'
import type { Report, Verdict } from '../../shared/report/report.ts'
import { boxedNotes } from '../support/boxed-notes.ts'
import { checkText } from '../support/check-text.ts'

/*
 * The published schema: OASIS SARIF 2.1.0, rtm.5, as @microsoft/jest-sarif 1.0.0-beta.0 packs it (MIT). It is written in
 * draft 4 and uses nothing that later drafts read otherwise but the name of its own address.
 */
const {
  $schema: _,
  id: __,
  ...sarifSchema
} = JSON.parse(readFileSync(new URL('../reference/sarif-2.1.0-rtm.5.json', import.meta.url), 'utf8')) as Readonly<
  Record<string, unknown>
>
const ajv = new Ajv({ strict: false, unicodeRegExp: false })
ajv.addFormat('uri', (text: string) => URL.canParse(text))
ajv.addFormat(
  'uri-reference',
  (text: string) => /^[\w%.~:/?#[\]@!$&'()*+,;=-]*$/.test(text) && URL.canParse(text, 'file:///'),
)
ajv.addFormat('date-time', (text: string) => !Number.isNaN(Date.parse(text)))
const isSarif = ajv.compile(sarifSchema)

const presentation: Presentation = { units: null, isSingle: false, columns: 80, hasColour: false }
const failing = checkText(boxedNotes({ lidWall: 16 }), { fixes: true })

const hostile = [
  'plain',
  '"quoted" & <tagged> \'once\'',
  ']]> --> <!-- ?> <script>alert(1)</script>',
  'emoji 😀 and a lone \ud800 half',
  'right to left \u202eabc\u2066',
  'line\nbreak\r\nand\ttab',
  '\u0000\u0001\u001b[31mred\u001b[0m\u0007',
  '::error file=x::% %0A :, |table| `code` [link](x) @someone #1 *b* _i_ ~s~',
  'x'.repeat(300),
]

/** A failing report in which everything an author wrote is hostile. */
const withText = (text: string): Report => ({
  ...failing,
  title: text,
  set: text,
  file: text,
  verdicts: failing.verdicts.map((verdict): Verdict => ({
    ...verdict,
    message: text,
    subject: text,
    at: { ...verdict.at, file: text },
    fix: verdict.fix === null ? null : { ...verdict.fix, note: text },
  })),
  errors: [
    {
      code: 'unknown-key',
      message: text,
      hint: text,
      at: { file: text, line: 1, column: 1, endLine: 1, endColumn: 2, path: ['a'] },
    },
  ],
})

const texts = fc.oneof(fc.constantFrom(...hostile), fc.string({ unit: 'binary', maxLength: 60 }))

describe('JUnit', () => {
  it('is well-formed XML whatever authors write, and counts what it holds', () => {
    fc.assert(
      fc.property(texts, (text) => {
        const xml = junitReporter([withText(text), failing], presentation)
        expect(XMLValidator.validate(xml)).toBe(true)
      }),
    )
    const parsed = new XMLParser({ ignoreAttributes: false }).parse(junitReporter([failing], presentation)) as {
      testsuites: { testsuite: { testcase: unknown[]; '@_tests': string; '@_failures': string } }
    }
    const suite = parsed.testsuites.testsuite
    expect(Number(suite['@_tests'])).toBe(failing.verdicts.length)
    expect(suite.testcase.length).toBe(failing.verdicts.length)
    expect(Number(suite['@_failures'])).toBe(failing.summary.fail)
  })
})

describe('SARIF', () => {
  interface Log {
    readonly version: string
    readonly runs: readonly {
      readonly tool: { readonly driver: { readonly rules: readonly { readonly id: string }[] } }
      readonly results: readonly {
        readonly ruleId: string
        readonly level: string
        readonly kind: string
        readonly message: { readonly text: string }
        readonly partialFingerprints: Readonly<Record<string, string>>
        readonly locations: readonly {
          readonly physicalLocation: {
            readonly artifactLocation: { readonly uri: string }
            readonly region: {
              readonly startLine: number
              readonly startColumn: number
              readonly endLine: number
              readonly endColumn: number
            }
          }
        }[]
      }[]
    }[]
  }
  const logOf = (reports: readonly Report[]): Log => JSON.parse(sarifReporter(reports, presentation)) as Log

  it('is valid by the published schema whatever authors write', () => {
    fc.assert(
      fc.property(texts, (text) => {
        const log: unknown = JSON.parse(sarifReporter([withText(text), failing], presentation))
        expect(isSarif(log), JSON.stringify(isSarif.errors)).toBe(true)
      }),
      { numRuns: 40 },
    )
    expect(isSarif(JSON.parse(sarifReporter([], presentation)))).toBe(true)
    const log = JSON.parse(sarifReporter([failing], presentation)) as { runs: object[] }
    expect(isSarif({ ...log, runs: [{ ...log.runs[0], results: [{ ruleId: 'without a message' }] }] })).toBe(false)
  })

  it('keeps to what the schema leaves to words: kinds go with levels, rules are listed, regions run forwards', () => {
    fc.assert(
      fc.property(texts, (text) => {
        const log = logOf([withText(text)])
        expect(log.version).toBe('2.1.0')
        const [run] = log.runs
        const ids = new Set(run?.tool.driver.rules.map((rule) => rule.id))
        for (const result of run?.results ?? []) {
          // §3.27.10: a kind other than fail goes with level none.
          if (result.kind !== 'fail') expect(result.level).toBe('none')
          else expect(['error', 'warning', 'note']).toContain(result.level)
          expect(ids.has(result.ruleId) || result.ruleId === 'unknown-key').toBe(true)
          for (const { physicalLocation } of result.locations) {
            expect(() => decodeURIComponent(physicalLocation.artifactLocation.uri)).not.toThrow()
            expect(physicalLocation.artifactLocation.uri).not.toMatch(/[\s<>"]/)
            const { startLine, startColumn, endLine, endColumn } = physicalLocation.region
            expect(startLine >= 1 && startColumn >= 1 && endLine >= startLine && endColumn >= 1).toBe(true)
          }
        }
      }),
      { numRuns: 30 },
    )
  })

  it('gives one fingerprint to one verdict wherever its line moves', () => {
    const moved = checkText(`# a comment\n\n${boxedNotes({ lidWall: 16 })}`)
    const prints = (report: Report): readonly string[] =>
      (logOf([report]).runs[0]?.results ?? []).map((result) => result.partialFingerprints['foldgauge/v1'] ?? '')
    expect(prints(moved)).toEqual(prints({ ...failing, file: 'set.yaml' }))
    expect(new Set(prints(failing)).size).toBe(prints(failing).length)
  })
})

describe('workflow annotations', () => {
  it('are one line each, escaped, and at most ten of a kind', () => {
    fc.assert(
      fc.property(texts, (text) => {
        const lines = githubReporter([withText(text), withText(text), withText(text)], presentation)
          .split('\n')
          .filter((line) => line !== '')
        for (const line of lines) expect(line).toMatch(/^::(?:error|warning) [^\r\n]*::[^\r\n]*$/)
        for (const kind of ['error', 'warning'])
          expect(lines.filter((line) => line.startsWith(`::${kind} `)).length).toBeLessThanOrEqual(10)
      }),
    )
  })

  it('say how many more there are', () => {
    expect(
      githubReporter(
        Array.from({ length: 8 }, () => failing),
        presentation,
      ),
    ).toMatch(/and \d+ more; the full report lists them all/)
  })
})

describe('Markdown', () => {
  it('lets no text become markup, a mention or a row of its own', () => {
    fc.assert(
      fc.property(texts, (text) => {
        const out = markdownReporter([withText(text)], presentation)
        expect(out).not.toMatch(/<script|<!--|(?<!&#64;)@someone|\u001b/)
        for (const row of out
          .split('\n')
          .filter((line) => line.startsWith('| ') && !line.startsWith('| fit') && !line.startsWith('| ---'))) {
          expect(row.replaceAll('\\|', '').split('|').length).toBe(10)
        }
      }),
    )
  })
})

describe('the text an author reads', () => {
  it('shows no control character of anyone else', () => {
    fc.assert(
      fc.property(texts, (text) => {
        for (const character of textReporter([withText(text)], presentation))
          expect(
            character === '\n' || (character >= ' ' && !/[\u007f-\u009f\u202a-\u202e\u2066-\u2069]/.test(character)),
          ).toBe(true)
      }),
      { numRuns: 30 },
    )
  })

  it.each([64, 80, 120, 200])('keeps within a terminal of %i columns, but for the places it names', (columns) => {
    for (const units of ['mm', 'in'] as const) {
      const lines = textReporter([failing], { ...presentation, columns, units }).split('\n')
      expect(lines.filter((line) => line.length > columns && !line.startsWith(`${failing.file}:`))).toEqual([])
    }
  })

  it.each([60, 80, 120, 200])('sets figures and pictures under one another in %i columns', (columns) => {
    for (const units of ['mm', 'in'] as const) {
      const rows = textReporter([failing], { ...presentation, columns, units })
        .split('\n')
        .filter((line) => line.includes(' wants '))
      expect(rows.length).toBe(failing.fits.flatMap((fit) => fit.axes).length)
      expect(new Set(rows.map((row) => row.indexOf(' wants '))).size).toBe(1)
      expect(new Set(rows.map((row) => row.length)).size).toBe(1)
    }
  })

  it('says the verdict last', () => {
    const lines = textReporter([failing], presentation).trimEnd().split('\n')
    expect(lines.at(-1)).toMatch(/^FAILS boxed-notes: .*\.$/)
  })

  it('has no colour that is the only sign of anything', () => {
    const painted = textReporter([failing], { ...presentation, hasColour: true })
    expect(painted.replaceAll(/\u001b\[\d+m/g, '')).toBe(textReporter([failing], presentation))
    expect(painted).not.toBe(textReporter([failing], presentation))
  })
})

describe('the picture of a hundred builds', () => {
  const shares = fc.tuple(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }))

  it('has a mark for each so many builds and leaves out nothing that happens', () => {
    fc.assert(
      fc.property(shares, fc.constantFrom(1, 2, 4, 5, 10), ([one, other], perMark) => {
        const [binds, rattles] = [one, other * (1 - one)]
        const picture = tally({ binds, rattles }, perMark)
        expect(picture.length).toBe(pictureWidth(perMark))
        const builds = hundredBuilds(binds, rattles)
        const count = (mark: string): number => picture.split(mark).length - 1
        expect(count('x') + count('|') + count('o')).toBe(100 / perMark)
        for (const [mark, share] of [
          ['x', builds.binds],
          ['|', builds.goes],
          ['o', builds.rattles],
        ] as const) {
          expect(count(mark) > 0).toBe(share > 0)
          if (perMark === 1) expect(count(mark)).toBe(share)
        }
      }),
    )
  })
})

describe('a clearance beside its requirement', () => {
  const axis = (nominal: number, min: number) => ({
    clearance: { nominal, min: nominal, max: nominal, sigma: 0, sources: [] },
    required: { min, max: null },
  })

  it('lines up its decimals', () => {
    expect(clearanceText(axis(7.8, 0.5), 'mm')).toBe('7.80 mm')
    expect(clearanceText(axis(25.4, 0.5), 'in')).toBe('1.000 in')
    expect(clearanceText(axis(-0.0004, 0.5), 'mm')).toBe('0.00 mm')
  })

  it('shows more of them where it would look like a bound that it misses', () => {
    expect(clearanceText(axis(0.1987, 0.2), 'mm')).toBe('0.199 mm')
    expect(clearanceText(axis(0.19999, 0.2), 'mm')).toBe('0.199990 mm')
    expect(clearanceText(axis(0.2, 0.2), 'mm')).toBe('0.20 mm')
  })
})

describe('JSON', () => {
  it('is one object or an array', () => {
    expect(JSON.parse(jsonReporter([failing], { ...presentation, isSingle: true }))).toEqual(failing)
    expect(JSON.parse(jsonReporter([failing], presentation))).toEqual([failing])
  })
})
