import { judgeSet } from '../assembly/judge-set.ts'
import type { CheckOptions } from '../check-options.ts'
import type { CardGiven } from '../pieces/card/card-given.ts'
import { languageDefaults } from '../pieces/language-defaults.ts'
import type { FoldedPiece } from '../pieces/folded-piece.ts'
import type { PieceGiven } from '../pieces/given.ts'
import type { GivenSize } from '../pieces/piece-base.ts'
import type { TemplateSet } from '../template/template-model.ts'
import { ceilToGrid, roundToGrid } from '../units/grid.ts'
import type { Millimetres, Ruler, RulerUnit } from '../units/units.ts'

/** The ruler makers who work in a unit have: the set's own in its own unit, else the usual one. */
const rulerFor = (set: TemplateSet, units: RulerUnit): Ruler =>
  set.tokens.units === units
    ? set.tokens.ruler
    : units === 'mm'
      ? { cut: languageDefaults.rulerMetric.value, score: languageDefaults.rulerMetric.value }
      : { cut: languageDefaults.rulerInchCut.value, score: languageDefaults.rulerInchScore.value }

interface Marks {
  readonly cut: (length: Millimetres) => Millimetres
  readonly score: (length: Millimetres) => Millimetres
}

const bothCut = <T extends { readonly length: Millimetres; readonly width: Millimetres }>(
  size: T,
  marks: Marks,
): T => ({
  ...size,
  length: marks.cut(size.length),
  width: marks.cut(size.width),
})

/** Places of scores set out from one end, from the panels between them. */
const cumulative = (panels: readonly Millimetres[]): readonly Millimetres[] =>
  panels.reduce<Millimetres[]>((found, panel) => [...found, (found.at(-1) ?? 0) + panel], [])

/** A card whose fold lies on a mark for scores; panels that fold in are worked out again, each short enough on the new marks. */
function cardOnMarks(given: CardGiven, marks: Marks): CardGiven {
  const onMark = (size: GivenSize): GivenSize => {
    if (given.fold === 'none') return bothCut(size, marks)
    const isLengthAcross = (given.fold === 'long-edge') === size.length < size.width
    return {
      length: isLengthAcross ? marks.score(size.length) : marks.cut(size.length),
      width: isLengthAcross ? marks.cut(size.width) : marks.score(size.width),
    }
  }
  const { panelWidths } = given
  return {
    ...given,
    folded: given.folded === 'fit' ? given.folded : onMark(given.folded),
    blank: null,
    panelWidths: panelWidths === null || given.style === 'roll' ? null : panelWidths.map(marks.score),
    layers: given.layers.map((layer) => ({
      ...layer,
      size: bothCut(layer.size, marks),
      at: { x: marks.cut(layer.at.x), y: marks.cut(layer.at.y) },
    })),
  }
}

/** A piece with every measure a maker sets on the nearest mark. What is bought or drawn point by point stays as it is. */
function onMarks(piece: FoldedPiece, marks: Marks, ruler: Ruler): PieceGiven {
  const { given, form, blank } = piece
  switch (given.kind) {
    case 'box':
    case 'lid': {
      if (form.kind !== 'box' || blank === null) return given
      const pair = ([first, second]: readonly [Millimetres, Millimetres]): readonly [Millimetres, Millimetres] => [
        marks.score(first),
        marks.score(second),
      ]
      const wall = { length: pair(form.walls.length), width: pair(form.walls.width) }
      return { ...given, by: { given: 'blank', blank: bothCut(blank, marks), wall } }
    }
    case 'card':
      return cardOnMarks(given, marks)
    case 'envelope': {
      if (form.kind !== 'envelope') return given
      if (form.style === 'baronial') {
        if (given.style !== 'baronial') return given
        const { left, right, bottom, flap } = form.corners
        const { name, stock, made, scored, make, workmanship, note, corner, kind, liner } = given
        return {
          ...{ name, stock, made, scored, make, workmanship, note, corner, kind, liner },
          style: 'baronial',
          by: 'corners',
          square: marks.cut(form.square),
          corners: {
            left: marks.score(left),
            right: marks.score(right),
            bottom: marks.score(bottom),
            flap: marks.score(flap),
          },
        }
      }
      if (given.style !== 'square-flap') return given
      const pocket =
        form.throatAlong === 'length' ? form.pocket : { length: form.pocket.width, width: form.pocket.length }
      return {
        ...given,
        pocket: { length: marks.score(pocket.length), width: marks.score(pocket.width) },
        back: marks.score(form.back),
        sideFlap: marks.score(form.sideFlap),
        flap: marks.score(form.flap),
      }
    }
    case 'sleeve': {
      // One reckoned from what it goes round is reckoned again, from what that has become.
      if (form.kind !== 'sleeve' || given.blank === null || given.blank === 'fit') return given
      const panels = form.panels.map(marks.score)
      const scores = cumulative(panels)
      return {
        ...given,
        blank: {
          length: (scores.at(-1) ?? 0) + marks.cut(form.overlap.nominal),
          width: marks.cut(form.length),
          scores,
        },
      }
    }
    case 'band':
      if (given.blank === null || given.blank === 'fit') return { ...given, width: marks.cut(given.width) }
      return {
        ...given,
        width: marks.cut(given.width),
        blank: { length: ceilToGrid(given.blank.length, ruler.cut), scores: given.blank.scores.map(marks.score) },
      }
    case 'bag': {
      if (form.kind !== 'bag') return given
      const [face, gusset, seam] = [
        marks.score(form.panels.face),
        marks.score(form.panels.gusset),
        marks.score(form.seam),
      ]
      const [top, bottom] = [marks.score(form.top), marks.score(form.bottom)]
      return {
        ...given,
        top,
        bottom,
        seam,
        blank: {
          length: seam + 2 * (face + gusset),
          height: top + marks.cut(form.panels.height) + bottom,
          scores: cumulative([seam, face, gusset, face]),
        },
      }
    }
    case 'insert':
    case 'divider':
      return given.size === 'fit' ? given : { ...given, size: bothCut(given.size, marks) }
    case 'bought':
    case 'custom':
      return given
  }
}

/**
 * A set as makers of the other unit build it: a design of its own, each measure on the nearest mark of their rulers, to
 * be checked again on those marks. In its own unit a set is given back as it is.
 */
export function editionIn(set: TemplateSet, units: RulerUnit, options: CheckOptions): TemplateSet {
  if (set.tokens.units === units) return set
  const ruler = rulerFor(set, units)
  const marks: Marks = {
    cut: (length) => roundToGrid(length, ruler.cut),
    score: (length) => roundToGrid(length, ruler.score),
  }
  const judged = judgeSet(set, { ...options, fixes: false, scales: false })
  const pieces = new Map([...judged.pieces].map(([name, piece]) => [name, onMarks(piece, marks, ruler)]))
  return { ...set, pieces, tokens: { ...set.tokens, units, ruler } }
}
