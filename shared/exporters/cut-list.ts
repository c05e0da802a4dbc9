import { roughSheetOf } from '../drawing/rough-sheet.ts'
import { ruleLimits } from '../rules/rule-limits.ts'
import { numberUp } from '../rules/sheet/number-up.ts'
import { sameLength } from '../units/epsilon.ts'
import type { Millimetres } from '../units/units.ts'
import { boughtSheet, stockTitle, type ExportSet, type ExportSheet } from './export-set.ts'

/** A rectangle on a sheet of paper, from its lower left. */
export interface Placed {
  readonly x: Millimetres
  readonly y: Millimetres
  readonly length: Millimetres
  readonly width: Millimetres
}

export interface CutItem {
  readonly name: string
  readonly piece: string
  readonly length: Millimetres
  readonly width: Millimetres
  readonly copies: number
  /** From one sheet, by cuts from edge to edge and by knife. */
  readonly guillotine: number
  readonly knife: number
}

export interface PaperSheet {
  readonly placed: readonly (Placed & { readonly name: string })[]
  /** What is left over in one piece, largest first; strips too narrow to use are left out. */
  readonly offcuts: readonly Placed[]
}

export interface PaperList {
  readonly stock: string
  readonly title: string
  readonly sheet: { readonly name: string; readonly length: Millimetres; readonly width: Millimetres }
  readonly items: readonly CutItem[]
  readonly sheets: readonly PaperSheet[]
  /** Sheets that do not go on this paper at all. */
  readonly tooLarge: readonly CutItem[]
  /** Small sheets that came out of what others left over. */
  readonly fromOffcuts: readonly string[]
}

/** An offcut narrower than this is scrap (guess). */
const leastOffcut: Millimetres = 30

const effort = { guillotine: ruleLimits.yieldSearched.value, knife: ruleLimits.pinwheelSearched.value }

interface Free extends Placed {
  readonly sheet: number
}

const fitsIn = (free: Placed, length: Millimetres, width: Millimetres): boolean =>
  length <= free.length + sameLength && width <= free.width + sameLength

/** What is left of a rectangle once one corner is taken, cut edge to edge so that the larger part stays whole. */
function splitFree(free: Free, length: Millimetres, width: Millimetres): readonly Free[] {
  const right = free.length - length
  const above = free.width - width
  const isUprightCut = right * free.width >= above * free.length
  const beside: Free = { ...free, x: free.x + length, length: right, width: isUprightCut ? free.width : width }
  const over: Free = { ...free, y: free.y + width, width: above, length: isUprightCut ? length : free.length }
  return [beside, over].filter((part) => part.length > sameLength && part.width > sameLength)
}

/** Lays sheets largest first, each in the smallest left-over that holds it, by cuts from edge to edge only. */
function layOut(items: readonly CutItem[], sheet: PaperList['sheet']): Pick<PaperList, 'sheets' | 'fromOffcuts'> {
  const singles = items
    .flatMap((item) => Array.from({ length: item.copies }, () => item))
    .toSorted((a, b) => b.length * b.width - a.length * a.width)
  let free: Free[] = []
  const placed: (Placed & { readonly name: string })[][] = []
  const fromOffcuts = new Set<string>()
  for (const item of singles) {
    const turns = [
      [item.length, item.width],
      [item.width, item.length],
    ] as const
    let best: { readonly free: Free; readonly turn: readonly [Millimetres, Millimetres] } | null = null
    for (const candidate of free) {
      for (const turn of turns) {
        if (!fitsIn(candidate, turn[0], turn[1])) continue
        if (best === null || candidate.length * candidate.width < best.free.length * best.free.width)
          best = { free: candidate, turn }
      }
    }
    if (best === null) {
      const fresh: Free = { sheet: placed.length, x: 0, y: 0, length: sheet.length, width: sheet.width }
      const turn = turns.find(([length, width]) => fitsIn(fresh, length, width))
      if (turn === undefined) continue
      placed.push([])
      free.push(fresh)
      best = { free: fresh, turn }
    } else if (placed[best.free.sheet]?.every((other) => other.name !== item.name) === true) fromOffcuts.add(item.name)
    const { free: taken, turn } = best
    free = [...free.filter((other) => other !== taken), ...splitFree(taken, turn[0], turn[1])]
    placed[taken.sheet]?.push({ name: item.name, x: taken.x, y: taken.y, length: turn[0], width: turn[1] })
  }
  return {
    sheets: placed.map((parts, index) => ({
      placed: parts,
      offcuts: free
        .filter((rest) => rest.sheet === index && Math.min(rest.length, rest.width) >= leastOffcut)
        .map(({ x, y, length, width }) => ({ x, y, length, width }))
        .toSorted((a, b) => b.length * b.width - a.length * a.width),
    })),
    fromOffcuts: [...fromOffcuts],
  }
}

function itemOf({ blank, piece, copies }: ExportSheet, sheet: PaperList['sheet']): CutItem {
  const rough = roughSheetOf(blank)
  const [length, width] = [Math.max(rough.length, rough.width), Math.min(rough.length, rough.width)]
  const { guillotine, knife } = numberUp({ length, width }, sheet, effort)
  return { name: blank.name, piece, length, width, copies, guillotine, knife: Math.max(knife, guillotine) }
}

/**
 * What to cut from which paper: quantities, how many a sheet of that paper yields, a layout by cuts from edge to edge,
 * what is left over, and how many sheets to buy.
 */
export function cutList(set: ExportSet): readonly PaperList[] {
  const byStock = new Map<string, ExportSheet[]>()
  for (const sheet of set.pieces.flatMap((piece) => piece.sheets)) {
    if (sheet.blank.stock === null) continue
    const list = byStock.get(sheet.blank.stock)
    if (list === undefined) byStock.set(sheet.blank.stock, [sheet])
    else list.push(sheet)
  }
  return [...byStock].map(([stock, sheets]): PaperList => {
    const bought = boughtSheet(set, stock)
    const sheet = {
      name: bought.name,
      length: Math.max(bought.length, bought.width),
      width: Math.min(bought.length, bought.width),
    }
    const items = sheets.map((one) => itemOf(one, sheet))
    const isOn = (item: CutItem): boolean => fitsIn({ x: 0, y: 0, ...sheet }, item.length, item.width)
    return {
      stock,
      title: stockTitle(set, stock),
      sheet,
      items,
      tooLarge: items.filter((item) => !isOn(item)),
      ...layOut(items.filter(isOn), sheet),
    }
  })
}
