import type { Point, Polygon } from '../geometry/shapes.ts'
import type { Millimetres } from '../units/units.ts'

/** What a mark is for: one layer an operation, so that a machine file can hold one alone. */
export type LayerName = 'cut' | 'valley' | 'mountain' | 'perforate' | 'glue' | 'dimension' | 'position' | 'legend'

/** A line along points; its look follows from its layer unless `weight` says otherwise. */
export interface LineMark {
  readonly kind: 'line'
  readonly layer: LayerName
  readonly points: readonly Point[]
  readonly isClosed: boolean
  /** `plain` draws it continuous and narrow whatever its layer: hatching, extension lines, frames. */
  readonly weight: 'own' | 'plain' | 'wide'
}

/** A filled shape: an arrowhead, a tick, a bar of a scale. */
export interface FillMark {
  readonly kind: 'fill'
  readonly layer: LayerName
  readonly polygon: Polygon
}

/** Where text is read in a document: headings give it structure, notes on a drawing follow it. */
export type TextRole = 'title' | 'heading' | 'paragraph' | 'label'

/** One line of text. `size` is the height of the font's body, `angle` degrees counter-clockwise about `at`. */
export interface TextMark {
  readonly kind: 'text'
  readonly layer: LayerName
  readonly at: Point
  readonly text: string
  readonly size: Millimetres
  readonly anchor: 'start' | 'middle' | 'end'
  readonly angle: number
  readonly isBold: boolean
  readonly role: TextRole
}

export type Mark = LineMark | FillMark | TextMark

/** Marks on a plane: millimetres, y upwards. */
export interface Drawing {
  readonly marks: readonly Mark[]
}

/** A page of a document; the origin is its lower left corner. */
export interface Page extends Drawing {
  readonly width: Millimetres
  readonly height: Millimetres
  /** What the page is of, for bookmarks and file names. */
  readonly title: string
  /** Finished size after trimming; `null` where the whole page is it. */
  readonly trim: {
    readonly left: Millimetres
    readonly bottom: Millimetres
    readonly right: Millimetres
    readonly top: Millimetres
  } | null
}

export const line = (
  layer: LayerName,
  points: readonly Point[],
  options: { readonly isClosed?: boolean; readonly weight?: LineMark['weight'] } = {},
): LineMark => ({
  kind: 'line',
  layer,
  points,
  isClosed: options.isClosed ?? false,
  weight: options.weight ?? 'own',
})

export const fill = (layer: LayerName, polygon: Polygon): FillMark => ({ kind: 'fill', layer, polygon })

export const text = (
  layer: LayerName,
  at: Point,
  content: string,
  size: Millimetres,
  options: Partial<Pick<TextMark, 'anchor' | 'angle' | 'isBold' | 'role'>> = {},
): TextMark => ({
  kind: 'text',
  layer,
  at,
  text: content,
  size,
  anchor: options.anchor ?? 'start',
  angle: options.angle ?? 0,
  isBold: options.isBold ?? false,
  role: options.role ?? 'label',
})
