import { execFileSync, spawnSync } from 'node:child_process'
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { boxedNotes } from '../support/boxed-notes.ts'

const binary = fileURLToPath(new URL('../../dist/cli/foldgauge.js', import.meta.url))
const home = mkdtempSync(join(tmpdir(), 'foldgauge-revisions-'))
const set = join(home, 'sets', 'notes.yaml')
const git = (...words: readonly string[]): string =>
  execFileSync('git', ['-c', 'user.name=Quill Fern', '-c', 'user.email=quill@quillfern.example', ...words], {
    cwd: home,
    encoding: 'utf8',
  })
const run = (...words: readonly string[]) =>
  spawnSync(process.execPath, [binary, ...words], { cwd: home, encoding: 'utf8' })

beforeAll(() => {
  mkdirSync(join(home, 'sets'))
  writeFileSync(set, boxedNotes())
  git('init', '--quiet', '--initial-branch=main')
  git('add', '.')
  git('commit', '--quiet', '--message', 'A lid that clears its box')
  writeFileSync(set, boxedNotes({ lidWall: 16 }))
})
afterAll(() => {
  rmSync(home, { recursive: true, force: true })
})

describe('comparing with a git revision', () => {
  it('tells what the work in hand breaks', () => {
    const { stdout, status } = run('compare', 'main:sets/notes.yaml', 'sets/notes.yaml')
    expect(status).toBe(1)
    expect(stdout).toContain('newly fails  lid-on-base:width')
    expect(stdout).toContain('compared with main:sets/notes.yaml')
  })

  it('gates a check on what got worse since', () => {
    expect(run('check', 'sets/notes.yaml', '--against', 'main:sets/notes.yaml', '--fail-on', 'regression').status).toBe(
      1,
    )
    git('commit', '--quiet', '--all', '--message', 'A lid that does not')
    expect(run('check', 'sets/notes.yaml', '--against', 'HEAD:sets/notes.yaml', '--fail-on', 'regression').status).toBe(
      0,
    )
    expect(
      run('check', 'sets/notes.yaml', '--against', 'HEAD~1:sets/notes.yaml', '--fail-on', 'regression').status,
    ).toBe(1)
  })

  it('says what git does not know', () => {
    const { stderr, status } = run('compare', 'main:sets/absent.yaml', 'sets/notes.yaml')
    expect(status).toBe(2)
    expect(stderr).toContain('git has no sets/absent.yaml at main')
  })
})
