import type { Path } from '../pieces/reading/report-problem.ts'
import type { ValueReader } from '../pieces/reading/value-reader.ts'
import type { Clearance } from './template-model.ts'
import type { ClearanceWritten } from './token-shapes.ts'

/**
 * Reads what a fit must leave: one range for both axes in the plane, or a range an axis.
 * @param name of a named requirement; `null` where a fit gives its own
 */
export function readClearance(
  keys: Path,
  name: string | null,
  written: ClearanceWritten,
  read: ValueReader,
): Clearance {
  if (typeof written === 'string') {
    const both = read.range(keys, written)
    return { name, length: both, width: both, depth: null, headspace: null, overlap: null, strict: false }
  }
  const range = (axis: 'sides' | 'length' | 'width' | 'depth' | 'headspace' | 'overlap') => {
    const text = written[axis]
    return text === undefined ? null : read.range([...keys, axis], text)
  }
  const sides = range('sides')
  return {
    name,
    length: range('length') ?? sides,
    width: range('width') ?? sides,
    depth: range('depth'),
    headspace: range('headspace'),
    overlap: range('overlap'),
    strict: written.strict ?? false,
  }
}
