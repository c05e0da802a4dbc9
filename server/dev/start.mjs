// npm start: installs what is missing, builds, and runs the main job on the demo workspace.
import { spawnSync } from 'node:child_process'
import { join } from 'node:path'
import { buildCommandLine } from './build.mjs'
import { installNodePackages } from './node-packages.mjs'
import { requireNode, root } from './steps.mjs'

requireNode()
installNodePackages()
buildCommandLine()

const demo = join(root, 'shared', 'demo')
const check = spawnSync(process.execPath, [join(root, 'dist/cli/foldgauge.js'), 'check'], {
  cwd: demo,
  stdio: 'inherit',
})
console.error(`
That was the demo workspace in shared/demo. Next, see a lid that no longer clears its box:
  npm run -s foldgauge -- check shared/demo/failing`)
process.exitCode = check.status ?? 1
