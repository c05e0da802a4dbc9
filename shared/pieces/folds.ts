import { add, scale, subtract } from '../uncertainty/arithmetic.ts'
import type { Dimension } from '../uncertainty/dimension.ts'

/*
 * The four rows of the fold table, with λt the hinge depth and t the caliper.
 * Derived: mid-planes meet at the score (λ = 1/2); the inside of a U scored s apart is s − 2λt whatever the bend.
 */

/** Inside of a panel between two right-angle folds scored s apart: s − 2λt. */
export const insideRightAngles = (scored: Dimension, hinge: Dimension): Dimension => add(scored, scale(hinge, -2))

/** Outside of the same panel: s + 2(1−λ)t. */
export const outsideRightAngles = (scored: Dimension, hinge: Dimension, caliper: Dimension): Dimension =>
  add(scored, scale(caliper, 2), scale(hinge, -2))

/** Depth inside of a wall scored d from its cut edge: d − λt. */
export const wallDepth = (wall: Dimension, hinge: Dimension): Dimension => subtract(wall, hinge)

/** Height outside of that wall: d + (1−λ)t. */
export const wallHeight = (wall: Dimension, hinge: Dimension, caliper: Dimension): Dimension =>
  add(wall, caliper, scale(hinge, -1))

/** Inside of a flat pocket between two flat folds scored s apart: s − 4λt. */
export const insideFlatFolds = (scored: Dimension, hinge: Dimension): Dimension => add(scored, scale(hinge, -4))

/** Outside of the same pocket: s + 2(1−2λ)t. */
export const outsideFlatFolds = (scored: Dimension, hinge: Dimension, caliper: Dimension): Dimension =>
  add(scored, scale(caliper, 2), scale(hinge, -4))

/** Closed extent of a panel from a flat fold to a cut edge: ℓ + (1−2λ)t. */
export const closedPanel = (panel: Dimension, hinge: Dimension, caliper: Dimension): Dimension =>
  add(panel, caliper, scale(hinge, -2))
