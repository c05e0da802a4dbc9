import { spawnSync } from 'node:child_process'
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'

const root = fileURLToPath(new URL('../../', import.meta.url))
const home = mkdtempSync(join(tmpdir(), 'foldgauge-count-'))
afterAll(() => {
  rmSync(home, { recursive: true, force: true })
})

/** Runs the test runner itself, and counts what it left behind. */
function countOf(name: string, files: Readonly<Record<string, string>>) {
  const folder = join(home, name)
  mkdirSync(folder)
  for (const [file, text] of Object.entries(files)) writeFileSync(join(folder, file), text)
  const results = join(folder, 'results.json')
  const run = spawnSync(
    process.execPath,
    [
      join(root, 'node_modules/vitest/vitest.mjs'),
      'run',
      '--root',
      folder,
      '--globals',
      '--reporter=json',
      `--outputFile=${results}`,
    ],
    { cwd: folder, encoding: 'utf8' },
  )
  return { ...count(results), run: run.status }
}

function count(results: string): { readonly status: number | null; readonly last: string | undefined } {
  const { status, stdout } = spawnSync(process.execPath, [join(root, '.ci/count.mjs'), results], { encoding: 'utf8' })
  return { status, last: stdout.trimEnd().split('\n').at(-1) }
}

const passing = "test('one', () => {})\ntest('two', () => {})\n"

describe('the count at the end of a CI run', () => {
  it('is what passed where all did', () => {
    expect(countOf('passing', { 'a.test.js': passing })).toEqual({ run: 0, status: 0, last: '2 passed, 0 failed' })
  })

  it('fails with a failing test', () => {
    const files = { 'a.test.js': passing, 'b.test.js': "test('wrong', () => { expect(1).toBe(2) })\n" }
    expect(countOf('failing', files)).toEqual({ run: 1, status: 1, last: '2 passed, 1 failed' })
  })

  it('counts a file that cannot be loaded as failed', () => {
    const files = { 'a.test.js': passing, 'b.test.js': "import './absent.js'\ntest('never', () => {})\n" }
    expect(countOf('broken', files)).toEqual({ run: 1, status: 1, last: '2 passed, 1 failed' })
  })

  it('leaves an error outside of any test to the run, which fails', () => {
    const files = {
      'a.test.js': `${passing}setTimeout(() => { throw new Error('late') })\ntest('waits', () => new Promise((done) => setTimeout(done, 50)))\n`,
    }
    expect(countOf('stray', files)).toEqual({ run: 1, status: 0, last: '3 passed, 0 failed' })
  })

  it('fails where no test ran, where a run was cut off and where there was none', () => {
    expect(countOf('empty', {})).toMatchObject({ run: 1, status: 1 })
    writeFileSync(join(home, 'cut.json'), '{ "numPassedTests": 12, ')
    expect(count(join(home, 'cut.json')).status).toBe(1)
    expect(count(join(home, 'absent.json')).status).toBe(1)
  })
})
