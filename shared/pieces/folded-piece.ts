import type { Dimension } from '../uncertainty/dimension.ts'
import type { Millimetres } from '../units/units.ts'
import type { PieceGiven } from './given.ts'

/** A measure a maker sets on a ruler, trimmer or scoring board. Its `id` is also the name of a zero-width source. */
export interface Measure {
  /** `mark(base, wall)` and the like. */
  readonly id: string
  readonly piece: string
  /** In the author's nouns: `wall`, `blank length`, `fold of the flap`. */
  readonly what: string
  readonly nominal: Millimetres
  readonly grid: 'cut' | 'score'
}

/** Room inside a piece: what it can hold. */
export interface Cavity {
  readonly shape: 'pocket' | 'tray' | 'bag' | 'tube'
  readonly length: Dimension
  readonly width: Dimension
  /** `null` for a flat pocket and along an open tube. */
  readonly depth: Dimension | null
  /** The axis along which content may fall short without rattling: up out of a card's pocket. */
  readonly open: 'length' | 'width' | null
}

/** A piece folded up, empty: sizes with their sources. */
export interface FoldedPiece {
  readonly given: PieceGiven
  /** Nominal size of the flat sheet, length the larger of the folded form; `null` for bought things. */
  readonly blank: { readonly length: Millimetres; readonly width: Millimetres } | null
  readonly caliper: Dimension | null
  /** Outside sizes; `height` is the thickness of flat pieces, without what is raised on them. */
  readonly outside: { readonly length: Dimension; readonly width: Dimension; readonly height: Dimension }
  readonly cavity: Cavity | null
  /** Height of what is stuck on, beyond `outside.height`, and the rim it leaves (0: it reaches the edge). */
  readonly raised: { readonly height: Dimension; readonly rim: Millimetres } | null
  /** Folded units lift a stack by their loft; a flat sheet does not. */
  readonly isFolded: boolean
  readonly measures: readonly Measure[]
  readonly form: FoldedForm
}

/** What is particular to a kind, for rules, drawings and the report. */
export type FoldedForm =
  | { readonly kind: 'card'; readonly panels: readonly Millimetres[]; readonly layers: number }
  | EnvelopeForm
  | BoxForm
  | {
      readonly kind: 'sleeve'
      readonly panels: readonly Millimetres[]
      readonly overlap: Dimension
      readonly length: Millimetres
      readonly wrapped: 'width' | 'length'
    }
  | {
      readonly kind: 'band'
      readonly stripLength: Dimension
      readonly wrapped: 'width' | 'length'
      readonly ribbon: boolean
    }
  | {
      readonly kind: 'bag'
      readonly panels: { readonly face: Millimetres; readonly gusset: Millimetres; readonly height: Millimetres }
      readonly top: Millimetres
      readonly bottom: Millimetres
      readonly seam: Millimetres
    }
  | { readonly kind: 'insert'; readonly standing: boolean }
  | { readonly kind: 'bought'; readonly body: 'solid' | 'flat' | 'box' }
  | { readonly kind: 'custom' }

/** Layers of paper over the pocket, the face counted. */
export interface LayerMap {
  readonly min: number
  readonly mean: number
  readonly max: number
}

export type EnvelopeForm =
  | {
      readonly kind: 'envelope'
      readonly style: 'baronial'
      /** Between scores; `length` the larger. */
      readonly pocket: { readonly length: Millimetres; readonly width: Millimetres }
      readonly square: Millimetres
      /** Distance from each corner at which its fold cuts both edges. Left and right differ only where given so. */
      readonly corners: {
        readonly left: Millimetres
        readonly right: Millimetres
        readonly bottom: Millimetres
        readonly flap: Millimetres
      }
      readonly reach: {
        readonly left: Millimetres
        readonly right: Millimetres
        readonly bottom: Millimetres
        readonly top: Millimetres
      }
      readonly seam: { readonly bottom: Millimetres; readonly top: Millimetres }
      /** Legs of the notches, e_b and e_t of `physics` B.5. */
      readonly notch: { readonly bottom: Millimetres; readonly top: Millimetres }
      /** True where the throat runs along the pocket's length. */
      readonly throatAlong: 'length' | 'width'
      readonly layers: LayerMap
    }
  | {
      readonly kind: 'envelope'
      readonly style: 'square-flap'
      readonly pocket: { readonly length: Millimetres; readonly width: Millimetres }
      readonly back: Millimetres
      readonly sideFlap: Millimetres
      readonly flap: Millimetres
      /** Degrees each side of a side flap leans in. */
      readonly taper: number
      readonly throatAlong: 'length' | 'width'
      readonly layers: LayerMap
    }

export interface BoxForm {
  readonly kind: 'box'
  readonly scored: { readonly length: Millimetres; readonly width: Millimetres }
  readonly walls: {
    readonly length: readonly [Millimetres, Millimetres]
    readonly width: readonly [Millimetres, Millimetres]
  }
  /** The axis whose inside loses the tabs' layers: width where tabs are at the ends. */
  readonly tabbedAxis: 'length' | 'width'
}
