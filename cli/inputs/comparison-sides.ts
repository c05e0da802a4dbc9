import { spawnSync } from 'node:child_process'
import { existsSync, statSync } from 'node:fs'
import { dirname, join, relative, resolve } from 'node:path'
import { globSync } from 'tinyglobby'
import type { CheckOptions } from '../../shared/check-options.ts'
import { checkTemplate } from '../../shared/check-template.ts'
import type { Report } from '../../shared/report/report.ts'
import { emptyWorkspace, readWorkspace } from '../../shared/template/read-workspace.ts'
import { UsageError, type Io } from '../io.ts'
import { findWorkspaceFolder, workspaceAt, workspaceFile } from './find-workspace.ts'
import { readReports } from './read-reports.ts'
import { readText } from './read-text.ts'

type Judging = Omit<CheckOptions, 'file'>

const git = (
  cwd: string,
  words: readonly string[],
): { readonly ok: boolean; readonly text: string; readonly message: string } => {
  const result = spawnSync('git', [...words], { cwd, encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 })
  return { ok: result.status === 0, text: result.stdout ?? '', message: (result.stderr ?? '').trim() }
}

/** A set as it was at a git revision, judged with the workspace as it was then. */
function fromRevision(io: Io, word: string, revision: string, path: string, judging: Judging): readonly Report[] {
  // No revision begins with a hyphen; git would take the word for an option, and some of its options write files.
  if (revision.startsWith('-'))
    throw new UsageError(`${revision} is no git revision`, 'Write one such as main:sets/notes.yaml.')
  const top = git(io.cwd, ['rev-parse', '--show-toplevel'])
  if (!top.ok) throw new UsageError(`${word} names a git revision, but this folder is in no git repository`)
  const root = top.text.trim()
  const inRoot = path.startsWith('/') ? path.slice(1) : relative(root, resolve(io.cwd, path))
  const show = (file: string) => git(root, ['show', `${revision}:${file}`])
  const set = show(inRoot)
  if (!set.ok) throw new UsageError(`git has no ${inRoot} at ${revision}`, set.message)
  for (let folder = dirname(inRoot); ; folder = dirname(folder)) {
    const file = folder === '.' ? workspaceFile : join(folder, workspaceFile)
    const found = show(file)
    const workspace = found.ok ? readWorkspace(found.text, `${revision}:${file}`) : null
    if (workspace !== null || folder === '.')
      return [checkTemplate(set.text, workspace ?? emptyWorkspace(), { ...judging, file: `${revision}:${inRoot}` })]
  }
}

function fromFile(io: Io, path: string, shown: string, judging: Judging): readonly Report[] {
  const text = readText(path, shown)
  if (path.endsWith('.json')) return readReports(text, shown)
  return [checkTemplate(text, workspaceAt(dirname(path), io.cwd).workspace, { ...judging, file: shown })]
}

function fromFolder(io: Io, folder: string, judging: Judging): readonly Report[] {
  const home = findWorkspaceFolder(folder)
  const patterns = home === folder ? workspaceAt(folder, io.cwd).workspace.sets : ['**/*.yaml']
  const files = globSync([...patterns], { cwd: folder, absolute: true })
    .filter((file) => !file.endsWith(workspaceFile))
    .toSorted()
  if (files.length === 0) throw new UsageError(`no set in ${relative(io.cwd, folder) || '.'}`)
  return files.flatMap((file) => fromFile(io, file, relative(io.cwd, file), judging))
}

/** The reports a word names: a report file, a set, a folder of sets, or a set at a git revision. @throws UsageError */
export function resolveSide(io: Io, word: string, judging: Judging): readonly Report[] {
  const path = resolve(io.cwd, word)
  if (existsSync(path))
    return statSync(path).isDirectory() ? fromFolder(io, path, judging) : fromFile(io, path, word, judging)
  const revision = /^([^:]+):(.+)$/.exec(word)
  if (revision !== null) return fromRevision(io, word, revision[1] ?? '', revision[2] ?? '', judging)
  throw new UsageError(
    `there is no ${word}`,
    'Name a set, a folder, a report ending in .json, or a git revision such as main:sets/notes.yaml.',
  )
}
