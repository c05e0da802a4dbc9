import { languageDefaults } from '../language-defaults.ts'
import { readPieceBase } from '../reading/read-piece-base.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { Millimetres } from '../../units/units.ts'
import type { EnvelopeGiven } from './envelope-given.ts'
import type { EnvelopeWritten } from './envelope-shape.ts'

/** Two sides of a square may differ by no more than rounding of their units. */
const squareness = 0.01

function refuse(
  keys: readonly (keyof EnvelopeWritten)[],
  written: EnvelopeWritten,
  read: ValueReader,
  where: string,
  remedy: string,
): void {
  for (const key of keys) {
    if (written[key] !== undefined) read.report([key], 'conflicting-keys', `“${key}” has no place ${where}.`, remedy)
  }
}

function readSeam(
  written: EnvelopeWritten['seam'],
  read: ValueReader,
): { readonly bottom: Millimetres; readonly top: Millimetres } {
  if (written === undefined)
    return { bottom: languageDefaults.baronialSeam.value, top: languageDefaults.baronialSeam.value }
  if (typeof written !== 'string') {
    return { bottom: read.length(['seam', 'bottom'], written.bottom), top: read.length(['seam', 'top'], written.top) }
  }
  const seam = read.length(['seam'], written)
  return { bottom: seam, top: seam }
}

/** Side of the square that a baronial envelope is folded from. */
function readSquare(written: string, read: ValueReader): Millimetres {
  const size = read.size(['blank'], written)
  if (Math.abs(size.length - size.width) > squareness) {
    read.report(
      ['blank'],
      'not-square',
      `A baronial envelope is folded from a square, and “${written}” is none.`,
      'Write the same length twice, such as “210 x 210 mm”.',
      'value',
    )
  }
  return size.length
}

/** Reads an envelope in any of the three ways it may be given. */
export function readEnvelope(name: string, written: EnvelopeWritten, read: ValueReader): EnvelopeGiven {
  const base = {
    ...readPieceBase(name, written, read),
    kind: 'envelope' as const,
    stock: read.stock(['stock'], written.stock),
    liner: written.liner === undefined ? null : read.stock(['liner'], written.liner),
  }
  if (written.style === 'square-flap') {
    refuse(
      ['seam', 'blank', 'corners'],
      written,
      read,
      'in a square-flap envelope',
      'Give the “pocket”, and “back”, “side-flap” or “flap” where they are not the usual ones.',
    )
    if (written.pocket === undefined) {
      read.report(
        ['pocket'],
        'missing-key',
        'A square-flap envelope needs a “pocket”.',
        'Write “pocket” with a size from score to score, or with “fit”.',
      )
    }
    return {
      ...base,
      style: 'square-flap',
      pocket: written.pocket === undefined ? { length: NaN, width: NaN } : read.sizeOrFit(['pocket'], written.pocket),
      back: read.lengthOr(['back'], written.back, null),
      sideFlap: read.lengthOr(['side-flap'], written['side-flap'], null),
      flap: read.lengthOr(['flap'], written.flap, null),
    }
  }
  refuse(
    ['back', 'side-flap', 'flap'],
    written,
    read,
    'in a baronial envelope',
    'Take it out, or write “style: square-flap”.',
  )
  if (written.corners !== undefined || (written.blank !== undefined && written.pocket === undefined)) {
    refuse(
      ['pocket', 'seam'],
      written,
      read,
      'beside “blank” and “corners”',
      'Give either “pocket” and “seam”, or “blank” and “corners”.',
    )
    if (written.blank === undefined)
      read.report(
        ['blank'],
        'missing-key',
        'An envelope given by “corners” needs its “blank”.',
        'Write “blank” with a square, such as “210 x 210 mm”.',
      )
    if (written.corners === undefined)
      read.report(
        ['corners'],
        'missing-key',
        'An envelope given by its “blank” needs “corners”.',
        'Write “corners” with “{ sides, bottom, flap }”, or give the “pocket” instead.',
      )
    const corners = written.corners
    const [left, right] =
      corners === undefined
        ? [NaN, NaN]
        : typeof corners.sides === 'string'
          ? [read.length(['corners', 'sides'], corners.sides), read.length(['corners', 'sides'], corners.sides)]
          : [
              read.length(['corners', 'sides', 0], corners.sides[0]),
              read.length(['corners', 'sides', 1], corners.sides[1]),
            ]
    return {
      ...base,
      style: 'baronial',
      by: 'corners',
      square: written.blank === undefined ? NaN : readSquare(written.blank, read),
      corners: {
        left,
        right,
        bottom: corners === undefined ? NaN : read.length(['corners', 'bottom'], corners.bottom),
        flap: corners === undefined ? NaN : read.length(['corners', 'flap'], corners.flap),
      },
    }
  }
  refuse(['blank'], written, read, 'beside “pocket”', 'Give either “pocket” and “seam”, or “blank” and “corners”.')
  if (written.pocket === undefined) {
    read.report(
      ['pocket'],
      'missing-key',
      'A baronial envelope needs a “pocket”.',
      'Write “pocket” with a size from score to score, or “blank” and “corners”.',
    )
  }
  return {
    ...base,
    style: 'baronial',
    by: 'pocket',
    pocket: written.pocket === undefined ? { length: NaN, width: NaN } : read.sizeOrFit(['pocket'], written.pocket),
    seam: readSeam(written.seam, read),
  }
}
