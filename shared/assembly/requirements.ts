import { modelDefaults } from '../pieces/model-defaults.ts'
import type { AxisName, RequiredBand } from '../report/report.ts'
import type { Clearance, Fit } from '../template/template-model.ts'

/** What kind of fit it is, as far as its default requirement goes. */
export type FitCase = 'pocket' | 'tray' | 'divider' | 'bag' | 'lid' | 'sleeve' | 'band' | 'ribbon-knot' | 'ribbon-bow'

export interface Requirement {
  readonly band: RequiredBand
  /** Name of the clearance; `set` where the fit itself gives it; `default` where the model does. */
  readonly from: string
  readonly isStrict: boolean
}

const plane: ReadonlySet<AxisName> = new Set(['length', 'width'])

/** Requirement of the model where the author gives none: total clearance along one axis. Origins stand with the constants. */
export function defaultBand(fitCase: FitCase, axis: AxisName, contentSize: number, isOpen: boolean): RequiredBand {
  const value = (name: keyof typeof modelDefaults): number => modelDefaults[name].value
  if (axis === 'headspace') return { min: 0, max: null }
  switch (fitCase) {
    case 'pocket':
      return {
        min: value('envelopeLow'),
        max: isOpen ? null : Math.max(value('envelopeHigh'), value('envelopeHighShare') * contentSize),
      }
    case 'tray':
      return plane.has(axis) ? { min: value('boxLow'), max: value('boxHigh') } : { min: 0, max: null }
    case 'divider':
      return plane.has(axis) ? { min: value('dividerLow'), max: value('dividerHigh') } : { min: 0, max: null }
    case 'bag':
      return { min: value('bagLow'), max: value('bagHigh') }
    case 'lid':
      return { min: value('lidLow'), max: value('lidHigh') }
    case 'sleeve':
      return { min: value('sleeveLow'), max: value('sleeveHigh') }
    case 'band':
      return { min: value('bandOverlap'), max: null }
    case 'ribbon-knot':
      return { min: value('ribbonKnot'), max: null }
    case 'ribbon-bow':
      return { min: value('ribbonBow'), max: null }
  }
}

function givenBand(clearance: Clearance, axis: AxisName): RequiredBand | null {
  return clearance[axis]
}

/** The requirement that holds for an axis: the fit's own or named clearance, else the model's default. */
export function requirementOf(
  fit: Fit,
  fitCase: FitCase,
  axis: AxisName,
  contentSize: number,
  isOpen: boolean,
): Requirement {
  const own = fit.clearance
  const given = own === null ? null : givenBand(own, axis)
  const isStrict = own?.strict ?? false
  // Without a lower end a thing must still go in: nothing may be smaller than what it holds.
  if (given !== null) return { band: { min: given.min ?? 0, max: given.max }, from: own?.name ?? 'set', isStrict }
  return { band: defaultBand(fitCase, axis, contentSize, isOpen), from: 'default', isStrict }
}
