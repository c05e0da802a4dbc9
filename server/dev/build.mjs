// Builds what is older than its sources.
import { existsSync, readdirSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { root, runStep } from './steps.mjs'

function newest(path) {
  if (!existsSync(path)) return 0
  const stats = statSync(path)
  if (!stats.isDirectory()) return stats.mtimeMs
  return Math.max(0, ...readdirSync(path).map((name) => newest(join(path, name))))
}

const isStale = (built, sources) => {
  const target = join(root, built)
  if (!existsSync(target)) return true
  return Math.max(...sources.map((source) => newest(join(root, source)))) > statSync(target).mtimeMs
}

export function buildCommandLine() {
  if (
    !isStale('dist/cli/foldgauge.js', [
      'cli',
      'shared',
      'server/dev/keep-compiled.ts',
      'vite.config.ts',
      'package-lock.json',
    ])
  )
    return
  runStep('Building the command line', process.execPath, [
    'node_modules/vite/bin/vite.js',
    'build',
    '--ssr',
    '--logLevel',
    'warn',
  ])
}
