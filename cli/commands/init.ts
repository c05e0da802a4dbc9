import { existsSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { sizeSet } from '../../shared/sizing/size-set.ts'
import { readWorkspace } from '../../shared/template/read-workspace.ts'
import { formatSize } from '../../shared/units/format-length.ts'
import { parseSize } from '../../shared/units/parse-size.ts'
import type { RulerUnit } from '../../shared/units/units.ts'
import { exitCode } from '../exit-code.ts'
import { workspaceFile } from '../inputs/find-workspace.ts'
import { writeWhole } from '../inputs/write-file.ts'
import { UsageError } from '../io.ts'
import type { CommandModule } from './command-module.ts'

interface Options {
  readonly card?: string
  readonly count: string
  readonly force?: boolean
}

const workspaceText = (
  units: RulerUnit,
  card: string,
): string => `# yaml-language-server: $schema=foldgauge-workspace.schema.json
foldgauge: 1
title: My paper templates
units: ${units}                 # what a length without a unit means; makers read these marks
${units === 'mm' ? 'ruler: 1 mm               # the finest mark makers are asked to find' : 'ruler: { cut: 1/16, score: 1/8 }   # the finest marks makers are asked to find'}

# Papers. Measure the caliper (ten sheets together, divided by ten): weight does not tell thickness.
stocks:
  cover: { title: Cover, grammage: 270 gsm, caliper: 0.32 mm ± 6 %, grain: long }
  text:  { title: Text, grammage: 120 gsm, caliper: 0.15 mm }

# Finished sizes that sets share: change one here and every set that uses it is judged anew.
sizes:
  note: ${card}

# Clearances by name: outer piece's inside minus inner piece's outside, total along an axis.
clearances:
  easy-card: { sides: 2..18 mm }          # a card that slides into its envelope without coaxing
  easy-pack: { sides: 1..12 mm }          # filled envelopes that drop into the box
  slip-lid:  { sides: 0.3..4 mm, headspace: 0.5.. mm }

# Rules can be set to off, info, warn or fail. This one warns where a design would fail on the other unit's ruler;
# set it to warn when you give makers both units.
checks:
  ruler/rounding: info

workmanship: home         # whose hands sets are judged for: home, studio, die, or makers of your own
target: 95 %              # share of builds that must not bind for a pass
floor: 85 %               # below this it fails; between the two it warns
sets: [ "sets/*.yaml" ]
`

const bands = {
  mm: { width: '40 mm', overlap: '20 mm', seam: '12 mm' },
  in: { width: '1 1/2 in', overlap: '3/4 in', seam: '1/2 in' },
} as const

const setText = (
  count: number,
  sheet: string,
  band: (typeof bands)[RulerUnit],
): string => `# yaml-language-server: $schema=../foldgauge-set.schema.json
set: boxed-notes
title: ${count === 1 ? 'A card' : `${String(count)} cards`} with envelopes in a box
sheet: ${sheet}
pieces:
  card:     { kind: card, stock: cover, folded: note, fold: long-edge }
  # A square folded corner by corner; the seams are the strips that are glued.
  envelope: { kind: envelope, style: baronial, stock: text, pocket: fit, seam: ${band.seam} }
  # Tabs of the end walls are glued inside the side walls.
  base:     { kind: box, stock: cover, inside: fit }
  lid:      { kind: lid, stock: cover, inside: fit, thumb-notch: true }
  band:     { kind: band, stock: text, around: lid, width: ${band.width}, overlap: ${band.overlap} }
fits:
  card-in-envelope: { put: card, in: envelope, clearance: easy-card }
  pack-in-base:     { put: envelope, holding: card, count: ${String(count)}, in: base, clearance: easy-pack }
  lid-on-base:      { put: lid, over: base, clearance: slip-lid }
  band-on-box:      { put: band, around: lid }
`

/** A card size and the units it was written in. */
function readCard(text: string): { readonly text: string; readonly units: RulerUnit; readonly longest: number } {
  const reading = parseSize(text, 'mm', 2)
  if (!reading.ok) throw new UsageError(`--card: ${reading.fact}`, reading.remedy)
  const units: RulerUnit = reading.value.some((length) => length.unit === 'in') ? 'in' : 'mm'
  const lengths = reading.value.map((length) => length.mm)
  return { text: formatSize(lengths, units), units, longest: Math.max(...lengths) }
}

export const initCommand: CommandModule = {
  define(command) {
    command
      .argument('[folder]', 'where to write (default: here)')
      .option('--card <size>', 'the card everything is made for', '148 x 105 mm')
      .option('--count <number>', 'how many cards the box holds', '6')
      .option('--force', 'replace files that are already there')
  },

  async execute(io, words, given) {
    const options = given as unknown as Options
    const folder = resolve(io.cwd, words[0] ?? '.')
    const count = Number(options.count)
    if (!Number.isInteger(count) || count < 1 || count > 200)
      throw new UsageError(`--count cannot be “${options.count}”`, 'Write a whole number from 1 to 200.')
    const card = readCard(options.card ?? '148 x 105 mm')
    const { setSchema } = await import('../../shared/template/set-schema.ts')
    const { workspaceSchema } = await import('../../shared/template/workspace-schema.ts')
    const workspace = workspaceText(card.units, card.text)
    const sheet = card.longest > 150 ? '594 x 420 mm' : 'a3'
    const sizing = sizeSet(setText(count, sheet, bands[card.units]), readWorkspace(workspace, workspaceFile), {
      file: 'sets/boxed-notes.yaml',
      asOf: io.today(),
    })
    if (sizing.text === null || sizing.report === null) {
      const reason = sizing.infeasible?.message ?? sizing.problems[0]?.message ?? 'no sizes were found'
      throw new UsageError(`nothing fits a card of ${card.text}: ${reason}`, sizing.infeasible?.nearest ?? null)
    }
    const files: Readonly<Record<string, string>> = {
      [workspaceFile]: workspace,
      'sets/boxed-notes.yaml': sizing.text,
      'foldgauge-set.schema.json': `${JSON.stringify(setSchema(), null, 2)}\n`,
      'foldgauge-workspace.schema.json': `${JSON.stringify(workspaceSchema(), null, 2)}\n`,
    }
    const there = Object.keys(files).filter((name) => existsSync(join(folder, name)))
    if (there.length > 0 && options.force !== true)
      throw new UsageError(
        `${there.join(', ')} ${there.length === 1 ? 'is' : 'are'} already there`,
        'Choose another folder, or replace them with --force.',
      )
    for (const [name, text] of Object.entries(files)) writeWhole(join(folder, name), text)
    io.err(
      `Written: ${Object.keys(files).join(', ')}\nNext: ${words[0] === undefined ? '' : `cd ${words[0]} && `}foldgauge check\n`,
    )
    return exitCode.clean
  },
}
