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

function build({ title, made, from, words = [] }) {
  if (!isStale(made, [...from, 'shared', 'vite.config.ts', 'package-lock.json'])) return
  runStep(title, process.execPath, ['node_modules/vite/bin/vite.js', 'build', '--logLevel', 'warn', ...words])
}

export function buildCommandLine() {
  build({
    title: 'Building the command line',
    made: 'dist/cli/foldgauge.js',
    from: ['cli', 'server/dev/keep-compiled.ts'],
    words: ['--ssr'],
  })
}

export function buildServer() {
  build({
    title: 'Building the server',
    made: 'dist/server/main.js',
    from: ['server'],
    words: ['--ssr', '--mode', 'server'],
  })
}

export function buildPage() {
  build({ title: 'Building the page', made: 'dist/page/index.html', from: ['src', 'public', 'index.html'] })
}
