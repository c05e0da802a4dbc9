import { readBanner } from '../card/read-banner.ts'
import { languageDefaults } from '../language-defaults.ts'
import { readPieceBase } from '../reading/read-piece-base.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { Millimetres } from '../../units/units.ts'
import type { Open } from '../piece-base.ts'
import type { BoxGiven, TabsGiven, WallsGiven } from './box-given.ts'
import type { BoxWritten } from './box-shape.ts'

/** How tabs are made where the author does not say. */
const usualTabs: TabsGiven = {
  at: 'ends',
  glued: 'inside',
  trim: languageDefaults.tabTrim.value,
  taper: languageDefaults.tabTaper.value,
}

const unread: WallsGiven = { length: [NaN, NaN], width: [NaN, NaN] }

function readPair(
  axis: 'length' | 'width',
  written: string | readonly [string, string],
  read: ValueReader,
): readonly [Millimetres, Millimetres] {
  if (typeof written === 'string') {
    const both = read.length(['wall', axis], written)
    return [both, both]
  }
  return [read.length(['wall', axis, 0], written[0]), read.length(['wall', axis, 1], written[1])]
}

function readWalls(written: BoxWritten['wall'], read: ValueReader): WallsGiven | Open {
  if (written === undefined) return unread
  if (typeof written !== 'string')
    return { length: readPair('length', written.length, read), width: readPair('width', written.width, read) }
  const wall = read.lengthOrFit(['wall'], written)
  return wall === 'fit' ? wall : { length: [wall, wall], width: [wall, wall] }
}

function readTabs(written: BoxWritten['tabs'], read: ValueReader): TabsGiven {
  if (written === undefined) return usualTabs
  return {
    at: written.at ?? usualTabs.at,
    glued: written.glued ?? usualTabs.glued,
    trim: read.lengthOr(['tabs', 'trim'], written.trim, usualTabs.trim, { allowZero: true }),
    taper: written.taper === undefined ? usualTabs.taper : read.angle(['tabs', 'taper'], written.taper, 0, 45),
  }
}

function readMeasures(written: BoxWritten, read: ValueReader): BoxGiven['by'] {
  if (written.inside !== undefined) {
    for (const key of ['blank', 'wall'] as const) {
      if (written[key] === undefined) continue
      read.report(
        [key],
        'conflicting-keys',
        `“${key}” has no place beside “inside”, from which it is reckoned.`,
        'Give either “blank” and “wall”, or “inside”.',
      )
    }
    if (written.inside.trim() === 'fit') {
      read.leaveOpen(['inside'])
      return { given: 'inside', inside: 'fit' }
    }
    const [length, width, depth] = read.space(['inside'], written.inside, { extents: 3, allowTolerance: false })
    return {
      given: 'inside',
      inside: { length: length?.nominal ?? NaN, width: width?.nominal ?? NaN, depth: depth?.nominal ?? NaN },
    }
  }
  const noun = written.kind
  if (written.blank === undefined && written.wall === undefined) {
    read.report(
      ['blank'],
      'missing-key',
      `A ${noun} needs its “blank” and “wall”, or its “inside”.`,
      'Write “blank” with the size of the sheet and “wall” with how far from its edges the walls are scored, or “inside” with length x width x depth.',
    )
  } else if (written.blank === undefined) {
    read.report(
      ['blank'],
      'missing-key',
      `A ${noun} with a “wall” needs its “blank”.`,
      'Write “blank” with the size of the sheet, or with “fit”.',
    )
  } else if (written.wall === undefined) {
    read.report(
      ['wall'],
      'missing-key',
      `A ${noun} with a “blank” needs its “wall”.`,
      'Write “wall” with how far from the edges the walls are scored, or with “fit”.',
    )
  }
  return {
    given: 'blank',
    blank: written.blank === undefined ? { length: NaN, width: NaN } : read.sizeOrFit(['blank'], written.blank),
    wall: readWalls(written.wall, read),
  }
}

/** Reads a box or a lid. */
export function readBox(name: string, written: BoxWritten, read: ValueReader): BoxGiven {
  return {
    ...readPieceBase(name, written, read),
    kind: written.kind,
    stock: read.stock(['stock'], written.stock),
    by: readMeasures(written, read),
    tabs: readTabs(written.tabs, read),
    walls: written.walls ?? 'single',
    thumbNotch: written['thumb-notch'] ?? false,
    covered: written.covered === undefined ? null : read.stock(['covered'], written.covered),
    layers: (written.layers ?? []).map((layer, index) => {
      const keys = ['layers', index]
      return {
        stock: read.stock([...keys, 'stock'], layer.stock),
        size: read.size([...keys, 'size'], layer.size),
        banner: readBanner(keys, layer.banner, read),
        on: layer.on,
      }
    }),
  }
}
