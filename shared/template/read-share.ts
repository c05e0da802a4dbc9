import type { Reading } from '../units/units.ts'

const refuse = (fact: string, remedy: string): Reading<number> => ({
  ok: false,
  code: 'share-not-understood',
  fact,
  remedy,
})

/** A share of builds, `95 %` or `0.95`, as a number between 0 and 1. */
export function readShare(text: string): Reading<number> {
  const percent = /^(\d{1,3}(?:\.\d{1,6})?) ?%$/.exec(text)
  const share = percent === null ? (/^(?:0?\.\d{1,9})$/.test(text) ? Number(text) : NaN) : Number(percent[1]) / 100
  if (share > 0 && share <= 1) return { ok: true, value: share }
  if (/^\d+(\.\d+)?$/.test(text)) return refuse(`“${text}” has no percent sign`, `Write “${text} %”`)
  return refuse(`“${text}” is no share of builds`, 'Write a share such as “95 %”')
}

/** A range of relative humidity, `40..60 %`, in percent. */
export function readHumidity(text: string): Reading<{ readonly min: number; readonly max: number }> {
  const match = /^(\d{1,3}(?:\.\d{1,6})?) ?%? ?\.\. ?(\d{1,3}(?:\.\d{1,6})?) ?%$/.exec(text)
  const [min, max] = [Number(match?.[1] ?? NaN), Number(match?.[2] ?? NaN)]
  if (min <= max && max <= 100) return { ok: true, value: { min, max } }
  return {
    ok: false,
    code: 'humidity-not-understood',
    fact: `“${text}” is no range of relative humidity`,
    remedy: 'Write the lower end first, such as “40..60 %”',
  }
}
