import { useFieldArray, type Control, type UseFormRegister } from 'react-hook-form'
import type { JSX } from 'react'
import { limits } from '../../../shared/api/limits.ts'
import { feels } from '../../../shared/api/shapes/build-shapes.ts'
import { lengthIn } from '../../lib/units.ts'
import { Field } from '../../ui/field.tsx'
import { commonWords } from '../../words/common-words.ts'
import { buildWords } from '../../words/build-words.ts'
import type { Draft, FormAnswer } from './draft.ts'

type Register = UseFormRegister<Draft>
type Form = FormAnswer['form']

function Text({
  label,
  field,
  isFigure = false,
  max,
}: {
  readonly label: string
  readonly field: ReturnType<Register>
  readonly isFigure?: boolean
  readonly max: number
}): JSX.Element {
  return (
    <Field label={label}>
      {(parts) => (
        <input
          {...parts}
          {...field}
          maxLength={max}
          {...(isFigure ? { inputMode: 'decimal' as const } : {})}
          autoComplete="off"
          className={isFigure ? 'field figure' : 'field'}
        />
      )}
    </Field>
  )
}

export function ScalePart({ register }: { readonly register: Register }): JSX.Element {
  return (
    <div className="space-y-3">
      <p className="text-sm text-soft">{buildWords.scaleHint}</p>
      <Field label={buildWords.units}>
        {(parts) => (
          <select {...parts} {...register('units')} className="field max-w-48">
            <option value="mm">{commonWords.millimetres}</option>
            <option value="in">{commonWords.inches}</option>
          </select>
        )}
      </Field>
      <div className="grid gap-3 sm:grid-cols-3">
        <Text label={buildWords.barX} field={register('barX')} isFigure max={12} />
        <Text label={buildWords.barY} field={register('barY')} isFigure max={12} />
        <Text label={buildWords.nominal} field={register('nominal')} isFigure max={12} />
      </div>
      <div className="grid gap-3 sm:grid-cols-2">
        <Text label={buildWords.sheet} field={register('sheet')} max={limits.name} />
        <Text label={buildWords.printer} field={register('printer')} max={limits.name} />
      </div>
    </div>
  )
}

export function PaperPart({ register }: { readonly register: Register }): JSX.Element {
  return (
    <div className="space-y-3">
      <div className="grid gap-3 sm:grid-cols-2">
        <Text label={buildWords.paperName} field={register('paperName')} max={limits.name} />
        <Text label={buildWords.grammage} field={register('grammage')} isFigure max={6} />
      </div>
      <fieldset>
        <legend className="mb-1 text-sm font-semibold">{buildWords.thickness}</legend>
        <div className="grid grid-cols-3 gap-2 sm:grid-cols-5">
          {[0, 1, 2, 3, 4].map((index) => (
            <input
              key={index}
              {...register(`thickness.${index as 0}.text`)}
              inputMode="decimal"
              autoComplete="off"
              aria-label={`${buildWords.thickness}, ${buildWords.reading(index + 1)}`}
              className="field figure"
            />
          ))}
        </div>
        <p className="mt-1 text-sm text-soft">{buildWords.thicknessHint}</p>
      </fieldset>
    </div>
  )
}

export function ToolsPart({ register }: { readonly register: Register }): JSX.Element {
  return (
    <div className="space-y-3">
      <Text label={buildWords.tools} field={register('tools')} max={limits.note} />
      <div className="grid gap-3 sm:grid-cols-3">
        <Field label={buildWords.skill}>
          {(parts) => (
            <select {...parts} {...register('skill')} className="field">
              {(['', 'first-time', 'some', 'experienced'] as const).map((skill) => (
                <option key={skill} value={skill}>
                  {buildWords.skills[skill]}
                </option>
              ))}
            </select>
          )}
        </Field>
        <Text label={buildWords.minutes} field={register('minutes')} isFigure max={6} />
        <Text label={buildWords.wasted} field={register('wasted')} isFigure max={4} />
      </div>
    </div>
  )
}

