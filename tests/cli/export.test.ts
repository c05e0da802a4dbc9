import {
  chmodSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import type { Io } from '../../cli/io.ts'
import { run } from '../../cli/run.ts'
import { writeAll } from '../../cli/inputs/write-files.ts'
import { boxedNotes } from '../support/boxed-notes.ts'

let folder = ''
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'foldgauge-'))
})
afterEach(() => {
  rmSync(folder, { recursive: true, force: true })
})

interface Outcome {
  readonly code: number
  readonly out: string
  readonly err: string
}

async function call(...words: readonly string[]): Promise<Outcome> {
  const [out, err]: [string[], string[]] = [[], []]
  const io: Io = {
    cwd: folder,
    env: {},
    today: () => '2026-12-01',
    out: (text) => void out.push(text),
    err: (text) => void err.push(text),
    terminal: { isTerminal: false, columns: null },
    showsProgress: false,
    readStandardInput: () => Promise.resolve(''),
  }
  const code = await run(words, io)
  return { code, out: out.join(''), err: err.join('') }
}

const passing = (): void => {
  writeFileSync(join(folder, 'notes.yaml'), boxedNotes())
}
const failing = (): void => {
  writeFileSync(join(folder, 'notes.yaml'), boxedNotes({ lidWall: 15 }))
}
const written = (): readonly string[] =>
  existsSync(join(folder, 'out')) ? readdirSync(join(folder, 'out')).toSorted() : []

describe('foldgauge export', () => {
  it('writes a PDF by default and tells where', async () => {
    passing()
    const { code, out, err } = await call('export', 'notes.yaml', '--to', 'out')
    expect([code, err]).toEqual([0, ''])
    expect(written()).toHaveLength(1)
    expect(out.trim()).toBe(join(folder, 'out', written()[0] ?? ''))
    expect(
      readFileSync(join(folder, 'out', written()[0] ?? ''))
        .subarray(0, 5)
        .toString(),
    ).toBe('%PDF-')
  })

  it('writes every format asked for', async () => {
    passing()
    expect((await call('export', 'notes.yaml', '--to', 'out', '--format', 'pdf,svg,dxf,steps')).code).toBe(0)
    const kinds = new Set(written().map((name) => name.replace(/^.*\./, '')))
    expect(kinds).toEqual(new Set(['pdf', 'svg', 'dxf', 'html', 'md', 'txt']))
  })

  it('writes one piece, operations apart, and refuses a piece there is not', async () => {
    passing()
    expect(
      (await call('export', 'notes.yaml', '--to', 'out', '--format', 'svg', '--piece', 'lid', '--separate')).code,
    ).toBe(0)
    expect(written().every((name) => name.includes('-lid-'))).toBe(true)
    expect(written().some((name) => name.includes('-cut-'))).toBe(true)
    const { code, err } = await call('export', 'notes.yaml', '--to', 'out', '--piece', 'lidd')
    expect(code).toBe(2)
    expect(err).toContain('Did you mean lid?')
  })

  it('replaces a file only where it is told to', async () => {
    passing()
    await call('export', 'notes.yaml', '--to', 'out')
    const name = join(folder, 'out', written()[0] ?? '')
    writeFileSync(name, 'mine')
    const { code, err } = await call('export', 'notes.yaml', '--to', 'out')
    expect(code).toBe(2)
    expect(err).toContain('is there already')
    expect(err).toContain('--force')
    expect(readFileSync(name, 'utf8')).toBe('mine')
    expect((await call('export', 'notes.yaml', '--to', 'out', '--force')).code).toBe(0)
    expect(readFileSync(name).length).toBeGreaterThan(1000)
  })

  it('refuses a set that fails, naming why, unless it may be stamped DRAFT', async () => {
    failing()
    const { code, err } = await call('export', 'notes.yaml', '--to', 'out')
    expect(code).toBe(1)
    expect(err).toMatch(/^notes\.yaml:\d+:\d+: /)
    expect(err).toContain('--even-if-failing')
    expect(written()).toEqual([])
    expect((await call('export', 'notes.yaml', '--to', 'out', '--even-if-failing', '--format', 'steps')).code).toBe(0)
    expect(readFileSync(join(folder, 'out', written().find((name) => name.endsWith('.txt')) ?? ''), 'utf8')).toContain(
      'DRAFT: ',
    )
  })

  it('points at the line of a set it cannot read', async () => {
    writeFileSync(join(folder, 'notes.yaml'), boxedNotes().replace('blank:', 'blnk:'))
    const { code, err } = await call('export', 'notes.yaml', '--to', 'out')
    expect(code).toBe(2)
    expect(err).toMatch(/^notes\.yaml:\d+:\d+: /)
    expect(err).toContain('blank')
    expect(written()).toEqual([])
  })

  it('refuses sheets, formats and units it does not know, with what to write', async () => {
    passing()
    for (const [words, remedy] of [
      [['--sheet', 'a0'], '330x480mm'],
      [['--format', 'png'], 'pdf, svg, dxf, steps'],
      [['--units', 'feet'], 'mm, in'],
      [['--margin', 'wide'], 'such as'],
    ] as const) {
      const { code, err } = await call('export', 'notes.yaml', '--to', 'out', ...words)
      expect(code, err).toBe(2)
      expect(err).toContain(remedy)
    }
    expect((await call('export', 'notes.yaml')).err).toContain('--to')
  })
})

