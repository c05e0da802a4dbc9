import type { NamedSize } from '../template/template-model.ts'

const inches = (length: number, width: number): NamedSize => ({
  length: (length * 127) / 5,
  width: (width * 127) / 5,
})

/** ISO 216 A, B and C sizes, 0 to 10, long side first, mm (secondary source, agreeing with readings of DIN 476 and 678). */
const isoSeries = {
  a: [
    [1189, 841],
    [841, 594],
    [594, 420],
    [420, 297],
    [297, 210],
    [210, 148],
    [148, 105],
    [105, 74],
    [74, 52],
    [52, 37],
    [37, 26],
  ],
  b: [
    [1414, 1000],
    [1000, 707],
    [707, 500],
    [500, 353],
    [353, 250],
    [250, 176],
    [176, 125],
    [125, 88],
    [88, 62],
    [62, 44],
    [44, 31],
  ],
  c: [
    [1297, 917],
    [917, 648],
    [648, 458],
    [458, 324],
    [324, 229],
    [229, 162],
    [162, 114],
    [114, 81],
    [81, 57],
    [57, 40],
    [40, 28],
  ],
} as const

/** Announcement-series cards and envelopes, inches; merchants' and trade tables, which disagree where a variant is named. */
const american: Readonly<Record<string, NamedSize>> = {
  'us-a1-envelope': inches(5.125, 3.625),
  'us-a1-card': inches(4.875, 3.5),
  'us-a2-envelope': inches(5.75, 4.375),
  'us-a2-card': inches(5.5, 4.25),
  'us-a4-envelope': inches(6.25, 4.25),
  'us-a6-envelope': inches(6.5, 4.75),
  'us-a6-card': inches(6.25, 4.5),
  'us-a6-card-wide': inches(6.25, 4.625),
  'us-a7-envelope': inches(7.25, 5.25),
  'us-a7-card': inches(7, 5),
  'us-a7-card-stationer': inches(7, 5.125),
  'us-a8-envelope': inches(8.125, 5.5),
  'us-a8-card': inches(7.875, 5.25),
  'us-a8-card-stationer': inches(7.875, 5.375),
  'us-a9-envelope': inches(8.75, 5.75),
  'us-a9-card': inches(8.5, 5.5),
  'us-a10-envelope': inches(9.5, 6),
  'us-a10-card': inches(9.25, 5.75),
  'us-no-9-envelope': inches(8.875, 3.875),
  'us-no-10-envelope': inches(9.5, 4.125),
  'us-no-10-card': inches(9.25, 3.875),
}

/** Envelopes of DIN 678 and ISO 269 that are in no series, and A4 folded in three. */
const furtherIso: Readonly<Record<string, NamedSize>> = {
  'iso-dl': { length: 220, width: 110 },
  'iso-c6-c5': { length: 229, width: 114 },
  'iso-a4-in-three': { length: 210, width: 99 },
}

let table: ReadonlyMap<string, NamedSize> | null = null

function sizes(): ReadonlyMap<string, NamedSize> {
  table ??= new Map([
    ...Object.entries(isoSeries).flatMap(([series, rows]) =>
      rows.map(([length, width], index) => [`iso-${series}${String(index)}`, { length, width }] as const),
    ),
    ...Object.entries(furtherIso),
    ...Object.entries(american),
  ])
  return table
}

/** A finished size every workspace knows, such as `iso-a6` or `us-a2-card`; `null` for other names. */
export const builtInSize = (name: string): NamedSize | null => sizes().get(name) ?? null

export const builtInSizeNames = (): readonly string[] => [...sizes().keys()]

/** A bare name such as `a6` or `a2` could be either of two papers: the built-in sizes to offer instead. */
export function ambiguousSize(name: string): readonly string[] | null {
  if (!/^[abc]\d{1,2}$/.test(name)) return null
  const offers = [`iso-${name}`, `us-${name}-card`].filter((candidate) => sizes().has(candidate))
  return offers.length > 0 ? offers : null
}
