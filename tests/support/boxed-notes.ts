/** Sizes of the boxed notes that tests vary; millimetres. */
export interface BoxedNotes {
  readonly card: string
  readonly pocket: string
  readonly base: string
  readonly baseWall: number
  readonly lid: string
  readonly lidWall: number
  readonly count: number
  readonly made: 'measured' | 'printed'
  readonly caliper: number
}

const usual: BoxedNotes = {
  card: '148 x 105',
  pocket: '156 x 112',
  base: '200 x 158',
  baseWall: 20,
  lid: '190 x 149',
  lidWall: 14,
  count: 6,
  made: 'measured',
  caliper: 0.32,
}

/** A set of five pieces that stands alone and passes: cards in envelopes in a box with a lid and a band. */
export function boxedNotes(changes: Partial<BoxedNotes> = {}): string {
  const it = { ...usual, ...changes }
  return `foldgauge: 1
set: boxed-notes
title: Boxed notes
sheet: a3
stocks:
  cover: { grammage: 270 gsm, caliper: ${String(it.caliper)} mm ± 6 %, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm }
clearances:
  slip-lid: { sides: 0.2..3 mm, headspace: 0.5.. mm }
checks: { ruler/off-grid: off, ruler/rounding: off }
pieces:
  card: { kind: card, stock: cover, folded: ${it.card}, fold: long-edge, raised: 0.8 mm }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: ${it.pocket}, seam: 12 }
  base: { kind: box, stock: cover, blank: ${it.base}, wall: ${String(it.baseWall)}, made: ${it.made} }
  lid: { kind: lid, stock: cover, blank: ${it.lid}, wall: ${String(it.lidWall)}, made: ${it.made} }
  band: { kind: band, stock: text, around: lid, width: 40, overlap: 15 }
fits:
  card-in-envelope: { put: card, in: envelope }
  pack-in-base: { put: envelope, holding: card, count: ${String(it.count)}, in: base }
  lid-on-base: { put: lid, over: base, clearance: slip-lid }
  band-on-box: { put: band, around: lid }
`
}
