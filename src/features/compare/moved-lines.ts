import type { Blank } from '../../../shared/pieces/blank.ts'

interface Point {
  readonly x: number
  readonly y: number
}

export interface Line {
  readonly from: Point
  readonly to: Point
  readonly kind: 'cut' | 'score'
}

/** A line of a blank as it was and as it is; one of them null where it is on one side only. */
export interface LinePair {
  readonly before: Line | null
  readonly after: Line | null
  readonly isMoved: boolean
}

const tiny = 1e-4
const isApart = (a: Point, b: Point): boolean => Math.hypot(a.x - b.x, a.y - b.y) > tiny

const edgesOf = (blank: Blank): readonly Line[] =>
  [blank.outline, ...blank.holes].flatMap((outline) =>
    outline.map((from, index) => ({ from, to: outline[(index + 1) % outline.length] ?? from, kind: 'cut' as const })),
  )

const pair = (before: Line | null, after: Line | null): LinePair => ({
  before,
  after,
  isMoved: before === null || after === null || isApart(before.from, after.from) || isApart(before.to, after.to),
})

/**
 * Lines of two blanks matched to each other: scores by their names, edges by their order where there are as many of
 * them on both sides, else by where they lie.
 */
export function pairLines(before: Blank, after: Blank): readonly LinePair[] {
  const [old, now] = [edgesOf(before), edgesOf(after)]
  const edges =
    old.length === now.length
      ? old.map((line, index) => pair(line, now[index] ?? null))
      : [
          ...old.map((line) => pair(line, now.find((other) => !pair(line, other).isMoved) ?? null)),
          ...now.filter((line) => old.every((other) => pair(other, line).isMoved)).map((line) => pair(null, line)),
        ]
  const names = new Set([...before.scores, ...after.scores].map(({ name }) => name))
  const scores = [...names].map((name) => {
    const find = (blank: Blank): Line | null => {
      const score = blank.scores.find((candidate) => candidate.name === name)
      return score === undefined ? null : { from: score.from, to: score.to, kind: 'score' }
    }
    return pair(find(before), find(after))
  })
  return [...edges, ...scores]
}

/** A line as it is, moved `factor` times as far from where it was. */
export function enlarged({ before, after }: LinePair, factor: number): Line | null {
  if (before === null || after === null) return after
  const far = (was: Point, is: Point): Point => ({
    x: was.x + (is.x - was.x) * factor,
    y: was.y + (is.y - was.y) * factor,
  })
  return { kind: after.kind, from: far(before.from, after.from), to: far(before.to, after.to) }
}
