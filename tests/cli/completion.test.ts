import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'
import { commandEntries } from '../../cli/commands/command-registry.ts'
import { hasTool } from '../support/outside-tools.ts'

const binary = fileURLToPath(new URL('../../dist/cli/foldgauge.js', import.meta.url))
const folder = mkdtempSync(join(tmpdir(), 'foldgauge-completion-'))
writeFileSync(join(folder, 'notes.yaml'), '')
afterAll(() => {
  rmSync(folder, { recursive: true, force: true })
})

const call = (...words: readonly string[]): string =>
  spawnSync(process.execPath, [binary, ...words], { cwd: folder, encoding: 'utf8' }).stdout
const script = call('completion', 'bash')

/** What bash offers behind a line of words, the last of which is being written. */
function offered(...words: readonly string[]): readonly string[] {
  const line = ['foldgauge', ...words].map((word) => `'${word}'`).join(' ')
  const { stdout, stderr } = spawnSync(
    'bash',
    [
      '--norc',
      '-c',
      `${script}\nCOMP_WORDS=(${line}); COMP_CWORD=${String(words.length)}; _foldgauge; printf '%s\\n' "\${COMPREPLY[@]}"`,
    ],
    { cwd: folder, encoding: 'utf8' },
  )
  expect(stderr).toBe('')
  return stdout.split('\n').filter((word) => word !== '')
}

describe('completion in bash', () => {
  it('offers every command', () => {
    expect(offered('')).toEqual(commandEntries.map(({ name }) => name))
    expect(offered('ch')).toEqual(['check'])
  })

  it.each(commandEntries.map(({ name }) => name))('offers every option that %s --help tells', (name) => {
    const told = [...call(name, '--help').matchAll(/^ {2}(?:-\w, )?(--[a-z-]+)/gm)].map((match) => match[1])
    expect(told).toContain('--help')
    expect([...offered(name, '--')].toSorted()).toEqual(told.toSorted())
  })

  it('offers the values of an option and the words of an argument, and files elsewhere', () => {
    expect(offered('check', '--report', 'j')).toEqual(['json', 'junit'])
    expect(offered('compare', '--report', '')).toEqual(['text', 'json', 'markdown'])
    expect(offered('schema', '')).toEqual(['set', 'workspace', 'report'])
    expect(offered('explain', 'fit/cl')).toEqual(['fit/clearance'])
    expect(offered('check', 'no')).toEqual(['notes.yaml'])
    expect(offered('check', '--against', 'no')).toEqual(['notes.yaml'])
  })
})

describe.each(['zsh', 'fish'])('completion in %s', (shell) => {
  it('names every command', () => {
    const text = call('completion', shell)
    for (const { name } of commandEntries) expect(text).toContain(name)
  })

  it.runIf(hasTool(shell))('is a script the shell can read', () => {
    const { status, stderr } = spawnSync(shell, ['-n'], { input: call('completion', shell), encoding: 'utf8' })
    expect([status, stderr]).toEqual([0, ''])
  })
})
