import { differenceOf } from '../../shared/geometry/combine.ts'
import { areaOf } from '../../shared/geometry/area.ts'
import type { Point, Polygon, Segment } from '../../shared/geometry/shapes.ts'
import type { Step, StepAction } from '../../shared/exporters/steps/step.ts'

/*
 * Does what steps say with paper and a ruler, knowing nothing of how the piece was designed: a rectangle is cut, lines
 * are scored across it from its edges, parts are cut away. What comes out is compared with the design.
 */

export interface MadeSheet {
  readonly outline: Polygon
  readonly scores: readonly (Segment & { readonly fold: 'valley' | 'mountain' })[]
  readonly size: { readonly length: number; readonly width: number }
  readonly copies: number
}

const p = (x: number, y: number): Point => ({ x, y })

interface Bench {
  length: number
  width: number
  copies: number
  outline: Polygon
  scores: (Segment & { fold: 'valley' | 'mountain' })[]
}

function takeAway(bench: Bench, parts: readonly Polygon[]): void {
  const left = differenceOf(bench.outline, parts)
  bench.outline = [...left].sort((a, b) => areaOf(b) - areaOf(a))[0] ?? bench.outline
}

function score(bench: Bench, action: Extract<StepAction, { do: 'score' }>): void {
  const { edge, distance, part, fold } = action
  const isUpright = edge === 'left' || edge === 'right'
  const at = edge === 'left' || edge === 'bottom' ? distance : (isUpright ? bench.length : bench.width) - distance
  const [from, to] = part === null ? [0, isUpright ? bench.width : bench.length] : [part.from, part.to]
  bench.scores.push(isUpright ? { from: p(at, from), to: p(at, to), fold } : { from: p(from, at), to: p(to, at), fold })
}

function scoreCorner(bench: Bench, action: Extract<StepAction, { do: 'score-corner' }>): void {
  const { corner, along, up, fold } = action
  const isLeft = corner.endsWith('left')
  const isLower = corner.startsWith('lower')
  const x = isLeft ? along : bench.length - along
  const y = isLower ? up : bench.width - up
  bench.scores.push({ from: p(x, isLower ? 0 : bench.width), to: p(isLeft ? 0 : bench.length, y), fold })
}

/** The four lines a tray is folded along: the outermost score on each side. */
function trayLines(bench: Bench) {
  const xs = bench.scores.filter((line) => line.from.x === line.to.x).map((line) => line.from.x)
  const ys = bench.scores.filter((line) => line.from.y === line.to.y).map((line) => line.from.y)
  return { left: Math.min(...xs), right: Math.max(...xs), bottom: Math.min(...ys), top: Math.max(...ys) }
}

function trimTabs(bench: Bench, action: Extract<StepAction, { do: 'trim-tabs' }>): void {
  const { left, right, bottom, top } = trayLines(bench)
  const slope = Math.tan((action.taper * Math.PI) / 180)
  for (const [x, rimX] of [
    [left, 0],
    [right, bench.length],
  ] as const) {
    for (const [y, rimY] of [
      [bottom, 0],
      [top, bench.width],
    ] as const) {
      // Tab on the end wall: hinge level along y from x to the rim, running out to the long edge; else the reverse.
      const isEnds = action.at === 'ends'
      const [deep, reach] = isEnds ? [Math.abs(rimX - x), Math.abs(rimY - y)] : [Math.abs(rimY - y), Math.abs(rimX - x)]
      const lean = Math.min(reach * slope, (deep - action.trim) / 2)
      const at = (fromFloor: number, out: number): Point =>
        isEnds
          ? p(x + Math.sign(rimX - x) * fromFloor, y + Math.sign(rimY - y) * out)
          : p(x + Math.sign(rimX - x) * out, y + Math.sign(rimY - y) * fromFloor)
      takeAway(bench, [
        [at(0, 0), at(action.trim, 0), at(action.trim + lean, reach), at(0, reach)],
        [at(deep, 0), at(deep, reach), at(deep - lean, reach)],
      ])
    }
  }
}

