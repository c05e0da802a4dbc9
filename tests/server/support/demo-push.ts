import type { BodyInput } from '../../../shared/api/endpoint.ts'
import type { endpoints } from '../../../shared/api/endpoint-registry.ts'

type PushBody = BodyInput<typeof endpoints.push>

/** Tokens of a small workspace of the invented studio. */
export const workspaceText = ({ caliper = '0.32 mm', extra = '' } = {}): string => `foldgauge: 1
title: Quillfern paper goods
units: mm
ruler: 1 mm
stocks:
  cover: { title: Cover, grammage: 270 gsm, caliper: ${caliper}, grain: long }
  text: { title: Text, grammage: 120 gsm, caliper: 0.15 mm }
${extra}clearances:
  slip-lid: { sides: 0.3..4 mm, headspace: 0.5.. mm }
checks:
  ruler/rounding: info
workmanship: home
sets: [ "sets/*.yaml" ]
`

/** A box with its lid; at 177 mm the lid clears, at 174.5 mm it binds. */
export const boxText = ({
  name = 'boxed-notes',
  lid = '177 x 135 mm',
  title = 'Boxed notes',
  comment = '',
} = {}): string => `set: ${name}
title: ${title}
sheet: a3
${comment}pieces:
  base: { kind: box, stock: cover, blank: 187 x 144 mm, wall: 16 mm }
  lid: { kind: lid, stock: cover, blank: ${lid}, wall: 10 mm }
fits:
  lid-on-base: { put: lid, over: base, clearance: slip-lid }
`

export const tightLid = '174.5 x 132.5 mm'

interface Given {
  readonly sets?: readonly { readonly file: string; readonly text: string }[]
  readonly workspace?: string | null
  readonly branch?: string | null
  readonly commit?: string | null
  readonly ancestors?: string[]
  readonly mergeBase?: string | null
  readonly asOf?: string
}

/** A push of the box, or of what is given. */
export function pushOf(given: Given = {}): PushBody {
  const workspace = given.workspace === undefined ? workspaceText() : given.workspace
  return {
    workspace: workspace === null ? null : { file: 'foldgauge.yaml', text: workspace },
    sets: (given.sets ?? [{ file: 'sets/boxed-notes.yaml', text: boxText() }]).map((set) => ({
      ...set,
      digest: null,
      verdict: null,
    })),
    engine: '1.0.0',
    rules: '2026-12',
    judging: { asOf: given.asOf ?? '2026-12-01' },
    branch: given.branch ?? null,
    commit: given.commit ?? null,
    ancestors: given.ancestors ?? [],
    mergeBase: given.mergeBase ?? null,
  }
}

export const commitOf = (digit: number): string => String(digit % 10).repeat(40)
