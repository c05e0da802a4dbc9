import { lengthText } from '../../drawing/length-text.ts'
import type { FoldedPiece } from '../../pieces/folded-piece.ts'
import type { Fit } from '../../template/template-model.ts'
import { stockTitle, type ExportPiece, type ExportSet, type ExportSheet } from '../export-set.ts'
import { fillStep } from './fill-placeholders.ts'
import { lidTable } from './lid-table.ts'
import { notchStep } from './cutting-step.ts'
import { cutStep, foldStep, scoreStep } from './sheet-steps.ts'
import { step, type Step } from './step.ts'

const isPresent = <T>(value: T | null): value is T => value !== null

const areaOfSheet = ({ blank }: ExportSheet): number => {
  const xs = blank.outline.map((point) => point.x)
  const ys = blank.outline.map((point) => point.y)
  return Math.max(...xs) * Math.max(...ys)
}

const listed = (words: readonly string[]): string =>
  words.length < 2 ? (words[0] ?? '') : `${words.slice(0, -1).join(', ')} and ${words[words.length - 1] ?? ''}`

const count = (number: number, word: string): string => `${number === 1 ? 'one' : String(number)} ${word}`

function printStep(): Step {
  return step(
    'Print one page and measure its bars',
    [
      'Print page 1 alone at 100 %, with no fit to page, and lay a ruler along both scale bars.',
      'If a bar does not measure what is printed beside it, print at the percentage in the table instead and measure again. Do not go on before both bars are right.',
    ],
    { isStop: true },
  )
}

function paperStep(set: ExportSet): Step {
  const stocks = [
    ...new Set(set.pieces.flatMap((piece) => piece.sheets.map((sheet) => sheet.blank.stock)).filter(isPresent)),
  ]
  return step('Choose the papers', [
    `You need ${listed(stocks.map((stock) => stockTitle(set, stock)))}.`,
    'Mark the wrong side of each sheet with a light pencil cross: it will be the inside. Bend the sheet gently both ways; it bends more easily along its grain. Draw an arrow along the grain.',
    'Score and fold a scrap first. If the fold cracks, turn the grain the other way.',
  ])
}

/** What is done to a piece's sheets between cutting and gluing. */
function makeSteps(set: ExportSet, piece: ExportPiece): readonly Step[] {
  return piece.sheets
    .flatMap((sheet) => [scoreStep(set, piece, sheet.blank), foldStep(sheet.blank), notchStep(set, piece, sheet.blank)])
    .filter(isPresent)
}

function glueSentences(folded: FoldedPiece): readonly string[] {
  const { given, form } = folded
  switch (form.kind) {
    case 'box': {
      if (given.kind !== 'box' && given.kind !== 'lid') return []
      const wall = given.tabs.at === 'ends' ? 'side' : 'end'
      const face = given.tabs.glued
      return [
        `Stand the walls up. Put glue on the four tabs and stick each to the ${face} of the ${wall} wall beside it, its long edge along the fold, the rims level.`,
        'Check that the corners are square against the edge of a sheet before the glue sets.',
        ...(given.walls === 'doubled' ? ['Glue the wall linings inside, their lower edges on the floor.'] : []),
        ...(given.covered === null
          ? []
          : ['Glue the covering paper on outside, floor first, then the walls, and turn it over the rim.']),
      ]
    }
    case 'envelope':
      return form.style === 'baronial'
        ? [
            'Fold in the two side flaps. Put glue on the hatched edges of the bottom flap and fold it up over them.',
            'Keep glue off the inside: slip a scrap of paper in while it dries. Leave the seal flap open.',
          ]
        : [
            'Fold in the two side flaps, put glue on them and fold the back up over them.',
            'Keep glue off the inside: slip a scrap of paper in while it dries. Leave the seal flap open.',
          ]
    case 'sleeve':
      return ['Bring the ends together, the lap inside, and glue the lap to the first panel.']
    case 'bag':
      return [
        'Turn in the top and glue it down. Bring the sides together and glue the seam to the far edge.',
        'Fold the bottom like the end of a parcel and glue it.',
      ]
    case 'card':
      return given.kind === 'card' && given.pocket !== null ? ['Fold the pocket up and glue its two side strips.'] : []
    case 'band':
    case 'insert':
    case 'bought':
    case 'custom':
      return []
  }
}

