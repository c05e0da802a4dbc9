import { existsSync, mkdtempSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import type { TestProject } from 'vitest/node'
import { stopPostgres } from '../../../server/dev/postgres.mjs'

declare module 'vitest' {
  export interface ProvidedContext {
    postgresFolder: string
  }
}

/** Names a folder in memory where test files that need a database start one together; stops it at the end. */
export default function setup(project: TestProject): () => Promise<void> {
  const folder = mkdtempSync(join(existsSync('/dev/shm') ? '/dev/shm' : '/tmp', 'foldgauge-test-'))
  project.provide('postgresFolder', folder)
  return async () => {
    await stopPostgres(folder)
    rmSync(folder, { recursive: true, force: true })
  }
}
