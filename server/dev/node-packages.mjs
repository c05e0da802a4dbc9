// Installs the project's packages when they are missing or the lock file has changed. Works before node_modules exists.
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root, runStep } from './steps.mjs'

const stamp = join(root, 'node_modules', '.foldgauge-lock')

const lockDigest = () =>
  createHash('sha256')
    .update(readFileSync(join(root, 'package-lock.json')))
    .digest('hex')

export function installNodePackages() {
  const wanted = lockDigest()
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return
  runStep('Installing packages', 'npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'])
  writeFileSync(stamp, wanted)
}
