import { statSync } from 'node:fs'
import { basename, dirname, isAbsolute, join, relative, resolve } from 'node:path'
import { UsageError, type Io } from '../io.ts'
import { findWorkspaceFolder, workspaceAt, workspaceFile, type FoundWorkspace } from './find-workspace.ts'
import { readText } from './read-text.ts'

/** A set to judge: where it is, its text, and the workspace that holds for it. */
export interface SetInput {
  /** As it is reported: relative to where the command was called, or as given. */
  readonly file: string
  readonly path: string | null
  readonly text: string
  readonly found: FoundWorkspace
}

const statOf = (path: string): 'file' | 'folder' | null => {
  try {
    const stats = statSync(path)
    return stats.isDirectory() ? 'folder' : 'file'
  } catch {
    return null
  }
}

const isPattern = (word: string): boolean => /[*?[\]{}]/.test(word)

async function filesMatching(patterns: readonly string[], cwd: string): Promise<readonly string[]> {
  const { globSync } = await import('tinyglobby')
  return globSync([...patterns], {
    cwd,
    absolute: true,
    onlyFiles: true,
    ignore: ['**/node_modules/**'],
    expandDirectories: false,
  }).toSorted()
}

/** Set files of a folder: those its own workspace names, else every YAML file in it that is not a workspace. */
async function setsOfFolder(folder: string, word: string, io: Io): Promise<readonly string[]> {
  const home = findWorkspaceFolder(folder)
  if (home !== null && (home === folder || word === '.')) {
    const { workspace } = workspaceAt(folder, io.cwd)
    const files = await filesMatching(workspace.sets, home)
    if (files.length === 0) {
      throw new UsageError(
        `${relative(io.cwd, join(home, workspaceFile)) || workspaceFile} names no set: nothing matches ${workspace.sets.join(', ') || 'an empty list'}`,
        'Put set files there, or correct `sets:`.',
      )
    }
    return files
  }
  const files = (await filesMatching(['**/*.yaml', '**/*.yml'], folder)).filter(
    (file) => !file.endsWith(`/${workspaceFile}`),
  )
  if (files.length === 0) throw new UsageError(`no set in ${word}`, 'Looked for files ending in .yaml or .yml.')
  return files
}

async function filesOf(word: string, io: Io): Promise<readonly string[]> {
  if (word === '')
    throw new UsageError(
      'a path is empty',
      'A variable of the shell may hold nothing. Without any path the workspace here is judged.',
    )
  const path = resolve(io.cwd, word)
  const kind = statOf(path)
  if (kind === 'file' && basename(path) === workspaceFile)
    throw new UsageError(
      `${word} is a workspace, not a set`,
      `Name a set, or judge all of its sets: foldgauge check ${relative(io.cwd, dirname(path)) || '.'}`,
    )
  if (kind === 'file') return [path]
  if (kind === 'folder') return setsOfFolder(path, word, io)
  if (isPattern(word)) {
    const files = (await filesMatching([word], io.cwd)).filter((file) => !file.endsWith(`/${workspaceFile}`))
    if (files.length > 0) return files
    throw new UsageError(
      `nothing matches ${word}`,
      `Looked from ${io.cwd}. Quote the pattern so that the shell leaves it alone.`,
    )
  }
  throw new UsageError(
    `there is no file ${word}`,
    'Name a set, a folder or a pattern such as "sets/*.yaml"; without one the workspace here is judged.',
  )
}

/** Paths are shown relative to where the command was called, unless they lie elsewhere or were given whole. */
const shownPath = (path: string, word: string, cwd: string): string => {
  const near = relative(cwd, path)
  return isAbsolute(word) || near.startsWith('..') ? path : near
}

/** The sets that words on the command line name; without any, those of the workspace here. @throws UsageError */
export async function findSets(words: readonly string[], io: Io): Promise<readonly SetInput[]> {
  if (words.length === 0) {
    const home = findWorkspaceFolder(io.cwd)
    if (home === null)
      throw new UsageError(
        `there is no ${workspaceFile} here or above`,
        'Name a set file, or make a workspace with foldgauge init.',
      )
  }
  const inputs: SetInput[] = []
  const seen = new Set<string>()
  for (const word of words.length === 0 ? ['.'] : words) {
    if (word === '-') {
      inputs.push({
        file: 'standard-input',
        path: null,
        text: await io.readStandardInput(),
        found: workspaceAt(io.cwd, io.cwd),
      })
      continue
    }
    for (const path of await filesOf(word, io)) {
      if (seen.has(path)) continue
      seen.add(path)
      const file = shownPath(path, word, io.cwd)
      inputs.push({ file, path, text: readText(path, file), found: workspaceAt(dirname(path), io.cwd) })
    }
  }
  return inputs
}
