import type { Millimetres } from '../units/units.ts'
import type { LayerName } from './drawing.ts'

/**
 * How a line looks and what it means. Widths are two, one twice the other, as ISO 128 pairs them (published); dashed
 * valley and dash-dot mountain follow the origami convention (published). No meaning hangs on colour.
 */
export interface LineStyle {
  readonly width: Millimetres
  /** Lengths of dash and gap in turn; empty for a continuous line. */
  readonly dash: readonly Millimetres[]
  readonly isRoundEnded: boolean
  /** The word and the tick that tell it apart where its pattern does not. */
  readonly word: string
  readonly tick: string
  /** What to do with it, for the legend. */
  readonly meaning: string
}

export const wideLine: Millimetres = 0.5
export const narrowLine: Millimetres = 0.25

export const lineStyles: Readonly<Record<LayerName, LineStyle>> = {
  cut: { width: wideLine, dash: [], isRoundEnded: false, word: 'cut', tick: 'C', meaning: 'cut along it' },
  valley: {
    width: narrowLine,
    dash: [3, 1.5],
    isRoundEnded: false,
    word: 'valley',
    tick: 'V',
    meaning: 'score; fold towards you',
  },
  mountain: {
    width: narrowLine,
    dash: [5, 1.25, 0.5, 1.25],
    isRoundEnded: false,
    word: 'mountain',
    tick: 'M',
    meaning: 'score; fold away from you',
  },
  perforate: {
    width: wideLine,
    dash: [0, 1.5],
    isRoundEnded: true,
    word: 'tear',
    tick: 'T',
    meaning: 'perforate, to tear',
  },
  glue: { width: narrowLine, dash: [], isRoundEnded: false, word: 'glue', tick: 'G', meaning: 'glue goes here' },
  dimension: {
    width: narrowLine,
    dash: [],
    isRoundEnded: false,
    word: 'size',
    tick: '',
    meaning: 'a measure, not a line to cut',
  },
  position: {
    width: narrowLine,
    dash: [1, 1],
    isRoundEnded: false,
    word: 'place',
    tick: 'P',
    meaning: 'where something is stuck on',
  },
  legend: { width: narrowLine, dash: [], isRoundEnded: false, word: 'note', tick: '', meaning: 'notes and scale bars' },
}

/** Layers in the order they are drawn and listed. */
export const layerOrder: readonly LayerName[] = [
  'glue',
  'position',
  'cut',
  'perforate',
  'valley',
  'mountain',
  'dimension',
  'legend',
]

/** Plain names for layers of files, as a maker or a machine's software shows them. */
export const layerTitles: Readonly<Record<LayerName, string>> = {
  cut: 'Cut',
  valley: 'Score valley',
  mountain: 'Score mountain',
  perforate: 'Perforate',
  glue: 'Glue',
  dimension: 'Dimensions',
  position: 'Positions',
  legend: 'Legend',
}

/** Whole repeats a pattern needs to be told from another. */
export const leastRepeats = 3

/** Length over which a pattern repeats; 0 for a continuous line. */
export const periodOf = (style: LineStyle): Millimetres => style.dash.reduce((sum, part) => sum + part, 0)

/**
 * The dash pattern for a line of a length: shortened where fewer than three whole repeats would fit, but never to less
 * than a third, below which a home printer runs dashes together; then the tick on the line tells it apart.
 */
export function dashFor(style: LineStyle, length: Millimetres): readonly Millimetres[] {
  const period = periodOf(style)
  if (period === 0 || length >= leastRepeats * period) return style.dash
  const share = Math.max(1 / 3, length / (leastRepeats * period))
  return style.dash.map((part) => part * share)
}
