import { languageDefaults } from '../pieces/language-defaults.ts'
import type { Ruler, RulerUnit } from '../units/units.ts'
import type { Maker, Tokens } from './template-model.ts'

const makers: readonly Maker[] = [
  {
    name: 'home',
    cut: languageDefaults.homeCut.value,
    score: languageDefaults.homeScore.value,
    fence: languageDefaults.homeFence.value,
  },
  {
    name: 'studio',
    cut: languageDefaults.studioCut.value,
    score: languageDefaults.studioScore.value,
    fence: languageDefaults.studioFence.value,
  },
  {
    name: 'die',
    cut: languageDefaults.dieCut.value,
    score: languageDefaults.dieScore.value,
    fence: languageDefaults.dieFence.value,
  },
]

/** Finest marks on the rulers of a unit. */
export const usualRuler = (units: RulerUnit): Ruler =>
  units === 'mm'
    ? { cut: languageDefaults.rulerMetric.value, score: languageDefaults.rulerMetric.value }
    : { cut: languageDefaults.rulerInchCut.value, score: languageDefaults.rulerInchScore.value }

/** What holds where neither a workspace nor a set says otherwise. */
export const builtInTokens = (): Tokens => ({
  units: 'mm',
  ruler: usualRuler('mm'),
  stocks: new Map(),
  sizes: new Map(),
  clearances: new Map(),
  makers: new Map(makers.map((maker) => [maker.name, maker])),
  workmanship: 'home',
  checks: new Map(),
  target: languageDefaults.targetShare.value,
  floor: languageDefaults.floorShare.value,
  humidity: null,
})
