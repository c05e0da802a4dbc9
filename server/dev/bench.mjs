// npm run bench: speed as ratios, all measured in one run.
import { buildCommandLine } from './build.mjs'
import { installNodePackages } from './node-packages.mjs'
import { requireNode, runStep } from './steps.mjs'

requireNode()
installNodePackages()
buildCommandLine()
runStep('Building the bench', process.execPath, [
  'node_modules/vite/bin/vite.js',
  'build',
  '--ssr',
  '--mode',
  'bench',
  '--logLevel',
  'warn',
])
runStep('Measuring', process.execPath, ['--expose-gc', 'dist/bench/bench.js'], { stdio: 'inherit' })