describe('writing files', () => {
  it('writes all of them or none', () => {
    const out = join(folder, 'out')
    mkdirSync(join(out, 'taken'), { recursive: true })
    const files = [
      { name: 'first.txt', content: 'a' },
      { name: 'taken', content: 'b' },
    ]
    expect(() => writeAll(out, files, true)).toThrow(/is a folder/)
    expect(readdirSync(out)).toEqual(['taken'])
  })

  it('refuses names that leave the folder, and two of one name', () => {
    for (const name of ['../x', 'a/b', '/etc/x', '.hidden', '..']) {
      expect(() => writeAll(folder, [{ name, content: 'x' }], true), name).toThrow(/leave the folder/)
    }
    expect(() =>
      writeAll(
        folder,
        [
          { name: 'a', content: '' },
          { name: 'a', content: '' },
        ],
        true,
      ),
    ).toThrow(/two exports/)
    expect(readdirSync(folder)).toEqual([])
  })

  it('says so where a part of the path is a file, and leaves nothing behind', () => {
    writeFileSync(join(folder, 'out'), 'a file')
    expect(() => writeAll(join(folder, 'out', 'deeper'), [{ name: 'a', content: 'x' }], false)).toThrow(
      /was not written: a part of the path is a file/,
    )
    expect(readdirSync(folder)).toEqual(['out'])
  })

  it.runIf(process.getuid?.() !== 0)('says so where the folder may not be written to', () => {
    const out = join(folder, 'out')
    mkdirSync(out)
    chmodSync(out, 0o500)
    expect(() => writeAll(out, [{ name: 'a', content: 'x' }], false)).toThrow(/you may not write there/)
    chmodSync(out, 0o700)
    expect(readdirSync(out)).toEqual([])
  })

  it.runIf(existsSync('/dev/full'))('leaves nothing half-written where the disk is full', () => {
    const out = join(folder, 'out')
    mkdirSync(out)
    writeFileSync(join(out, 'kept.txt'), 'kept')
    // The second file is written through a link to the device that is always full.
    symlinkSync('/dev/full', join(out, '.b.part'))
    const files = [
      { name: 'a', content: 'x' },
      { name: 'b', content: 'x' },
    ]
    expect(() => writeAll(out, files, false)).toThrow(/b was not written: the disk is full/)
    expect(readdirSync(out)).toEqual(['kept.txt'])
  })
})
