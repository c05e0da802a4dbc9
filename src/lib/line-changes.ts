/** A line of two texts: in both, only in the older, or only in the newer. */
export interface LineChange {
  readonly kind: 'same' | 'removed' | 'added'
  readonly text: string
  /** Its number in the older and the newer text; null where it is not in it. */
  readonly before: number | null
  readonly after: number | null
}

/**
 * Two texts line by line, by their longest common subsequence (textbook method) between equal beginnings and ends.
 * Texts whose differing middle is very long are shown as removed and added whole.
 */
export function lineChanges(before: string, after: string): readonly LineChange[] {
  const [a, b] = [before.split('\n'), after.split('\n')]
  let head = 0
  while (head < a.length && head < b.length && a[head] === b[head]) head += 1
  let tail = 0
  while (tail < a.length - head && tail < b.length - head && a[a.length - 1 - tail] === b[b.length - 1 - tail])
    tail += 1
  const [mine, theirs] = [a.slice(head, a.length - tail), b.slice(head, b.length - tail)]
  const [rows, columns] = [mine.length, theirs.length]
  const isLong = rows * columns > 4_000_000
  const common = new Uint32Array(isLong ? 0 : (rows + 1) * (columns + 1))
  const at = (row: number, column: number): number => common[row * (columns + 1) + column] ?? 0
  if (!isLong)
    for (let row = rows - 1; row >= 0; row -= 1)
      for (let column = columns - 1; column >= 0; column -= 1)
        common[row * (columns + 1) + column] =
          mine[row] === theirs[column]
            ? at(row + 1, column + 1) + 1
            : Math.max(at(row + 1, column), at(row, column + 1))
  const found: LineChange[] = []
  const push = (kind: LineChange['kind'], text: string, old: number | null, now: number | null): void =>
    void found.push({ kind, text, before: old === null ? null : old + 1, after: now === null ? null : now + 1 })
  a.slice(0, head).forEach((text, index) => push('same', text, index, index))
  let [row, column] = [0, 0]
  while (row < rows || column < columns) {
    const isSame = row < rows && column < columns && mine[row] === theirs[column] && !isLong
    if (isSame) push('same', mine[row] ?? '', head + row++, head + column++)
    else if (row < rows && (column >= columns || isLong || at(row + 1, column) >= at(row, column + 1)))
      push('removed', mine[row] ?? '', head + row++, null)
    else push('added', theirs[column] ?? '', null, head + column++)
  }
  for (let index = 0; index < tail; index += 1)
    push('same', a[a.length - tail + index] ?? '', a.length - tail + index, b.length - tail + index)
  return found
}
