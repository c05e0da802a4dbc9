import { execFileSync, spawnSync } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'

const root = fileURLToPath(new URL('../../', import.meta.url))
const listed = execFileSync('git', ['ls-files', '--cached', '--others', '--exclude-standard'], {
  cwd: root,
  encoding: 'utf8',
}).split('\n')
const files = (pattern: RegExp): readonly string[] => listed.filter((file) => pattern.test(file))
const read = (file: string): string => readFileSync(`${root}/${file}`, 'utf8')
const withoutComments = (text: string): string =>
  text.replaceAll(/\/\*[\s\S]*?\*\//g, '').replaceAll(/(^|[^:'"`])\/\/.*$/gm, '$1')
const offenders = (pattern: RegExp, from: readonly string[]): readonly string[] =>
  from.filter((file) => pattern.test(withoutComments(read(file))))

describe('the layout', () => {
  it('keeps to its import directions and has no cycles', () => {
    const result = spawnSync(
      'node_modules/.bin/depcruise',
      [
        ...['cli', 'server', 'shared', 'src'].filter((folder) => existsSync(`${root}${folder}`)),
        '--config',
        '.dependency-cruiser.cjs',
      ],
      { cwd: root, encoding: 'utf8' },
    )
    expect(result.stdout).toContain('no dependency violations found')
  }, 120_000)

  it('keeps shared code pure: no input or output, clock, randomness, page or console', () => {
    const shared = files(/^shared\/.*\.ts$/)
    expect(shared.length).toBeGreaterThan(100)
    expect(
      offenders(
        /from 'node:|\bprocess\.|\bconsole\.|\bDate\.now\b|new Date\(\)|\bMath\.random\b|\bdocument\.(?:querySelector|getElement|createElement)|\bwindow\.(?:location|document|open)|\bsetTimeout\(/,
        shared,
      ),
    ).toEqual([])
  })

  it('names process in one file of the command line', () => {
    expect(offenders(/\bprocess\.(?:argv|env|exit|exitCode|stdin|stdout|stderr|cwd)/, files(/^cli\/.*\.ts$/))).toEqual([
      'cli/main.ts',
    ])
  })

  it('never ends a process early, which would cut what it prints', () => {
    expect(offenders(/process\.exit\(/, files(/^(?:cli|server\/(?!dev))\/.*\.ts$/))).toEqual([])
  })

  it('has no file longer than three hundred lines', () => {
    const long = files(/^(?:cli|server|shared|src)\/.*\.tsx?$/).filter(
      (file) => !file.includes('/migrations/') && read(file).split('\n').length > 301,
    )
    expect(long).toEqual([])
  })

  it('escapes the type checker nowhere', () => {
    expect(
      offenders(
        /\bas any\b|: any(?:[;)\]]| =)|@ts-(?:ignore|expect-error|nocheck)/,
        files(/^(?:cli|server|shared|src)\/.*\.tsx?$/),
      ),
    ).toEqual([])
  })

  it('has no barrels and no default exports', () => {
    expect(offenders(/export \* from/, files(/^(?:cli|server|shared|src)\/.*\.tsx?$/))).toEqual([])
    expect(offenders(/export default/, files(/^(?:cli|server|shared)\/.*\.ts$/))).toEqual([])
  })

  it('names no machine, no registry and no unfinished work', () => {
    const all = files(/\.(?:tsx?|mjs|cjs|js|md|yaml|json|html|css)$/).filter(
      (file) => file !== 'package-lock.json' && !file.startsWith('tests/architecture/'),
    )
    expect(
      offenders(
        /\bregistry\.\w+\.(?:org|com)|\bdeb\.\w+\.org|["'`\s]\/(?:work|root|home)\/\w|\bTODO\b|\bFIXME\b|lorem ipsum/i,
        all,
      ),
    ).toEqual([])
    expect(offenders(/\b(?:it|test|describe)\.(?:only|skip|todo)\b/, files(/^tests\/.*\.tsx?$/))).toEqual([])
  })
})
