/** Edits between two words, a swap of neighbours counting once (optimal string alignment). */
function distance(a: string, b: string, most: number): number {
  if (Math.abs(a.length - b.length) > most) return most + 1
  let beforeLast: number[] = []
  let last = Array.from({ length: b.length + 1 }, (_, index) => index)
  for (let i = 1; i <= a.length; i += 1) {
    const row = [i]
    for (let j = 1; j <= b.length; j += 1) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1
      let least = Math.min((last[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (last[j - 1] ?? 0) + same)
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        least = Math.min(least, (beforeLast[j - 2] ?? 0) + 1)
      row.push(least)
    }
    beforeLast = last
    last = row
  }
  return last[b.length] ?? most + 1
}

/**
 * The candidate a word was probably meant to be, if one is near enough: a third of its length, at most three edits, and
 * with at least one letter in common. The first of equally near ones.
 */
export function nearestName(word: string, candidates: Iterable<string>): string | null {
  const most = Math.min(3, Math.max(1, Math.floor(word.length / 3)))
  let best: string | null = null
  let least = most + 1
  for (const candidate of candidates) {
    const edits = distance(word.slice(0, 80), candidate, most)
    if (edits < least && edits < Math.max(word.length, candidate.length)) {
      best = candidate
      least = edits
    }
  }
  return best
}
