import { spawn, spawnSync } from 'node:child_process'
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'
import { boxedNotes } from '../support/boxed-notes.ts'

const binary = fileURLToPath(new URL('../../dist/cli/foldgauge.js', import.meta.url))
const home = mkdtempSync(join(tmpdir(), 'foldgauge-terminal-'))
afterAll(() => {
  rmSync(home, { recursive: true, force: true })
})

/** A folder with so many sets. */
function folderOf(name: string, count: number): string {
  const folder = join(home, name)
  mkdirSync(folder, { recursive: true })
  for (let index = 0; index < count; index += 1) {
    writeFileSync(
      join(folder, `set-${String(index)}.yaml`),
      boxedNotes().replace('set: boxed-notes', `set: notes-${String(index)}`),
    )
  }
  return folder
}

/** Runs a shell line on a pseudo-terminal, where both streams are one. */
function onTerminal(
  line: string,
  folder: string,
  env: Readonly<Record<string, string>> = {},
): { readonly text: string; readonly status: number | null } {
  const result = spawnSync('script', ['-qec', line, '/dev/null'], {
    cwd: folder,
    encoding: 'utf8',
    env: { PATH: process.env['PATH'], TERM: 'xterm', ...env },
  })
  return { text: result.stdout, status: result.status }
}

const escape = '\u001b['

describe('on a terminal', () => {
  const one = folderOf('one', 1)
  const check = `${process.execPath} ${binary} check set-0.yaml`

  it('colours what it says', () => {
    const { text, status } = onTerminal(check, one)
    expect(status).toBe(0)
    expect(text).toContain(escape)
    expect(text).toContain('PASSES')
  })

  it.each([{ NO_COLOR: '1' }, { TERM: 'dumb' }])('does not with %o', (env) => {
    const { text } = onTerminal(check, one, env)
    expect(text).toContain('PASSES')
    expect(text).not.toContain(escape)
  })

  it('writes no colour into files', () => {
    onTerminal(`${check} --report text=kept.txt --report json`, one)
    const kept = readFileSync(join(one, 'kept.txt'), 'utf8')
    expect(kept).toContain('PASSES')
    expect(kept).not.toContain(escape)
  })

  it.each([80, 120])('keeps within %i columns', (columns) => {
    const { text } = onTerminal(`stty cols ${String(columns)}; ${check}`, one, { NO_COLOR: '1' })
    const widths = text.split(/\r?\n/).map((line) => (line.startsWith('set-0.yaml:') ? 0 : line.length))
    expect(Math.max(...widths)).toBeLessThanOrEqual(columns)
    expect(Math.max(...widths)).toBeGreaterThan(columns - 30)
  })

  it('counts sets while many are checked, and not through a pipe', () => {
    const many = folderOf('many', 25)
    const all = `${process.execPath} ${binary} check .`
    expect(onTerminal(all, many).text).toMatch(/\d+ of 25/)
    const piped = spawnSync(process.execPath, [binary, 'check', '.'], { cwd: many, encoding: 'utf8' })
    expect(piped.stderr).toBe('')
    expect(piped.stdout).not.toContain(escape)
  })
})

describe('through a pipe', () => {
  it('is whole beyond what a pipe holds', () => {
    const many = folderOf('large', 30)
    const result = spawnSync(process.execPath, [binary, 'check', '.', '--report', 'json'], {
      cwd: many,
      encoding: 'utf8',
      maxBuffer: 256 * 1024 * 1024,
    })
    expect(result.stdout.length).toBeGreaterThan(500_000)
    expect((JSON.parse(result.stdout) as unknown[]).length).toBe(30)
  })

  it('does not complain when its reader has seen enough', () => {
    const many = folderOf('cut-short', 20)
    const result = spawnSync(
      'bash',
      ['-c', `set -o pipefail; ${process.execPath} ${binary} check . --report json | head -c 100 > /dev/null`],
      { cwd: many, encoding: 'utf8' },
    )
    expect(result.stderr).toBe('')
  })
})

describe('watching', () => {
  it('judges again after a save, survives a half-written file, and ends when interrupted', async () => {
    const folder = folderOf('watched', 1)
    const file = join(folder, 'set-0.yaml')
    const child = spawn(process.execPath, [binary, 'check', 'set-0.yaml', '--watch'], { cwd: folder })
    let out = ''
    let err = ''
    child.stdout.on('data', (chunk: Buffer) => (out += chunk.toString()))
    child.stderr.on('data', (chunk: Buffer) => (err += chunk.toString()))
    const until = async (isDone: () => boolean): Promise<void> => {
      for (let wait = 0; wait < 400 && !isDone(); wait += 1) await new Promise((resolve) => setTimeout(resolve, 50))
      if (!isDone()) throw new Error(`waited in vain; standard output:\n${out}\nstandard error:\n${err}`)
    }
    const rounds = (): number => err.split('Checked in').length - 1
    try {
      await until(() => rounds() === 1)
      const good = readFileSync(file, 'utf8')
      writeFileSync(file, good.slice(0, good.length / 2 + 7))
      await until(() => rounds() >= 2)
      writeFileSync(file, good.replace('wall: 14', 'wall: 16'))
      await until(() => out.includes('FAILS'))
    } finally {
      child.kill('SIGINT')
      await new Promise((resolve) => child.once('exit', resolve))
    }
    expect(err).not.toMatch(/\n\s+at /)
  }, 60_000)
})
