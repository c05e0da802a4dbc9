import { spawnSync } from 'node:child_process'
import { cpSync, existsSync, mkdtempSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'

/*
 * Each folder of tests/scenarios is a folder an author might stand in, with what is called there and what must come out:
 * `scenario.json` (args, optional input, env, exit), `stdout.txt` and `stderr.txt`. Run on the built binary through pipes,
 * and on a pseudo-terminal.
 * To write the expected files anew: SCENARIOS=write npx vitest run tests/cli/scenarios.test.ts, then read the difference.
 */
interface Scenario {
  readonly args: readonly string[]
  readonly input?: string
  readonly env?: Readonly<Record<string, string>>
  readonly exit: number
  /** Files that must exist afterwards, or must not. */
  readonly writes?: readonly string[]
}

const scenarios = fileURLToPath(new URL('../scenarios/', import.meta.url))
const binary = fileURLToPath(new URL('../../dist/cli/foldgauge.js', import.meta.url))
const isWriting = process.env['SCENARIOS'] === 'write' && process.env['CI'] === undefined
const own = new Set(['scenario.json', 'stdout.txt', 'stderr.txt'])
const home = mkdtempSync(join(tmpdir(), 'foldgauge-scenarios-'))
afterAll(() => {
  rmSync(home, { recursive: true, force: true })
})

/** What differs from machine to machine. */
const settle = (text: string, folder: string): string =>
  text.replaceAll(folder, '<folder>').replaceAll(/sha256:[0-9a-f]{64}/g, 'sha256:<digest>')

const names = readdirSync(scenarios).toSorted()
const read = (name: string): Scenario =>
  JSON.parse(readFileSync(join(scenarios, name, 'scenario.json'), 'utf8')) as Scenario
const expected = (name: string, stream: string): string => readFileSync(join(scenarios, name, stream), 'utf8')
const quote = (word: string): string => `'${word.replaceAll("'", `'\\''`)}'`

/** A copy of the scenario's folder to run in. */
function setUp(name: string, way: string): { readonly scenario: Scenario; readonly folder: string } {
  const source = join(scenarios, name)
  const folder = join(home, way, name)
  cpSync(source, folder, { recursive: true, filter: (path) => !own.has(path.slice(source.length + 1)) })
  return { scenario: read(name), folder }
}

describe('the built command line', () => {
  it('has scenarios', () => {
    expect(readdirSync(scenarios).length).toBeGreaterThanOrEqual(30)
  })

  it.each(names)('%s', (name) => {
    const { scenario, folder } = setUp(name, 'piped')
    const result = spawnSync(process.execPath, [binary, ...scenario.args], {
      cwd: folder,
      input: scenario.input ?? '',
      encoding: 'utf8',
      maxBuffer: 64 * 1024 * 1024,
      env: { PATH: process.env['PATH'], ...scenario.env },
    })
    const out = settle(result.stdout, folder)
    const err = settle(result.stderr, folder)
    if (isWriting) {
      writeFileSync(join(scenarios, name, 'stdout.txt'), out)
      writeFileSync(join(scenarios, name, 'stderr.txt'), err)
    }
    expect(err).not.toMatch(/\n\s+at /)
    expect({ exit: result.status, err, out }).toEqual({
      exit: scenario.exit,
      err: expected(name, 'stderr.txt'),
      out: expected(name, 'stdout.txt'),
    })
    for (const file of scenario.writes ?? []) expect(existsSync(join(folder, file)), file).toBe(true)
  })
})

describe('the same on a pseudo-terminal of 80 columns without colour', () => {
  // What takes standard input is left out: there it would be the keyboard.
  it.each(names.filter((name) => read(name).input === undefined))('%s', (name) => {
    const { scenario, folder } = setUp(name, 'terminal')
    const line = [process.execPath, binary, ...scenario.args].map(quote).join(' ')
    const result = spawnSync(
      'script',
      ['-qec', `stty cols 80; ${line} 2> ${quote(join(home, 'err.txt'))}`, '/dev/null'],
      {
        cwd: folder,
        encoding: 'utf8',
        maxBuffer: 64 * 1024 * 1024,
        env: { PATH: process.env['PATH'], TERM: 'xterm', NO_COLOR: '1', ...scenario.env },
      },
    )
    expect({ exit: result.status, out: settle(result.stdout.replaceAll('\r\n', '\n'), folder) }).toEqual({
      exit: scenario.exit,
      out: expected(name, 'stdout.txt'),
    })
  })
})
