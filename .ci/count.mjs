// Prints `N passed, N failed` from the test runner's own results; no results or no tests is a failure.
import { readFileSync } from 'node:fs'

let results
try {
  results = JSON.parse(readFileSync(process.argv[2], 'utf8'))
} catch {
  console.log('The tests left no results.')
  process.exit(1)
}
const passed = results.numPassedTests ?? 0
const broken = (results.testResults ?? []).filter(
  (file) => file.status === 'failed' && file.assertionResults.length === 0,
).length
const failed = (results.numFailedTests ?? 0) + broken
console.log(`${passed} passed, ${failed} failed`)
process.exit(failed === 0 && passed > 0 && results.success !== false ? 0 : 1)
