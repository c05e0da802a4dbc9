// npm test: installs what is missing, builds, type-checks and runs every test.
import { spawnSync } from 'node:child_process'
import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { buildCommandLine } from './build.mjs'
import { installNodePackages } from './node-packages.mjs'
import { installDebianPackages, requireNode, root, runStep } from './steps.mjs'

requireNode()
// Revisions to compare with, a pseudo-terminal, other people's programs that read back what is exported, and the browser
// that pages are looked at in.
installDebianPackages([
  { name: 'git', files: ['/usr/bin/git', '/usr/local/bin/git'] },
  { name: 'bsdutils', files: ['/usr/bin/script'] },
  { name: 'qpdf', files: ['/usr/bin/qpdf'] },
  { name: 'poppler-utils', files: ['/usr/bin/pdftoppm'] },
  { name: 'chromium', files: ['/usr/bin/chromium'] },
])
installNodePackages()
buildCommandLine()
runStep('Checking types', process.execPath, ['node_modules/typescript/bin/tsc', '-p', 'tsconfig.json'])
runStep('Checking that shared code runs anywhere', process.execPath, [
  'node_modules/typescript/bin/tsc',
  '-p',
  'shared/tsconfig.json',
])

mkdirSync(join(root, '.data'), { recursive: true })
const tests = spawnSync(
  process.execPath,
  [
    'node_modules/vitest/vitest.mjs',
    'run',
    '--reporter=default',
    '--reporter=json',
    '--outputFile.json=.data/test-results.json',
    ...process.argv.slice(2),
  ],
  { cwd: root, stdio: ['ignore', 'inherit', 'inherit'], env: { ...process.env, NODE_ENV: 'test' } },
)
process.exitCode = tests.status ?? 1
