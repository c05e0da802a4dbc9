import { nearestName } from '../units/did-you-mean.ts'
import { longestMeasure, quoted, refuse } from '../units/refuse.ts'
import type { Reading } from '../units/units.ts'
import { basicSizeArea, basisWeightToGrammage, type PaperGrade } from './basis-weight.ts'

const grades = Object.keys(basicSizeArea) as readonly PaperGrade[]
const isGrade = (word: string): word is PaperGrade => (grades as readonly string[]).includes(word)

/** A weight of paper in g/m²: `270 gsm`, `270 g/m2`, or a basis weight with its grade, `80 lb cover`. */
export function parseWeight(source: string): Reading<number> {
  const text = source.trim()
  const metric = /^(\d+(?:\.\d+)?)\s*(?:gsm|g\/m2|g\/m²|g\/m\^2)$/iu.exec(text)
  const basis = /^(\d+(?:\.\d+)?)\s*(?:lb|lbs|#)\s*([a-z]+)?$/iu.exec(text)
  if (/^\d+,\d+/.test(text))
    return refuse(
      'weight-decimal-comma',
      `${quoted(text)} has a decimal comma`,
      `write a dot: ${text.slice(0, longestMeasure).replace(',', '.')}`,
    )
  let grammage: number
  if (metric !== null) grammage = Number(metric[1])
  else if (basis !== null) {
    const grade = (basis[2] ?? '').toLowerCase()
    if (grade === '')
      return refuse(
        'weight-no-grade',
        `${quoted(text)} does not say of which grade`,
        'write the grade too, such as 80 lb cover or 80 lb text: they are different papers',
      )
    if (!isGrade(grade)) {
      const near = nearestName(grade, grades)
      return refuse(
        'weight-unknown-grade',
        `${quoted(grade)} is not a grade with a basic size`,
        near === null ? `grades are ${grades.join(', ')}` : `did you mean ${near}?`,
      )
    }
    grammage = basisWeightToGrammage(Number(basis[1]), grade)
  } else if (/^\d+(?:\.\d+)?$/.test(text)) {
    return refuse(
      'weight-no-unit',
      `${quoted(text)} has no unit`,
      `write ${text} gsm, or a basis weight such as 80 lb cover`,
    )
  } else
    return refuse(
      'weight-not-understood',
      `${quoted(text)} is not a weight of paper`,
      'write it such as 270 gsm or 80 lb cover',
    )
  if (grammage < 10 || grammage > 3000)
    return refuse(
      'weight-implausible',
      `${quoted(text)} is ${String(Math.round(grammage))} g/m², which is no paper`,
      'check the number and its unit',
    )
  return { ok: true, value: grammage }
}
