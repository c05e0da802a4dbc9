import { execFileSync } from 'node:child_process'
import { cpSync, mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'

const built = fileURLToPath(new URL('../../dist/cli/', import.meta.url))
const demo = fileURLToPath(new URL('../../shared/demo/', import.meta.url))
const home = mkdtempSync(join(tmpdir(), 'foldgauge-compiled-'))
const copy = join(home, 'cli')
cpSync(built, copy, { recursive: true })
afterAll(() => {
  rmSync(home, { recursive: true, force: true })
})

const compiled = readdirSync(join(copy, 'chunks')).filter((name) => name.endsWith('.compiled'))
const check = (folder: string): string =>
  execFileSync(process.execPath, [join(folder, 'foldgauge.js'), 'check', '--report', 'json', '--as-of', '2026-12-01'], {
    cwd: demo,
    encoding: 'utf8',
  })

describe('what Node compiled of the check ahead of time', () => {
  it('lies beside the chunk it belongs to', () => {
    expect(compiled).toHaveLength(1)
    expect(statSync(join(copy, 'chunks', compiled[0] ?? '')).size).toBeGreaterThan(100_000)
  })

  it.each(['another Node wrote it', 'it is missing'])('changes no report where %s', (how) => {
    const expected = check(built)
    for (const name of compiled) {
      const file = join(copy, 'chunks', name)
      if (how === 'it is missing') rmSync(file)
      else writeFileSync(file, Buffer.alloc(200_000, 7))
    }
    expect(check(copy)).toBe(expected)
  })
})
