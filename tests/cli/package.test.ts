import { execFileSync } from 'node:child_process'
import { mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, expect, it } from 'vitest'

const root = fileURLToPath(new URL('../../', import.meta.url))
const home = mkdtempSync(join(tmpdir(), 'foldgauge-package-'))
afterAll(() => {
  rmSync(home, { recursive: true, force: true })
})

const quiet = { encoding: 'utf8' as const, stdio: ['ignore', 'pipe', 'pipe'] as ['ignore', 'pipe', 'pipe'] }

it('packs a command line that installs alone in an empty folder and does its work there', () => {
  execFileSync('npm', ['pack', '--ignore-scripts', '--silent', '--pack-destination', home], { ...quiet, cwd: root })
  const [archive = ''] = readdirSync(home).filter((name) => name.endsWith('.tgz'))
  execFileSync(
    'npm',
    [
      'install',
      '--silent',
      '--no-audit',
      '--no-fund',
      '--offline',
      '--prefix',
      join(home, 'there'),
      join(home, archive),
    ],
    quiet,
  )
  expect(readdirSync(join(home, 'there', 'node_modules')).filter((name) => !name.startsWith('.'))).toEqual([
    'foldgauge',
  ])
  const run = (...words: readonly string[]): string =>
    execFileSync(join(home, 'there', 'node_modules', '.bin', 'foldgauge'), [...words], {
      ...quiet,
      cwd: join(home, 'there'),
    })
  expect(run('--version')).toContain('foldgauge 1.')
  run('init', 'work', '--card', '148 x 105')
  expect(run('check', 'work/sets')).toContain('PASSES')
  run('export', 'work/sets', '--to', 'out', '--format', 'pdf,svg,dxf,steps')
  expect(readdirSync(join(home, 'there', 'out')).length).toBeGreaterThan(0)
}, 120_000)
