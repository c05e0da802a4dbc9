import { spawnSync } from 'node:child_process'
import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'
import { boxedNotes } from '../support/boxed-notes.ts'

const binary = fileURLToPath(new URL('../../dist/cli/foldgauge.js', import.meta.url))
const folder = mkdtempSync(join(tmpdir(), 'foldgauge-streams-'))
writeFileSync(join(folder, 'notes.yaml'), boxedNotes())
afterAll(() => {
  rmSync(folder, { recursive: true, force: true })
})

/** Runs a shell line in which `foldgauge` is the built command line. */
const shell = (line: string, env: Readonly<Record<string, string>> = {}) =>
  spawnSync('bash', ['--norc', '-c', `foldgauge() { "${process.execPath}" "${binary}" "$@"; }; ${line}`], {
    cwd: folder,
    encoding: 'utf8',
    env: { PATH: process.env['PATH'], ...env },
  })

describe('standard streams that fail', () => {
  it.runIf(existsSync('/dev/full'))('say in one line that the disk is full', () => {
    const { status, stderr } = shell('foldgauge check notes.yaml > /dev/full')
    expect(stderr).toBe('foldgauge: standard output was not written: the disk is full\n')
    expect(status).toBe(2)
  })

  it.runIf(existsSync('/dev/full'))('keep the exit code where messages cannot be told', () => {
    expect(shell('foldgauge check absent.yaml 2> /dev/full').status).toBe(2)
  })

  it('keep the exit code where nobody reads', () => {
    const { stdout, stderr } = shell('foldgauge check absent.yaml 2>&1 > /dev/null | true; echo "${PIPESTATUS[0]}"')
    expect([stdout, stderr]).toEqual(['2\n', ''])
  })
})
