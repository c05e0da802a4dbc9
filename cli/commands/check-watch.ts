import { watch } from 'node:fs'
import { dirname } from 'node:path'
import type { SetInput } from '../inputs/find-sets.ts'
import { forgetWorkspaces } from '../inputs/find-workspace.ts'
import { UsageError, type Io } from '../io.ts'

/** Editors write a file in several strokes; a round waits until they have been still for so long, in milliseconds. */
const stillness = 40

const folderOf = (input: SetInput): string => input.found.folder ?? dirname(input.path ?? '.')

/**
 * Runs a round now and again after every save, until it is interrupted. A half-written file is a report like any other:
 * the next save replaces it. Nothing is read between saves.
 */
export async function watchSets(io: Io, inputs: readonly SetInput[], round: () => Promise<void>): Promise<never> {
  const folders = new Set(inputs.filter((input) => input.path !== null).map(folderOf))
  if (folders.size === 0) throw new UsageError('--watch needs files; standard input is read once')
  let timer: ReturnType<typeof setTimeout> | null = null
  let running = Promise.resolve()
  const again = async (): Promise<void> => {
    forgetWorkspaces()
    const from = performance.now()
    try {
      await round()
      io.err(`Checked in ${String(Math.round(performance.now() - from))} ms; waiting for a save. Ctrl-C ends.\n`)
    } catch (error) {
      // A file may be gone for a moment while an editor puts the new one in its place.
      io.err(`${error instanceof Error ? error.message : String(error)}; waiting for the next save.\n`)
    }
  }
  await again()
  for (const folder of folders) {
    watch(folder, { recursive: true }, (_event, name) => {
      if (name === null || !/\.ya?ml$/.test(name)) return
      if (timer !== null) clearTimeout(timer)
      timer = setTimeout(() => {
        running = running.then(again)
      }, stillness)
    })
  }
  return new Promise<never>(() => undefined)
}
