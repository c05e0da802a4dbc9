import type { Place, Problem } from './template-model.ts'

/** More than this in one file and the rest only repeats what the first ones said. */
const mostShown = 60

/** Beyond this nothing more is taken down: finding the places of thousands of problems takes time. */
const mostKept = 300

/** Problems gathered while a file is read, each once, in the order of the file. */
export interface ProblemList {
  report(code: string, message: string, hint: string, at: Place): void
  readonly isEmpty: boolean
  readonly isFull: boolean
  inOrder(): readonly Problem[]
}

export function createProblemList(): ProblemList {
  const found = new Map<string, Problem>()
  return {
    report(code, message, hint, at) {
      const key = `${code} ${String(at.line)}:${String(at.column)} ${at.path.join('.')}`
      if (found.size < mostKept && !found.has(key)) found.set(key, { code, message, hint, at })
    },
    get isEmpty() {
      return found.size === 0
    },
    get isFull() {
      return found.size >= mostKept
    },
    inOrder() {
      return [...found.values()].sort((a, b) => a.at.line - b.at.line || a.at.column - b.at.column).slice(0, mostShown)
    },
  }
}