function glueStep(piece: ExportPiece): Step | null {
  const sentences = glueSentences(piece.folded)
  return sentences.length === 0
    ? null
    : step(`Glue ${piece.name}`, sentences, { figure: { sheet: piece.name, stage: 'cut' } })
}

/** Layers and inserts go on a card once it is folded. */
function layerStep(set: ExportSet, piece: ExportPiece): Step | null {
  const { given } = piece.folded
  if (given.kind !== 'card' || (given.layers.length === 0 && given.insert === null)) return null
  const place = (x: number, y: number): string =>
    Math.abs(x) < 1e-9 && Math.abs(y) < 1e-9
      ? 'centred'
      : `its middle ${lengthText(Math.abs(x), set.units)} ${x < 0 ? 'left' : 'right'} of and ${lengthText(Math.abs(y), set.units)} ${y < 0 ? 'below' : 'above'} the middle`
  return step(`Put ${piece.name} together`, [
    ...given.layers.map(
      (layer, index) =>
        `Glue layer ${String(index + 1)} on the ${layer.side === 'front' ? 'front' : 'inside'}, ${place(layer.at.x, layer.at.y)}.`,
    ),
    ...(given.insert === null
      ? []
      : [
          given.insert.loose
            ? 'Lay the insert in loose.'
            : 'Glue the insert in along its fold only, so that it can move.',
        ]),
  ])
}

/** Trying the content before the container is glued shut. */
function tryStep(set: ExportSet, container: string): Step | null {
  const contents = [
    ...set.fits
      .filter((fit) => fit.relation === 'in' && fit.to === container)
      .flatMap((fit) => fit.put.map((entry) => entry.piece)),
    ...set.fits
      .filter((fit) => fit.put.some((entry) => entry.piece === container))
      .flatMap((fit) => (fit.holding === null ? [] : [fit.holding])),
  ]
  const content = [...new Set(contents)].filter((name) => set.pieces.some((piece) => piece.name === name))
  if (content.length === 0) return null
  return step(`Try ${listed(content)} in ${container} before gluing`, [
    `Fold ${container} round ${listed(content)} without glue. It should lie in without bending and the flap should close. If it does not, measure again before you glue.`,
  ])
}

function measureStep(set: ExportSet, base: string, lid: string): Step | null {
  const pair = set.lids.find((candidate) => candidate.base === base && candidate.lid === lid)
  const table = pair === undefined ? null : lidTable(set, pair)
  if (table === null) return null
  return step(
    `Measure the outside of ${base}`,
    [
      `When the glue is dry, measure ${base} outside, at the corners where it is widest, along its length and across its width.`,
      `Look up each figure and cut ${lid} to the size beside it. Keep the scores of ${lid} as they are.`,
    ],
    { isStop: true, table },
  )
}

function putSentence(set: ExportSet, fit: Fit): string {
  const things = listed(fit.put.map((entry) => count(entry.count * fit.count, entry.piece)))
  const isOneOfSeveral = (set.pieces.find((piece) => piece.name === fit.to)?.make ?? 1) > 1
  const holding = fit.holding === null ? '' : `, each with ${fit.holding} in it,`
  const stands = fit.stands === 'upright' ? ' standing up' : ''
  return `Put ${things}${holding}${stands} in ${isOneOfSeveral ? 'each ' : ''}${fit.to}.`
}

/**
 * A maker's steps for a set, in the order that saves paper: bars first, then cutting, scoring before cutting waste,
 * trying before gluing, the base before its lid. Own sentences of the set take the place of the generated ones, with the
 * bar page kept in front.
 */
