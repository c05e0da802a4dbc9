import { clearanceExamples } from './fit/clearance/clearance-examples.ts'
import { headspaceExamples } from './fit/headspace/headspace-examples.ts'
import { overlapExamples } from './fit/overlap/overlap-examples.ts'
import { printScaleExamples } from './fit/print-scale/print-scale-examples.ts'
import { openingExamples } from './fit/opening/opening-examples.ts'
import { airCushionExamples } from './fit/air-cushion/air-cushion-examples.ts'
import { caliperMissingExamples } from './stock/caliper-missing/caliper-missing-examples.ts'
import { caliperImplausibleExamples } from './stock/caliper-implausible/caliper-implausible-examples.ts'
import { scoreNeededExamples } from './stock/score-needed/score-needed-examples.ts'
import { grainAcrossFoldExamples } from './stock/grain-across-fold/grain-across-fold-examples.ts'
import { outlineExamples } from './blank/outline/outline-examples.ts'
import { wallTooDeepExamples } from './blank/wall-too-deep/wall-too-deep-examples.ts'
import { tabsCollideExamples } from './blank/tabs-collide/tabs-collide-examples.ts'
import { tabTooLongExamples } from './blank/tab-too-long/tab-too-long-examples.ts'
import { flapShortExamples } from './blank/flap-short/flap-short-examples.ts'
import { flapShowsExamples } from './blank/flap-shows/flap-shows-examples.ts'
import { backOpenExamples } from './blank/back-open/back-open-examples.ts'
import { seamNarrowExamples } from './blank/seam-narrow/seam-narrow-examples.ts'
import { innerPanelExamples } from './blank/inner-panel/inner-panel-examples.ts'
import { panelsUnequalExamples } from './blank/panels-unequal/panels-unequal-examples.ts'
import { tooLargeExamples } from './sheet/too-large/too-large-examples.ts'
import { marginExamples } from './sheet/margin/margin-examples.ts'
import { yieldExamples } from './sheet/yield/yield-examples.ts'
import { offGridExamples } from './ruler/off-grid/off-grid-examples.ts'
import { oneMarkExamples } from './ruler/one-mark/one-mark-examples.ts'
import { roundingExamples } from './ruler/rounding/rounding-examples.ts'
import { mailSizeExamples } from './mail/size/size-examples.ts'
import { mailRatioExamples } from './mail/ratio/ratio-examples.ts'
import { mailThicknessExamples } from './mail/thickness/thickness-examples.ts'
import { mailWeightExamples } from './mail/weight/weight-examples.ts'
import { worksExamples } from './set/works/works-examples.ts'
import { dependsOnCareExamples } from './set/depends-on-care/depends-on-care-examples.ts'
import { unusedPieceExamples } from './set/unused-piece/unused-piece-examples.ts'
import { offFamilySizeExamples } from './set/off-family-size/off-family-size-examples.ts'
import { stepsExamples } from './set/steps/steps-examples.ts'
import { lapsedExamples } from './waiver/lapsed/lapsed-examples.ts'
import { unusedExamples } from './waiver/unused/unused-examples.ts'
import type { RuleExamples } from './rule.ts'

/** Examples of every rule, in the order of the rules. Only `explain` and the tests load them. */
export const ruleExamples: readonly RuleExamples[] = [
  clearanceExamples,
  headspaceExamples,
  overlapExamples,
  printScaleExamples,
  openingExamples,
  airCushionExamples,
  caliperMissingExamples,
  caliperImplausibleExamples,
  scoreNeededExamples,
  grainAcrossFoldExamples,
  outlineExamples,
  wallTooDeepExamples,
  tabsCollideExamples,
  tabTooLongExamples,
  flapShortExamples,
  flapShowsExamples,
  backOpenExamples,
  seamNarrowExamples,
  innerPanelExamples,
  panelsUnequalExamples,
  tooLargeExamples,
  marginExamples,
  yieldExamples,
  offGridExamples,
  oneMarkExamples,
  roundingExamples,
  mailSizeExamples,
  mailRatioExamples,
  mailThicknessExamples,
  mailWeightExamples,
  worksExamples,
  dependsOnCareExamples,
  unusedPieceExamples,
  offFamilySizeExamples,
  stepsExamples,
  lapsedExamples,
  unusedExamples,
]
