import { useState, type JSX } from 'react'
import { lengthIn, readLength, useUnits } from '../../lib/units.ts'
import { Field } from '../../ui/field.tsx'
import { tryWords } from '../../words/try-words.ts'
import type { Trial, Tried } from '../engine/try-text.ts'

/** A slider with a box for the exact figure. */
function Slider({
  label,
  hint,
  min,
  max,
  step,
  value,
  text,
  onChange,
  read,
}: {
  readonly label: string
  readonly hint: string
  readonly min: number
  readonly max: number
  readonly step: number
  readonly value: number
  /** The value as it stands in the box. */
  readonly text: string
  readonly onChange: (value: number) => void
  readonly read: (typed: string) => number | null
}): JSX.Element {
  const [typed, setTyped] = useState<string | null>(null)
  return (
    <Field label={label} hint={hint}>
      {(parts) => (
        <div className="flex items-center gap-3">
          <input
            {...parts}
            type="range"
            className="h-6 min-w-0 flex-1 accent-ink"
            min={min}
            max={max}
            step={step}
            value={value}
            aria-valuetext={text}
            onChange={({ target }) => {
              setTyped(null)
              onChange(Number(target.value))
            }}
          />
          <input
            className="field figure w-28"
            inputMode="decimal"
            aria-label={label}
            value={typed ?? text}
            onChange={({ target }) => {
              setTyped(target.value)
              const exact = read(target.value)
              if (exact !== null && exact >= min && exact <= max) onChange(exact)
            }}
            onBlur={() => setTyped(null)}
          />
        </div>
      )}
    </Field>
  )
}

const nominalBar = 100

/** What may be tried besides the text: paper, its thickness, print scale and whose hands. */
export function TrialControls({
  trial,
  tried,
  onChange,
}: {
  readonly trial: Trial
  readonly tried: Tried
  readonly onChange: (trial: Trial) => void
}): JSX.Element {
  const units = useUnits()
  const used = Object.keys(tried.report.inputs.stocks)
  const stock = trial.thickness?.stock ?? trial.paper ?? used[0] ?? tried.papers[0]?.name ?? ''
  const own =
    tried.report.inputs.stocks[stock]?.caliper ?? tried.papers.find(({ name }) => name === stock)?.caliper ?? 0.3
  const caliper = trial.thickness?.caliper ?? own
  const percent = (scale: number): string => `${(scale * 100).toFixed(1)} %`
  const lengthFrom = (typed: string): number | null => readLength(typed.replace(/ *(mm|in)$/, ''), units)
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      <Field label={tryWords.maker}>
        {(parts) => (
          <select
            {...parts}
            className="field"
            value={trial.maker ?? ''}
            onChange={({ target }) => onChange({ ...trial, maker: target.value === '' ? null : target.value })}
          >
            <option value="">{tryWords.usual(tried.workmanship)}</option>
            {tried.makers.map((name) => (
              <option key={name}>{name}</option>
            ))}
          </select>
        )}
      </Field>
      <Field label={tryWords.paper}>
        {(parts) => (
          <select
            {...parts}
            className="field"
            value={trial.paper ?? ''}
            onChange={({ target }) => onChange({ ...trial, paper: target.value === '' ? null : target.value })}
          >
            <option value="">{tryWords.asGiven}</option>
            {tried.papers.map(({ name }) => (
              <option key={name}>{name}</option>
            ))}
          </select>
        )}
      </Field>
      <Field label={tryWords.thicknessOf}>
        {(parts) => (
          <select
            {...parts}
            className="field"
            value={stock}
            onChange={({ target }) =>
              onChange({
                ...trial,
                thickness: {
                  stock: target.value,
                  caliper: tried.papers.find(({ name }) => name === target.value)?.caliper ?? 0.3,
                },
              })
            }
          >
            {tried.papers.map(({ name }) => (
              <option key={name}>{name}</option>
            ))}
          </select>
        )}
      </Field>
      <Slider
        label={tryWords.thickness}
        hint={tryWords.thicknessNote}
        min={0.05}
        max={1}
        step={0.005}
        value={caliper}
        text={lengthIn(caliper, units)}
        read={lengthFrom}
        onChange={(value) => onChange({ ...trial, thickness: { stock, caliper: value } })}
      />
      <Slider
        label={tryWords.scale}
        hint={tryWords.scaleNote}
        min={0.9}
        max={1.1}
        step={0.001}
        value={trial.scale}
        text={percent(trial.scale)}
        read={(typed) => {
          const value = Number(typed.replace(',', '.').replace(/ *%$/, ''))
          return Number.isFinite(value) && value > 0 ? value / 100 : null
        }}
        onChange={(scale) => onChange({ ...trial, scale })}
      />
      <Field label={tryWords.bar} hint={tryWords.barOf(lengthIn(nominalBar, units))}>
        {(parts) => (
          <input
            {...parts}
            key={`${units} ${trial.scale.toFixed(4)}`}
            className="field figure"
            inputMode="decimal"
            defaultValue={lengthIn(nominalBar * trial.scale, units)}
            onBlur={({ target }) => {
              const bar = lengthFrom(target.value)
              if (bar !== null && bar / nominalBar >= 0.9 && bar / nominalBar <= 1.1)
                onChange({ ...trial, scale: bar / nominalBar })
            }}
          />
        )}
      </Field>
    </div>
  )
}
