import type { Path } from '../reading/report-problem.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { CardLayer } from './card-given.ts'

export interface BannerWritten {
  readonly depth: string
  readonly point: 'in' | 'out'
}

/** Reads the point or notch of a flag; `null` where there is none. */
export function readBanner(keys: Path, written: BannerWritten | undefined, read: ValueReader): CardLayer['banner'] {
  if (written === undefined) return null
  return { depth: read.length([...keys, 'banner', 'depth'], written.depth), point: written.point }
}
