import type { WorkspaceText } from '../engine/judge-text.ts'

export interface FoundSet {
  readonly file: string
  readonly text: string
}

/** What a folder or a choice of files holds for a push. */
export interface Found {
  readonly workspace: WorkspaceText | null
  readonly sets: readonly FoundSet[]
}

const isYaml = (name: string): boolean => /\.ya?ml$/i.test(name)

/** The path below the folder that was chosen; a lone file goes by its name. */
const pathOf = (file: File): string => {
  const path = file.webkitRelativePath === '' ? file.name : file.webkitRelativePath
  return path.includes('/') ? path.slice(path.indexOf('/') + 1) : path
}

/** Finds the workspace and the sets among files; whatever else lies about is left alone. */
export async function findSets(files: readonly File[]): Promise<Found> {
  const texts = await Promise.all(
    files
      .map((file) => ({ file, path: pathOf(file) }))
      .filter(({ path }) => isYaml(path) && !/(^|\/)(node_modules|\.git)\//.test(path))
      .map(async ({ file, path }) => ({ file: path, text: await file.text() })),
  )
  const workspace = texts
    .filter(({ file }) => /(^|\/)foldgauge\.ya?ml$/.test(file))
    .toSorted((a, b) => a.file.length - b.file.length)[0]
  const below = workspace?.file.replace(/foldgauge\.ya?ml$/, '') ?? ''
  return {
    workspace: workspace === undefined ? null : { file: workspace.file.slice(below.length), text: workspace.text },
    sets: texts
      .filter(({ file, text }) => file !== workspace?.file && file.startsWith(below) && /^set:/m.test(text))
      .map(({ file, text }) => ({ file: file.slice(below.length), text }))
      .toSorted((a, b) => (a.file < b.file ? -1 : 1)),
  }
}
