import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { ruleLimits } from '../../rule-limits.ts'
import type { Finding, Rule } from '../../rule.ts'
import { sizeInSetUnits } from '../../wording.ts'
import { placementIn } from '../fits-turned.ts'
import { numberUp } from '../number-up.ts'
import { cutRectangles, type CutRectangle } from '../sheet-of.ts'

const effort = { guillotine: ruleLimits.yieldSearched.value, knife: ruleLimits.pinwheelSearched.value }

function judgePiece(judged: JudgedSet, name: string, cut: CutRectangle | undefined): readonly Finding[] {
  if (cut === undefined || cut.rectangle.width <= 0) return []
  const { rectangle, sheet, blank } = cut
  const isPrinted = judged.pieces.get(name)?.given.made === 'printed'
  const strip = isPrinted ? 2 * ruleLimits.printMargin.value : 0
  const usable = { length: sheet.length - strip, width: sheet.width - strip }
  const placement = placementIn(rectangle, usable)
  // A blank that does not go on the sheet at all is judged by another rule.
  if (placement === null) return []
  const counted = numberUp(rectangle, usable, effort)
  const guillotine = counted.guillotine
  const knife = Math.max(1, counted.knife)
  const make = judged.makes.get(name) ?? 1
  const sheets = (count: number): string => {
    const needed = Math.ceil(make / count)
    return needed === 1 ? '1 sheet' : `${String(needed)} sheets`
  }
  const wanted = `${String(make)} wanted, ${sheets(knife)}`
  const from = `${sheet.name}${isPrinted ? ' within its printable area' : ''}`
  const size = sizeInSetUnits(judged, [rectangle.length, rectangle.width])
  const isMoreByKnife = knife > guillotine
  return [
    {
      subject: name,
      severity: isMoreByKnife ? 'info' : 'pass',
      measure: { actual: guillotine, limit: knife, sense: 'at-least', unit: 'count' },
      message: isMoreByKnife
        ? `${blank.name} (${size}): ${String(guillotine)} from ${from} by cuts from edge to edge and ${String(knife)} by knife${placement === 'straight' ? ', with a block left turned in the middle' : ', laid at an angle'} (${wanted}).`
        : `${blank.name} (${size}): ${counted.isSearched ? '' : 'at least '}${String(guillotine)} from ${from} (${wanted}).`,
      path: ['pieces', name],
    },
  ]
}

export const yieldRule: Rule = {
  id: 'sheet/yield',
  level: 'info',
  title: 'How many pieces a sheet yields',
  why: 'Makers buy paper by the sheet. A trimmer cuts from edge to edge; a knife can leave a block in the middle and sometimes gets one more.',
  origin: {
    kind: 'derived',
    source:
      'Best number by cuts from edge to edge, searched for at normal positions; by knife the best with four blocks turned round a fifth.',
  },
  remedy: 'Nothing need be done; a piece a little smaller may yield one more.',
  judge: (judged) => [...cutRectangles(judged)].flatMap(([name, cuts]) => judgePiece(judged, name, cuts[0])),
}
