import { clipToConvex } from '../../geometry/clip-convex.ts'
import { point } from '../../geometry/rectangle.ts'
import { roundCorners } from '../../geometry/round-corner.ts'
import { movePolygon, reflection } from '../../geometry/transform.ts'
import { area, grainAlong, makeBlank, measure, score, type DrawContext } from '../blank-parts.ts'
import type { Blank } from '../blank.ts'
import type { EnvelopeForm } from '../folded-piece.ts'
import { drawLiner } from './draw-liner.ts'
import type { EnvelopeGiven } from './envelope-given.ts'
import { squareFlapFace, squareFlapOutline, squareFlapParts, type SquareFlapSizes } from './square-flap-geometry.ts'

type SquareFlapForm = Extract<EnvelopeForm, { style: 'square-flap' }>

const partNames = { left: 'side flap', right: 'side flap', back: 'back', flap: 'seal flap' } as const
const foldNames = { left: 'left fold', right: 'right fold', back: 'bottom fold', flap: 'flap fold' } as const

/** The sizes behind a folded square-flap envelope, the throat along x. */
export function squareFlapSizesOf(form: SquareFlapForm): SquareFlapSizes {
  const { length, width } = form.pocket
  const [along, across] = form.throatAlong === 'length' ? [length, width] : [width, length]
  return { along, across, back: form.back, sideFlap: form.sideFlap, flap: form.flap, taper: form.taper }
}

/** A square-flap envelope, inside up: face in the middle, back below it, seal flap above. */
export function drawSquareFlap(given: EnvelopeGiven, form: SquareFlapForm, context: DrawContext): readonly Blank[] {
  const sizes = squareFlapSizesOf(form)
  const { along, across, back, sideFlap, flap } = sizes
  const parts = squareFlapParts(sizes)
  const backPart = parts.find((part) => part.name === 'back')
  const sealPart = parts.find((part) => part.name === 'flap')
  if (backPart === undefined || sealPart === undefined) return []
  const sideGlue = () =>
    parts.slice(0, 2).flatMap((side) => {
      const shared = clipToConvex(side.folded, backPart.folded)
      return shared.length < 3 ? [] : [area('glue', 'side flap', movePolygon(shared, reflection(side.fold)))]
    })
  const lengthRuns = form.throatAlong === 'length' ? 'x' : 'y'
  const top = across + flap
  const left = -sideFlap
  return [
    makeBlank({
      name: context.name,
      stock: given.stock,
      outline: roundCorners(squareFlapOutline(sizes), given.corner, (corner) => Math.abs(corner.y - top) < 1e-9),
      scores: parts.map((part) => score(foldNames[part.name], part.fold, 180)),
      areas: () => [
        area('panel', 'face', squareFlapFace(sizes)),
        ...parts.map((part) => area('flap', partNames[part.name], part.flat)),
        ...sideGlue(),
      ],
      measures: () => [
        measure('blank along the throat', point(left, top), point(along + sideFlap, top)),
        measure('blank across the throat', point(left, -back), point(left, top)),
        measure('side flap', point(left, -back), point(0, -back)),
        measure('face', point(0, -back), point(along, -back)),
        measure('back', point(along, -back), point(along, 0)),
        measure('between folds', point(along, 0), point(along, across)),
        measure('flap', point(along, across), point(along, top)),
      ],
      grain: grainAlong(context, given.stock, lengthRuns),
    }),
    ...drawLiner(context, given, [squareFlapFace(sizes), sealPart.flat], lengthRuns),
  ]
}
