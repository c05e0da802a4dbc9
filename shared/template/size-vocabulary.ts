import type { GivenSize } from '../pieces/piece-base.ts'
import { ambiguousSize, builtInSize, builtInSizeNames } from '../stock/built-in-sizes.ts'
import type { Reading } from '../units/units.ts'

type Nearest = (word: string, names: Iterable<string>) => string | null

/**
 * Looks sizes up by name: the author's own first, then those built in, which are added to the author's once used.
 * @param named sizes of the author's, by name
 * @param siblings names of sizes that are still being read
 */
export function createSizeLookup(named: Map<string, GivenSize>, siblings: ReadonlySet<string>, nearest: Nearest) {
  return (name: string): Reading<GivenSize> => {
    const own = named.get(name)
    if (own !== undefined) return { ok: true, value: own }
    if (siblings.has(name)) {
      return {
        ok: false,
        code: 'size-of-size',
        fact: `“${name}” is another size of this file`,
        remedy: 'Write its lengths, such as “148 x 105 mm”',
      }
    }
    const builtIn = builtInSize(name)
    if (builtIn !== null) {
      named.set(name, builtIn)
      return { ok: true, value: builtIn }
    }
    const offers = ambiguousSize(name.toLowerCase())
    if (offers !== null) {
      return {
        ok: false,
        code: 'ambiguous-size',
        fact: `“${name}” is not a size by itself`,
        remedy: `Write ${offers.map((offer) => `“${offer}”`).join(' or ')}, or define “${name}” under “sizes”`,
      }
    }
    const meant = nearest(name, [...named.keys(), ...builtInSizeNames()])
    return {
      ok: false,
      code: 'unknown-size',
      fact: `There is no size called “${name}”`,
      remedy:
        meant === null
          ? 'Add it under “sizes”, or write its lengths, such as “148 x 105 mm”'
          : `Did you mean “${meant}”?`,
    }
  }
}
