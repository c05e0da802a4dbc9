import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { resolveSide } from '../../cli/inputs/comparison-sides.ts'
import { UsageError, type Io } from '../../cli/io.ts'
import { boxedNotes } from '../support/boxed-notes.ts'
import { checkText } from '../support/check-text.ts'

const folder = mkdtempSync(join(tmpdir(), 'foldgauge-sides-'))
afterAll(() => {
  rmSync(folder, { recursive: true, force: true })
})

const io: Io = {
  cwd: folder,
  env: {},
  today: () => '2026-12-01',
  out: () => undefined,
  err: () => undefined,
  terminal: { isTerminal: false, columns: null },
  showsProgress: false,
  readStandardInput: () => Promise.resolve(''),
}
const resolveWord = (word: string) => resolveSide(io, word, { asOf: '2026-12-01' })

describe('what a set is compared with', () => {
  it('never passes an option to git in the place of a revision, so that no file is written over', () => {
    const git = (...words: readonly string[]): unknown => execFileSync('git', words, { cwd: folder, stdio: 'pipe' })
    git('init', '-q')
    writeFileSync(join(folder, 'notes.yaml'), boxedNotes())
    git('add', 'notes.yaml')
    git('-c', 'user.name=Quill', '-c', 'user.email=quill@example.org', 'commit', '-q', '-m', 'notes')
    const kept = join(folder, 'kept:notes.yaml')
    writeFileSync(kept, 'kept')
    expect(() => resolveWord('--output=kept:notes.yaml')).toThrow(UsageError)
    expect(readFileSync(kept, 'utf8')).toBe('kept')
    expect(resolveWord('HEAD:notes.yaml')).toHaveLength(1)
  })

  it.each(['pieces', 'summary', 'fits', 'verdicts', 'set'])('calls a report whose %s is gone no report', (key) => {
    const report = JSON.parse(JSON.stringify(checkText(boxedNotes()))) as Record<string, unknown>
    writeFileSync(join(folder, 'edited.json'), JSON.stringify({ ...report, [key]: null }))
    expect(() => resolveWord('edited.json')).toThrow('edited.json is not a Foldgauge report')
  })

  it('calls a report with an empty entry among its fits no report', () => {
    writeFileSync(join(folder, 'edited.json'), JSON.stringify({ ...checkText(boxedNotes()), fits: [null] }))
    expect(() => resolveWord('edited.json')).toThrow('edited.json is not a Foldgauge report')
  })
})