function thumbNotches(bench: Bench, action: Extract<StepAction, { do: 'thumb-notches' }>): void {
  const { left, right, bottom, top } = trayLines(bench)
  const radius = action.wide / 2
  const disc = (centre: Point): Polygon =>
    Array.from({ length: 360 }, (_, degree) =>
      p(centre.x + radius * Math.cos((degree * Math.PI) / 180), centre.y + radius * Math.sin((degree * Math.PI) / 180)),
    )
  const middles =
    action.at === 'sides'
      ? [p((left + right) / 2, 0), p((left + right) / 2, bench.width)]
      : [p(0, (bottom + top) / 2), p(bench.length, (bottom + top) / 2)]
  takeAway(bench, middles.map(disc))
}

/** Where two lines cross. */
function crossing(a: Segment, b: Segment): Point {
  const d = p(a.to.x - a.from.x, a.to.y - a.from.y)
  const e = p(b.to.x - b.from.x, b.to.y - b.from.y)
  const share = ((b.from.x - a.from.x) * e.y - (b.from.y - a.from.y) * e.x) / (d.x * e.y - d.y * e.x)
  return p(a.from.x + share * d.x, a.from.y + share * d.y)
}

function cutNotches(bench: Bench): void {
  const lines = bench.scores
  for (const [index, first] of lines.entries()) {
    for (const second of lines.slice(index + 1)) {
      const isAcross =
        Math.abs(
          (first.to.x - first.from.x) * (second.to.y - second.from.y) -
            (first.to.y - first.from.y) * (second.to.x - second.from.x),
        ) > 1
      if (!isAcross) continue
      const apex = crossing(first, second)
      // The notch lies on the edge nearest the crossing, between where the two scores reach it.
      const edges = [apex.x, bench.length - apex.x, apex.y, bench.width - apex.y]
      const nearest = edges.indexOf(Math.min(...edges))
      const onEdge = (line: Segment): Point => {
        const ends = [line.from, line.to]
        const isOn = (q: Point): boolean => [q.x, bench.length - q.x, q.y, bench.width - q.y][nearest] === 0
        return ends.find(isOn) ?? line.from
      }
      takeAway(bench, [[onEdge(first), apex, onEdge(second)]])
    }
  }
}

/** Carries out the actions of steps, sheet by sheet. */
export function carryOut(steps: readonly Step[]): ReadonlyMap<string, MadeSheet> {
  const benches = new Map<string, Bench>()
  const bench = (sheet: string): Bench => {
    const found = benches.get(sheet)
    if (found === undefined) throw new Error(`${sheet} is worked on before it is cut`)
    return found
  }
  for (const action of steps.flatMap((one) => one.actions)) {
    switch (action.do) {
      case 'cut-sheet':
        benches.set(action.sheet, {
          length: action.length,
          width: action.width,
          copies: action.copies,
          outline: [p(0, 0), p(action.length, 0), p(action.length, action.width), p(0, action.width)],
          scores: [],
        })
        break
      case 'score':
        score(bench(action.sheet), action)
        break
      case 'score-corner':
        scoreCorner(bench(action.sheet), action)
        break
      case 'score-between':
        bench(action.sheet).scores.push({ from: action.from, to: action.to, fold: action.fold })
        break
      case 'cut-away':
        takeAway(bench(action.sheet), [action.points])
        break
      case 'trim-tabs':
        trimTabs(bench(action.sheet), action)
        break
      case 'thumb-notches':
        thumbNotches(bench(action.sheet), action)
        break
      case 'cut-notches':
        cutNotches(bench(action.sheet))
        break
      case 'slit':
      case 'fold':
        bench(action.sheet)
    }
  }
  return new Map(
    [...benches].map(([name, { outline, scores, length, width, copies }]) => [
      name,
      { outline, scores, size: { length, width }, copies },
    ]),
  )
}
