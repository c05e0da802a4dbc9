import { execFileSync, spawn, spawnSync } from 'node:child_process'
import {
  chmodSync,
  lstatSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { writeWhole } from '../../../cli/inputs/write-file.ts'
import { boxedNotes } from '../../support/boxed-notes.ts'

const binary = fileURLToPath(new URL('../../../dist/cli/foldgauge.js', import.meta.url))
let folder = ''
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'foldgauge-write-'))
})
afterEach(() => {
  rmSync(folder, { recursive: true, force: true })
})

const withSet = (): string => {
  writeFileSync(join(folder, 'notes.yaml'), boxedNotes())
  return folder
}

describe('writing a file', () => {
  it('makes the folders it needs and leaves nothing beside it', () => {
    writeWhole(join(folder, 'reports', 'deep', 'a.json'), 'new')
    expect(readFileSync(join(folder, 'reports', 'deep', 'a.json'), 'utf8')).toBe('new')
    expect(readdirSync(join(folder, 'reports', 'deep'))).toEqual(['a.json'])
  })

  it('keeps the permissions of the file it replaces', () => {
    const file = join(folder, 'set.yaml')
    writeFileSync(file, 'old')
    chmodSync(file, 0o640)
    writeWhole(file, 'new')
    expect([readFileSync(file, 'utf8'), statSync(file).mode & 0o777]).toEqual(['new', 0o640])
  })

  it('follows a link and leaves it a link', () => {
    mkdirSync(join(folder, 'elsewhere'))
    writeFileSync(join(folder, 'elsewhere', 'real.json'), 'old')
    symlinkSync(join('elsewhere', 'real.json'), join(folder, 'link.json'))
    writeWhole(join(folder, 'link.json'), 'new')
    expect(lstatSync(join(folder, 'link.json')).isSymbolicLink()).toBe(true)
    expect(readFileSync(join(folder, 'elsewhere', 'real.json'), 'utf8')).toBe('new')
  })

  it('writes into a pipe and never puts a file in its place', async () => {
    const pipe = join(folder, 'pipe')
    execFileSync('mkfifo', [pipe])
    const reader = spawn('cat', [pipe])
    let read = ''
    reader.stdout.on('data', (chunk: Buffer) => (read += chunk.toString()))
    const ended = new Promise((fulfil) => reader.once('close', fulfil))
    writeWhole(pipe, 'through')
    await ended
    expect(read).toBe('through')
    expect(lstatSync(pipe).isFIFO()).toBe(true)
  })

  it('writes into an open file that has no path, and leaves the link to it', () => {
    // As /dev/stdout is in a pipeline; a link of our own, so that no mistake here can harm the machine.
    const { stdout } = spawnSync(
      'bash',
      [
        '--norc',
        '-c',
        `ln -s /proc/self/fd/1 out; "${process.execPath}" "${binary}" check notes.yaml --report json=out | head -c 4`,
      ],
      { cwd: withSet(), encoding: 'utf8' },
    )
    expect(stdout).toBe('[\n  ')
    expect(lstatSync(join(folder, 'out')).isSymbolicLink()).toBe(true)
  })

  it('writes to where a link points though nothing is there yet', () => {
    symlinkSync('later.json', join(folder, 'link.json'))
    writeWhole(join(folder, 'link.json'), 'new')
    expect(lstatSync(join(folder, 'link.json')).isSymbolicLink()).toBe(true)
    expect(readFileSync(join(folder, 'later.json'), 'utf8')).toBe('new')
  })

  it('writes into a device and never puts a file in its place', (context) => {
    const device = join(folder, 'full')
    // The device that is always full, made anew: only root may.
    if (spawnSync('mknod', [device, 'c', '1', '7']).status !== 0) context.skip()
    expect(() => writeWhole(device, 'x')).toThrow(/was not written: the disk is full/)
    expect(statSync(device).isCharacterDevice()).toBe(true)
  })

  it('tells why it could not, and leaves what was there', () => {
    mkdirSync(join(folder, 'taken'))
    expect(() => writeWhole(join(folder, 'taken'), 'x')).toThrow(/was not written: there is a folder of that name/)
    writeFileSync(join(folder, 'file'), 'old')
    expect(() => writeWhole(join(folder, 'file', 'deeper'), 'x')).toThrow(/a part of the path is a file/)
    expect(readdirSync(folder).toSorted()).toEqual(['file', 'taken'])
  })
})
