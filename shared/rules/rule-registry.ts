import { clearanceRule } from './fit/clearance/clearance.ts'
import { headspaceRule } from './fit/headspace/headspace.ts'
import { overlapRule } from './fit/overlap/overlap.ts'
import { printScaleRule } from './fit/print-scale/print-scale.ts'
import { openingRule } from './fit/opening/opening.ts'
import { airCushionRule } from './fit/air-cushion/air-cushion.ts'
import { caliperMissingRule } from './stock/caliper-missing/caliper-missing.ts'
import { caliperImplausibleRule } from './stock/caliper-implausible/caliper-implausible.ts'
import { scoreNeededRule } from './stock/score-needed/score-needed.ts'
import { grainAcrossFoldRule } from './stock/grain-across-fold/grain-across-fold.ts'
import { outlineRule } from './blank/outline/outline.ts'
import { wallTooDeepRule } from './blank/wall-too-deep/wall-too-deep.ts'
import { tabsCollideRule } from './blank/tabs-collide/tabs-collide.ts'
import { tabTooLongRule } from './blank/tab-too-long/tab-too-long.ts'
import { flapShortRule } from './blank/flap-short/flap-short.ts'
import { flapShowsRule } from './blank/flap-shows/flap-shows.ts'
import { backOpenRule } from './blank/back-open/back-open.ts'
import { seamNarrowRule } from './blank/seam-narrow/seam-narrow.ts'
import { innerPanelRule } from './blank/inner-panel/inner-panel.ts'
import { panelsUnequalRule } from './blank/panels-unequal/panels-unequal.ts'
import { tooLargeRule } from './sheet/too-large/too-large.ts'
import { marginRule } from './sheet/margin/margin.ts'
import { yieldRule } from './sheet/yield/yield.ts'
import { offGridRule } from './ruler/off-grid/off-grid.ts'
import { oneMarkRule } from './ruler/one-mark/one-mark.ts'
import { roundingRule } from './ruler/rounding/rounding.ts'
import { mailSizeRule } from './mail/size/size.ts'
import { mailRatioRule } from './mail/ratio/ratio.ts'
import { mailThicknessRule } from './mail/thickness/thickness.ts'
import { mailWeightRule } from './mail/weight/weight.ts'
import { worksRule } from './set/works/works.ts'
import { dependsOnCareRule } from './set/depends-on-care/depends-on-care.ts'
import { unusedPieceRule } from './set/unused-piece/unused-piece.ts'
import { offFamilySizeRule } from './set/off-family-size/off-family-size.ts'
import { stepsRule } from './set/steps/steps.ts'
import { lapsedRule } from './waiver/lapsed/lapsed.ts'
import { unusedRule } from './waiver/unused/unused.ts'
import type { Rule } from './rule.ts'

/** Every rule in the order in which they judge and report; rules about waivers come last, for they look at what the others said. */
export const rules: readonly Rule[] = [
  clearanceRule,
  headspaceRule,
  overlapRule,
  printScaleRule,
  openingRule,
  airCushionRule,
  caliperMissingRule,
  caliperImplausibleRule,
  scoreNeededRule,
  grainAcrossFoldRule,
  outlineRule,
  wallTooDeepRule,
  tabsCollideRule,
  tabTooLongRule,
  flapShortRule,
  flapShowsRule,
  backOpenRule,
  seamNarrowRule,
  innerPanelRule,
  panelsUnequalRule,
  tooLargeRule,
  marginRule,
  yieldRule,
  offGridRule,
  oneMarkRule,
  roundingRule,
  mailSizeRule,
  mailRatioRule,
  mailThicknessRule,
  mailWeightRule,
  worksRule,
  dependsOnCareRule,
  unusedPieceRule,
  offFamilySizeRule,
  stepsRule,
  lapsedRule,
  unusedRule,
]