export function planSteps(set: ExportSet): readonly Step[] {
  if (set.steps !== 'auto') return [printStep(), ...set.steps.map((sentence) => fillStep(set, sentence))]
  const lids = new Set(set.lids.map((pair) => pair.lid))
  const isWrap = (piece: ExportPiece): boolean => ['band', 'sleeve'].includes(piece.folded.form.kind)
  const made = set.pieces.filter((piece) => piece.sheets.length > 0)
  const first = made.filter((piece) => !lids.has(piece.name) && !isWrap(piece))
  const bySize = (pieces: readonly ExportPiece[]): readonly ExportSheet[] =>
    pieces.flatMap((piece) => piece.sheets).toSorted((a, b) => areaOfSheet(b) - areaOfSheet(a))
  const order = (piece: ExportPiece): number =>
    ['card', 'insert', 'custom', 'envelope', 'bag', 'box'].indexOf(piece.folded.form.kind)
  const inOrder = first.toSorted((a, b) => order(a) - order(b))
  const lidSteps = set.lids.flatMap((pair) => {
    const lid = made.find((piece) => piece.name === pair.lid)
    if (lid === undefined) return []
    return [
      measureStep(set, pair.base, pair.lid),
      ...lid.sheets.map((sheet) => cutStep(set, sheet)),
      ...makeSteps(set, lid),
      glueStep(lid),
    ]
  })
  // A lid that is put into something stands for its closed box.
  const isClosedBox = (fit: Fit): boolean => fit.put.some((entry) => lids.has(entry.piece))
  const puts = set.fits.filter((fit) => fit.relation === 'in' && !isClosedBox(fit))
  const closed = set.fits.filter((fit) => fit.relation === 'in' && isClosedBox(fit))
  const overs = set.fits.filter((fit) => fit.relation === 'over')
  const wraps = made.filter(isWrap)
  const ribbons = set.pieces.filter((piece) => piece.folded.form.kind === 'band' && piece.folded.form.ribbon)
  return [
    printStep(),
    paperStep(set),
    ...bySize(first).map((sheet) => cutStep(set, sheet)),
    ...first.flatMap((piece) => piece.sheets.map((sheet) => scoreStep(set, piece, sheet.blank))),
    ...first.flatMap((piece) => piece.sheets.map((sheet) => foldStep(sheet.blank))),
    ...first.flatMap((piece) => piece.sheets.map((sheet) => notchStep(set, piece, sheet.blank))),
    ...inOrder.flatMap((piece) => [
      layerStep(set, piece),
      ...(piece.folded.form.kind === 'envelope' ? [tryStep(set, piece.name)] : []),
      glueStep(piece),
    ]),
    ...lidSteps,
    ...(puts.length === 0
      ? []
      : [
          step(
            'Fill',
            puts.map((fit) => putSentence(set, fit)),
          ),
        ]),
    ...(overs.length === 0
      ? []
      : [
          step(
            'Close',
            overs.map((fit) => `Set ${fit.put[0]?.piece ?? 'the lid'} on ${fit.to}.`),
          ),
        ]),
    ...closed.map((fit) => step(`Fill ${fit.to}`, [`Put the closed box in ${fit.to}.`])),
    ...wraps.flatMap((piece) => [
      ...piece.sheets.map((sheet) => cutStep(set, sheet)),
      ...makeSteps(set, piece),
      wrapStep(set, piece),
    ]),
    ...ribbons.map((piece) => wrapStep(set, piece)),
  ].filter(isPresent)
}

function wrapStep(set: ExportSet, piece: ExportPiece): Step {
  const around = set.fits.find(
    (fit) => fit.relation === 'around' && fit.put.some((entry) => entry.piece === piece.name),
  )?.to
  const { form } = piece.folded
  if (form.kind === 'band' && form.ribbon) {
    return step(`Tie ${piece.name}`, [
      `Cut ${lengthText(form.stripLength.nominal, set.units)} of ribbon and tie it round ${around ?? 'the finished set'}. Keep ribbon away from babies.`,
    ])
  }
  if (form.kind === 'band') {
    return step(`Wrap ${piece.name}`, [
      `Wrap ${piece.name} round ${around ?? 'the finished set'}, lap the ends and glue the lap to the band itself, not to what it goes round.`,
    ])
  }
  return step(`Put ${piece.name} on`, [
    `Glue the lap of ${piece.name} inside its first panel and let it dry.`,
    `Slide it over ${around ?? 'the finished set'}.`,
  ])
}
