import { readPieceBase } from '../reading/read-piece-base.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { BoughtGiven, BoughtSize } from './bought-given.ts'
import type { BoughtWritten } from './bought-shape.ts'

const unread = { nominal: NaN, halfWidth: null, text: '' }

function readSize(key: 'inside' | 'outside', written: string | undefined, read: ValueReader): BoughtSize | null {
  if (written === undefined) return null
  const [length = unread, width = unread, depth = null] = read.space([key], written, {
    extents: '2 or 3',
    allowTolerance: true,
  })
  return { length, width, depth }
}

/** Reads a thing that is not made from our sheets. */
export function readBought(name: string, written: BoughtWritten, read: ValueReader): BoughtGiven {
  if (written.inside === undefined && written.outside === undefined) {
    read.report(
      ['outside'],
      'missing-key',
      'A bought thing needs its “inside” or its “outside”.',
      'Write “outside” with its size, such as “146 x 111 mm”, and “inside” where something goes into it.',
    )
  }
  return {
    ...readPieceBase(name, written, read),
    kind: 'bought',
    stock: null,
    inside: readSize('inside', written.inside, read),
    outside: readSize('outside', written.outside, read),
    thickness:
      written.thickness === undefined ? null : read.toleranced(['thickness'], written.thickness, { allowZero: true }),
  }
}
