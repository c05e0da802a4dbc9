import { modelSet } from '../assembly/set-model.ts'
import type { BoxGiven } from '../pieces/box/box-given.ts'
import type { Fit, TemplateSet } from '../template/template-model.ts'
import { subtract } from '../uncertainty/arithmetic.ts'
import { ceilToGrid, floorToGrid } from '../units/grid.ts'
import { modelDefaults } from '../pieces/model-defaults.ts'
import type { ModelOptions } from '../assembly/set-model.ts'
import { axisAsLaid, leastValue, requirementInWords, type Bound, type Least } from './least-value.ts'
import type { ChosenSize } from './sizing.ts'

/** Share of its base's wall that a lid is given where nothing else asks for more (common practice). */
const lidShare = 0.6

export interface SizedPiece<Given> {
  readonly given: Given
  readonly chosen: readonly ChosenSize[]
}

export type Unsizable = { readonly requirement: string; readonly message: string; readonly nearest: string | null }

interface Trial {
  readonly set: TemplateSet
  readonly options: ModelOptions
}

/** The box with a blank so large and walls so deep. */
const boxOf = (given: BoxGiven, length: number, width: number, wall: number): BoxGiven => ({
  ...given,
  by: { given: 'blank', blank: { length, width }, wall: { length: [wall, wall], width: [wall, wall] } },
})

const withGiven = (set: TemplateSet, given: BoxGiven): TemplateSet => ({
  ...set,
  pieces: new Map([...set.pieces, [given.name, given]]),
})

/** Fits that make the box's inside: what lies in it, or the base it goes over. Dividers are cut to the box instead. */
function shapingFits(set: TemplateSet, name: string): readonly Fit[] {
  return set.fits.filter(
    (fit) =>
      (fit.relation === 'in' &&
        fit.to === name &&
        !fit.put.some((entry) => set.pieces.get(entry.piece)?.kind === 'divider')) ||
      (fit.relation === 'over' && fit.put[0]?.piece === name),
  )
}

/** Where the search starts: larger than anything made by hand, so that whatever goes in goes in as it is laid. */
const roomy = 1000

function planeBounds(trial: Trial, given: BoxGiven, axis: 'length' | 'width', wall: number): readonly Bound[] {
  return shapingFits(trial.set, given.name).map((fit) => {
    // A size is sought for things as they lie; the check may still turn them where that binds less.
    const asLaid: Fit = { ...fit, turn: fit.turn ?? 'none' }
    const at = (value: number) => {
      const piece =
        axis === 'length' ? boxOf(given, value, value, wall) : boxOf(given, Math.max(roomy, value), value, wall)
      return axisAsLaid(modelSet(withGiven(trial.set, piece), trial.options), asLaid, axis)
    }
    return {
      requirement: requirementInWords(fit.id, at(roomy)),
      clearanceAt: (value) => {
        const { clearance, requirement } = at(value)
        return { clearance, band: requirement.band }
      },
    }
  })
}

/** Depth of a base from what lies in it and the headspace its lid asks for. */
function wallOfBase(whole: TemplateSet, trial: Trial, given: BoxGiven): Least | Unsizable {
  const lid = whole.fits.find((fit) => fit.relation === 'over' && fit.to === given.name)
  const inside = whole.fits.find((fit) => fit.relation === 'in' && fit.to === given.name)
  const min = (lid === undefined ? inside?.clearance?.depth?.min : lid.clearance?.headspace?.min) ?? 0
  const content = modelSet(withGiven(trial.set, boxOf(given, 200, 200, 50)), trial.options).contentHeight(given.name)
  if (content === null) {
    return {
      requirement: `depth of ${given.name}`,
      message: `nothing lies in ${given.name}, so nothing says how deep it must be`,
      nearest: `give its wall, or a fit that puts something in ${given.name}`,
    }
  }
  const found = leastValue(
    [
      {
        requirement:
          lid === undefined
            ? `depth of ${given.name}: at least ${String(min)} mm over the pack`
            : `${lid.id}, headspace: at least ${String(min)} mm`,
        clearanceAt: (wall) => {
          const box = modelSet(withGiven(trial.set, boxOf(given, 200, 200, wall)), trial.options).folded(given.name)
          return { clearance: subtract(box.cavity?.depth ?? content, content), band: { min, max: null } }
        },
      },
    ],
    content.nominal + 5,
    whole.tokens.ruler.score,
    whole.tokens.target,
  )
  return (
    found ?? { requirement: `depth of ${given.name}`, message: `no depth is asked of ${given.name}`, nearest: null }
  )
}

/** Depth of a lid: part of its base's wall, so that enough of the base shows to lift it by. */
function wallOfLid(trial: Trial, base: string, grid: number): Least {
  const wall = modelSet(trial.set, trial.options).folded(base).outside.height.nominal
  const wanted = lidShare * wall
  const most = floorToGrid(wall - modelDefaults.openingExposed.value, grid)
  const value = Math.max(grid, Math.min(ceilToGrid(wanted, grid), most > 2 * grid ? most : ceilToGrid(wanted, grid)))
  return {
    value,
    unrounded: wanted,
    limitedBy: `${String(lidShare * 100)} % of the wall of ${base}, which leaves some of it showing (common practice)`,
  }
}

const isUnsizable = (found: Least | Unsizable): found is Unsizable => 'message' in found

/** Sizes a box or lid inside out: depth, then the two score distances, each on the ruler grid. */
export function sizeBox(whole: TemplateSet, trial: Trial, given: BoxGiven): SizedPiece<BoxGiven> | Unsizable {
  const { ruler, target } = whole.tokens
  const lidFit = whole.fits.find((fit) => fit.relation === 'over' && fit.put[0]?.piece === given.name)
  const fixedWall = given.by.given === 'blank' && given.by.wall !== 'fit' ? given.by.wall.length[0] : null
  const wall: Least | Unsizable =
    fixedWall !== null
      ? { value: fixedWall, unrounded: fixedWall, limitedBy: 'given' }
      : lidFit === undefined
        ? wallOfBase(whole, trial, given)
        : wallOfLid(trial, lidFit.to, ruler.score)
  if (isUnsizable(wall)) return wall
  const wallChoice: readonly ChosenSize[] =
    fixedWall === null ? [{ piece: given.name, path: ['pieces', given.name, 'wall'], what: 'wall', ...wall }] : []
  if (given.by.given === 'blank' && given.by.blank !== 'fit') {
    const { blank } = given.by
    return { given: boxOf(given, blank.length, blank.width, wall.value), chosen: wallChoice }
  }
  // The blank is what is cut, so it is the blank that lands on the cutting grid; its scores follow from the walls.
  const length = leastValue(planeBounds(trial, given, 'length', wall.value), roomy, ruler.cut, target)
  const width = leastValue(planeBounds(trial, given, 'width', wall.value), roomy, ruler.cut, target)
  if (length === null || width === null) {
    return {
      requirement: `inside of ${given.name}`,
      message: `nothing goes into ${given.name} and it goes over nothing, so nothing says how large it must be`,
      nearest: `give its blank, or a fit that names ${given.name}`,
    }
  }
  const path = ['pieces', given.name, 'blank']
  return {
    given: boxOf(given, Math.max(length.value, width.value), width.value, wall.value),
    chosen: [
      { piece: given.name, path, what: 'blank length', ...length },
      { piece: given.name, path, what: 'blank width', ...width },
      ...wallChoice,
    ],
  }
}
