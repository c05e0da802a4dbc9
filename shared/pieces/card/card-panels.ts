import type { Millimetres } from '../../units/units.ts'
import { modelDefaults } from '../model-defaults.ts'
import type { CardGiven } from './card-given.ts'

/** Folded size with length the larger, and the axis that runs across the fold (`null`: not folded). */
export interface FoldedSize {
  readonly length: Millimetres
  readonly width: Millimetres
  readonly across: 'length' | 'width' | null
}

export function foldedSize(given: CardGiven): FoldedSize {
  if (given.folded === 'fit') throw new RangeError(`${given.name} has no size yet`)
  const length = Math.max(given.folded.length, given.folded.width)
  const width = Math.min(given.folded.length, given.folded.width)
  // A fold along the long edge leaves the short side to run from fold to edge.
  return { length, width, across: given.fold === 'none' ? null : given.fold === 'long-edge' ? 'width' : 'length' }
}

/**
 * How much shorter than the panel it lies in each folded-in panel must be, besides fold error: (π/2)t.
 * @see physics A.6 (derived)
 */
export const rollStep = (caliper: Millimetres): Millimetres => (Math.PI / 2) * caliper

/**
 * Panels across the fold, outermost first, where the author did not give them: equal for single and accordion folds,
 * each folded-in panel of a roll a step and a fold error shorter on the score grid, a gate's two leaves half a panel.
 */
export function cardPanels(
  given: CardGiven,
  panel: Millimetres,
  caliper: Millimetres,
  scoreGrid: Millimetres,
): readonly Millimetres[] {
  if (given.fold === 'none') return [panel]
  if (given.panelWidths !== null) return given.panelWidths
  const count = given.style === 'gate' ? 3 : given.panels
  if (given.style === 'gate') return [panel, panel / 2, panel / 2]
  if (given.style === 'roll' && count > 2) {
    const less = rollStep(caliper) + modelDefaults.rollFoldError.value
    const step = Math.ceil(less / scoreGrid - 1e-9) * scoreGrid
    return Array.from({ length: count }, (_, index) => panel - Math.max(0, index - 1) * step)
  }
  return Array.from({ length: count }, () => panel)
}

/** The panels an author's blank leaves: the folded size as far as it goes, the rest in the last panel. */
export function panelsOfBlank(panels: readonly Millimetres[], blankAcross: Millimetres): readonly Millimetres[] {
  const before = panels.slice(0, -1)
  return [...before, blankAcross - before.reduce((sum, panel) => sum + panel, 0)]
}

/** Layers of card over one another when folded shut. */
export const foldedLayers = (given: CardGiven): number =>
  given.fold === 'none' ? 1 : given.style === 'gate' ? 2 : given.style === 'single' ? 2 : given.panels

/** Where the folds lie on the sheet, from one edge: a gate's leaves stand on either side of its middle panel. */
export function foldPositions(given: CardGiven, panels: readonly Millimetres[]): readonly Millimetres[] {
  const [wide = 0, leaf = 0] = panels
  if (given.style === 'gate') return [leaf, leaf + wide]
  return panels.slice(0, -1).map((_, index) => panels.slice(0, index + 1).reduce((total, panel) => total + panel, 0))
}
