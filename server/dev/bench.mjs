// npm run bench: speed as ratios, all measured in one run.
import { buildCommandLine } from './build.mjs'
import { installNodePackages } from './node-packages.mjs'
import { requireNode, runStep } from './steps.mjs'

requireNode()
installNodePackages()
buildCommandLine()
runStep('Measuring', process.execPath, ['--expose-gc', '--import', 'tsx', 'tests/bench/bench.ts'], { stdio: 'inherit' })
