import type { Place, Problem } from './template-model.ts'

/** More than this in one file and the rest only repeats what the first ones said. */
const mostProblems = 60

/** Problems gathered while a file is read, each once, in the order of the file. */
export interface ProblemList {
  report(code: string, message: string, hint: string, at: Place): void
  readonly isEmpty: boolean
  inOrder(): readonly Problem[]
}

export function createProblemList(): ProblemList {
  const found = new Map<string, Problem>()
  return {
    report(code, message, hint, at) {
      const key = `${code} ${String(at.line)}:${String(at.column)} ${at.path.join('.')}`
      if (!found.has(key)) found.set(key, { code, message, hint, at })
    },
    get isEmpty() {
      return found.size === 0
    },
    inOrder() {
      return [...found.values()]
        .sort((a, b) => a.at.line - b.at.line || a.at.column - b.at.column)
        .slice(0, mostProblems)
    },
  }
}
