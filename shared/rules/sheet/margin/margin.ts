import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { ruleLimits } from '../../rule-limits.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits, sizeInSetUnits } from '../../wording.ts'
import { placementIn } from '../fits-turned.ts'
import { cutRectangles, type CutRectangle } from '../sheet-of.ts'

/** Width of the white strip that is left where a blank lies in the middle of a sheet, on its narrower side. */
function marginOf({ rectangle, sheet }: CutRectangle): number {
  const long = Math.max(sheet.length, sheet.width)
  const short = Math.min(sheet.length, sheet.width)
  return Math.min(long - rectangle.length, short - rectangle.width) / 2
}

function judgePiece(judged: JudgedSet, name: string, cuts: readonly CutRectangle[]): readonly Finding[] {
  if (judged.pieces.get(name)?.given.made !== 'printed') return []
  const worst = cuts.toSorted((a, b) => marginOf(a) - marginOf(b))[0]
  if (worst === undefined) return []
  const least = ruleLimits.printMargin.value
  const { blank, rectangle, sheet } = worst
  const usable = { length: sheet.length - 2 * least, width: sheet.width - 2 * least }
  const isInside = placementIn(rectangle, usable) !== null
  const margin = marginOf(worst)
  const size = sizeInSetUnits(judged, [rectangle.length, rectangle.width])
  return [
    {
      subject: name,
      severity: isInside ? 'pass' : 'warn',
      measure: { actual: margin, limit: least, sense: 'at-least', unit: 'mm' },
      message: isInside
        ? `${blank.name} is printed ${size} on ${sheet.name} and keeps clear of its edge.`
        : `${blank.name} is printed ${size} and leaves ${inSetUnits(judged, Math.max(0, margin))} to the edge of ${sheet.name}, where many printers print nothing. Leave ${inSetUnits(judged, least)} all round: at most ${sizeInSetUnits(judged, [usable.length, usable.width])}.`,
      path: ['pieces', name],
    },
  ]
}

export const marginRule: Rule = {
  id: 'sheet/margin',
  level: 'warn',
  title: 'Printed lines keep clear of the edge of the page',
  why: 'Printers leave a white strip along the edge; lines that fall into it are missing from the template, or the page is shrunk to save them.',
  origin: {
    kind: 'published',
    source: 'One laser printer guarantees 4 mm; a quarter of an inch is called a safe bet. Five millimetres are taken.',
  },
  remedy: 'Print on a larger sheet, or make the piece smaller.',
  judge: (judged) => [...cutRectangles(judged)].flatMap(([name, cuts]) => judgePiece(judged, name, cuts)),
}