export function MeasurePart({
  register,
  form,
  units,
}: {
  readonly register: Register
  readonly form: Form
  readonly units: 'mm' | 'in'
}): JSX.Element {
  return (
    <>
      <p className="mb-3 text-sm text-soft">{buildWords.measureHint}</p>
      <ul className="space-y-4">
        {form.measure.map(({ key, what, value, go, noGo }, row) => (
          <li key={key}>
            <fieldset>
              <legend className="font-semibold">{what}</legend>
              <p className="figure mb-1 text-sm text-soft">
                {buildWords.go} {lengthIn(go, units)} ·{' '}
                <span className="text-ink">
                  {buildWords.meant} {lengthIn(value, units)}
                </span>{' '}
                · {buildWords.noGo} {lengthIn(noGo, units)}
              </p>
              <div className="grid grid-cols-3 gap-2">
                {[0, 1, 2].map((index) => (
                  <input
                    key={index}
                    {...register(`readings.${row}.values.${index}.text`)}
                    inputMode="decimal"
                    autoComplete="off"
                    aria-label={`${what}, ${buildWords.reading(index + 1)}`}
                    className="field figure"
                  />
                ))}
              </div>
            </fieldset>
          </li>
        ))}
      </ul>
    </>
  )
}

export function FitsPart({ register, form }: { readonly register: Register; readonly form: Form }): JSX.Element {
  return (
    <ul className="space-y-4">
      {form.fits.map(({ fit, put, relation, to }, index) => (
        <li key={fit}>
          <fieldset>
            <legend className="mb-1 font-semibold">{buildWords.fit(put, relation, to)}</legend>
            <div className="flex flex-wrap gap-2">
              {feels.map((feel) => (
                <label
                  key={feel}
                  className="inline-flex min-h-11 cursor-pointer items-center gap-2 border border-stroke bg-sheet px-3 has-checked:border-2 has-checked:border-ink has-checked:font-bold has-focus-visible:outline-2"
                >
                  <input type="radio" value={feel} {...register(`fits.${index}.felt`)} />
                  {buildWords.feels[feel]}
                </label>
              ))}
            </div>
          </fieldset>
        </li>
      ))}
    </ul>
  )
}

export function ProblemsPart({
  register,
  control,
  form,
}: {
  readonly register: Register
  readonly control: Control<Draft>
  readonly form: Form
}): JSX.Element {
  const { fields, append, remove } = useFieldArray({ control, name: 'problems' })
  return (
    <div className="space-y-4">
      {fields.map((field, index) => (
        <fieldset key={field.id} className="border border-hair p-3">
          <legend className="px-1 text-sm font-semibold">{buildWords.problem(index + 1)}</legend>
          <div className="grid gap-3 sm:grid-cols-2">
            <Field label={buildWords.problemPiece}>
              {(parts) => (
                <select {...parts} {...register(`problems.${index}.piece`)} className="field">
                  {form.pieces.map((piece) => (
                    <option key={piece}>{piece}</option>
                  ))}
                </select>
              )}
            </Field>
            <Text label={buildWords.problemEdge} field={register(`problems.${index}.edge`)} max={limits.name} />
            <Text
              label={buildWords.problemExpected}
              field={register(`problems.${index}.expected`)}
              max={limits.reason}
            />
            <Text label={buildWords.problemGot} field={register(`problems.${index}.got`)} max={limits.reason} />
          </div>
          <button type="button" className="button mt-3" data-size="small" onClick={() => remove(index)}>
            {commonWords.remove}: {buildWords.problem(index + 1)}
          </button>
        </fieldset>
      ))}
      <button
        type="button"
        className="button"
        onClick={() => append({ piece: form.pieces[0] ?? '', edge: '', expected: '', got: '' })}
      >
        {buildWords.addProblem}
      </button>
    </div>
  )
}
