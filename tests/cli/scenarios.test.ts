import { spawnSync } from 'node:child_process'
import { cpSync, existsSync, mkdtempSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'

/*
 * Each folder of tests/scenarios is a folder an author might stand in, with what is called there and what must come out:
 * `scenario.json` (args, optional input, env, exit), `stdout.txt` and `stderr.txt`. Run on the built binary through pipes.
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

describe('the built command line', () => {
  it('has scenarios', () => {
    expect(readdirSync(scenarios).length).toBeGreaterThanOrEqual(30)
  })

  it.each(readdirSync(scenarios).toSorted())('%s', (name) => {
    const source = join(scenarios, name)
    const scenario = JSON.parse(readFileSync(join(source, 'scenario.json'), 'utf8')) as Scenario
    const folder = join(home, name)
    cpSync(source, folder, { recursive: true, filter: (path) => !own.has(path.slice(source.length + 1)) })
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
      writeFileSync(join(source, 'stdout.txt'), out)
      writeFileSync(join(source, 'stderr.txt'), err)
    }
    expect(err).not.toMatch(/\n\s+at /)
    expect({ exit: result.status, err, out }).toEqual({
      exit: scenario.exit,
      err: readFileSync(join(source, 'stderr.txt'), 'utf8'),
      out: readFileSync(join(source, 'stdout.txt'), 'utf8'),
    })
    for (const file of scenario.writes ?? []) expect(existsSync(join(folder, file)), file).toBe(true)
  })
})
