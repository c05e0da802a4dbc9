/** How a source of variation is distributed between minus and plus its half-width (normal: half-width is three sigma). */
export type SourceShape = 'uniform' | 'triangular' | 'normal'

/**
 * One named source of variation in a dimension. What is shared carries the same name everywhere, with the same
 * half-width and shape, so that adding and subtracting lets it accumulate or cancel as it does in life.
 * A source of half-width zero is a measure: it varies nothing, and its coefficient says how far the dimension moves
 * when that measure moves by a millimetre.
 */
export interface Source {
  readonly name: string
  /** Change of the dimension per unit of the source (mm per mm, or mm per unit where the source has no length). */
  readonly coefficient: number
  readonly halfWidth: number
  readonly shape: SourceShape
}

/** A nominal value in millimetres plus a linear form over named sources, at most one entry a name. */
export interface Dimension {
  readonly nominal: number
  readonly sources: readonly Source[]
}
