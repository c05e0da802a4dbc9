import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { Finding, Rule } from '../../rule.ts'
import { sizeInSetUnits } from '../../wording.ts'
import { placementIn, type Placement } from '../fits-turned.ts'
import { cutRectangles, type CutRectangle } from '../sheet-of.ts'

const order = (placement: Placement): number => (placement === null ? 0 : placement === 'at an angle' ? 1 : 2)

function judgePiece(judged: JudgedSet, name: string, cuts: readonly CutRectangle[]): readonly Finding[] {
  const placed = cuts.map(({ blank, rectangle, sheet }) => ({
    blank,
    rectangle,
    sheet,
    placement: placementIn(rectangle, sheet),
  }))
  if (placed.length > 1)
    placed.sort((a, b) => order(a.placement) - order(b.placement) || b.rectangle.length - a.rectangle.length)
  const [worst] = placed
  if (worst === undefined) return []
  const { blank, rectangle, sheet, placement } = worst
  const size = sizeInSetUnits(judged, [rectangle.length, rectangle.width])
  const from = `${sheet.name} (${sizeInSetUnits(judged, [sheet.length, sheet.width])})`
  const message =
    placement === null
      ? `${blank.name} is ${size} flat and does not go on ${from}, not even at an angle. Name a larger sheet, make the piece smaller, or join it from two parts.`
      : placement === 'at an angle'
        ? `${blank.name} is ${size} flat and goes on ${from} only at an angle, so its grain will not run along its edges.`
        : `${blank.name} is ${size} flat and goes on ${from}.`
  return [
    {
      subject: name,
      severity: placement === null ? 'fail' : placement === 'straight' ? 'pass' : 'info',
      measure: {
        actual: rectangle.length,
        limit: Math.max(sheet.length, sheet.width),
        sense: 'at-most',
        unit: 'mm',
      },
      message,
      path: ['pieces', name],
    },
  ]
}

export const tooLargeRule: Rule = {
  id: 'sheet/too-large',
  level: 'fail',
  title: 'The blank goes on the sheet',
  why: 'Makers have the paper they can buy. A blank a little longer than the sheet cannot be made at all.',
  origin: {
    kind: 'derived',
    source:
      "Smallest rectangle round the blank against the sheet, turned at any angle (Wetzel's condition, from memory).",
  },
  remedy: 'Make the piece smaller, name a larger sheet, or join it from two parts.',
  judge: (judged) => [...cutRectangles(judged)].flatMap(([name, cuts]) => judgePiece(judged, name, cuts)),
}
