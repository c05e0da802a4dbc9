import { spawnSync } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'

const root = fileURLToPath(new URL('../../', import.meta.url))

describe('the report shown in the README', () => {
  it('is what the command beside it prints', () => {
    const shown = /<!-- example:start -->\n```\n\$ foldgauge (.*)\n([\s\S]*?)```\n<!-- example:end -->/.exec(
      readFileSync(`${root}README.md`, 'utf8'),
    )
    const words = (shown?.[1] ?? '').split(' ')
    const { stdout } = spawnSync(
      process.execPath,
      [`${root}dist/cli/foldgauge.js`, ...words, '--as-of', '2026-12-01'],
      { cwd: `${root}shared/demo`, encoding: 'utf8' },
    )
    expect(shown?.[2]).toBe(stdout)
  })
})
