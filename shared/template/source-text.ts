import type { Place } from './template-model.ts'

/** A file's text with its lines counted, to turn offsets into places. */
export interface SourceText {
  readonly file: string
  /** Text without a byte order mark; offsets count in it. */
  readonly text: string
  placeAt(start: number, end: number, path: Place['path']): Place
}

function findLineStarts(text: string): readonly number[] {
  const starts = [0]
  for (let at = text.indexOf('\n'); at !== -1; at = text.indexOf('\n', at + 1)) starts.push(at + 1)
  return starts
}

/** Index of the last line that starts at or before the offset. */
function lineOf(starts: readonly number[], offset: number): number {
  let low = 0
  let high = starts.length - 1
  while (low < high) {
    const middle = (low + high + 1) >> 1
    if ((starts[middle] ?? Infinity) <= offset) low = middle
    else high = middle - 1
  }
  return low
}

export function createSourceText(fileText: string, file: string): SourceText {
  const text = fileText.startsWith('\uFEFF') ? fileText.slice(1) : fileText
  let starts: readonly number[] | null = null
  return {
    file,
    text,
    placeAt(start, end, path) {
      starts ??= findLineStarts(text)
      const from = Math.min(Math.max(start, 0), text.length)
      const to = Math.min(Math.max(end, from), text.length)
      const line = lineOf(starts, from)
      const endLine = lineOf(starts, to)
      return {
        file,
        line: line + 1,
        column: from - (starts[line] ?? 0) + 1,
        endLine: endLine + 1,
        endColumn: to - (starts[endLine] ?? 0) + 1,
        path,
      }
    },
  }
}
