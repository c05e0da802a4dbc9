import { stackHeight } from '../../assembly/loads.ts'
import type { JudgedSet } from '../../assembly/judge-set.ts'
import type { FoldedPiece } from '../../pieces/folded-piece.ts'
import { modelDefaults } from '../../pieces/model-defaults.ts'
import type { Fit } from '../../template/template-model.ts'
import { add, dimension, multiply, scale, source } from '../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import { oncePerSet } from '../once-per-set.ts'
import { paperWeight } from '../paper-weight.ts'
import type { Finding } from '../rule.ts'
import { listInWords } from '../wording.ts'
import { mailPack, type MailPack } from './packs.ts'

/** Something that is posted: a filled envelope, or a card by itself. */
export interface MailedItem {
  readonly subject: string
  readonly path: readonly (string | number)[]
  readonly words: string
  readonly length: Dimension
  readonly width: Dimension
  readonly thickness: Dimension
  /** Grams of paper in it. */
  readonly weight: number
  /** Pieces whose weight is not known. */
  readonly unweighed: readonly string[]
}

interface Part {
  readonly name: string
  readonly count: number
}

const isEnvelope = (piece: FoldedPiece): boolean =>
  piece.form.kind === 'envelope' || (piece.form.kind === 'bought' && piece.cavity?.shape === 'pocket')

/** What a piece holds in pockets of its own, and what that holds: readers have refused rings. */
function heldIn(judged: JudgedSet, piece: string): readonly Part[] {
  return judged.set.fits
    .filter((fit) => fit.relation === 'in' && fit.to === piece)
    .flatMap((fit) => partsOf(judged, fit))
}

function partsOf(judged: JudgedSet, fit: Fit): readonly Part[] {
  return fit.put.flatMap(({ piece, count }) => {
    const own = count * fit.count
    const held = [...(fit.holding === null ? [] : [{ name: fit.holding, count: 1 }]), ...heldIn(judged, piece)]
    return [{ name: piece, count: own }, ...held.map((part) => ({ ...part, count: part.count * own }))]
  })
}

/** Thickness of one filled envelope, as for a pack of one: (envelope + what is in it)(1 + b) + loft. */
function filledThickness(judged: JudgedSet, fit: Fit, envelope: FoldedPiece, parts: readonly Part[]): Dimension {
  const plain = add(
    stackHeight(envelope),
    ...parts.map((part) => scale(stackHeight(judged.model.folded(part.name)), part.count)),
  )
  const compression = dimension(1 + modelDefaults.packCompression.value, [
    source(`pack-compression(${fit.id})`, 1, modelDefaults.packCompressionHalfWidth.value),
  ])
  const loft = dimension(modelDefaults.loft.value, [source(`loft(${fit.id})`, 1, modelDefaults.loftHalfWidth.value)])
  return add(multiply(plain, compression), loft)
}

function filledEnvelope(judged: JudgedSet, fit: Fit): MailedItem {
  const envelope = judged.model.folded(fit.to)
  const parts = partsOf(judged, fit)
  const weights = [{ name: fit.to, count: 1 }, ...parts].map((part) => ({
    ...part,
    grams: paperWeight(judged, part.name),
  }))
  const words = parts.map((part) => (part.count === 1 ? part.name : `${String(part.count)} ${part.name}`))
  return {
    subject: fit.id,
    path: ['fits', fit.id],
    words: `${fit.to} with ${listInWords(words)}`,
    length: envelope.outside.length,
    width: envelope.outside.width,
    thickness: filledThickness(judged, fit, envelope, parts),
    weight: weights.reduce((sum, part) => sum + (part.grams ?? 0) * part.count, 0),
    unweighed: weights.filter((part) => part.grams === null).map((part) => part.name),
  }
}

function bareCard(judged: JudgedSet, name: string, piece: FoldedPiece): MailedItem {
  const grams = paperWeight(judged, name)
  return {
    subject: name,
    path: ['pieces', name],
    words: name,
    length: piece.outside.length,
    width: piece.outside.width,
    thickness: stackHeight(piece),
    weight: grams ?? 0,
    unweighed: grams === null ? [name] : [],
  }
}

function itemsFor(judged: JudgedSet, pack: MailPack): readonly MailedItem[] {
  if (pack.item === 'card')
    return [...judged.pieces]
      .filter(([, piece]) => piece.form.kind === 'card')
      .map(([name, piece]) => bareCard(judged, name, piece))
  return judged.set.fits
    .filter((fit) => fit.relation === 'in' && isEnvelope(judged.model.folded(fit.to)))
    .map((fit) => filledEnvelope(judged, fit))
}

interface Mailing {
  readonly pack: MailPack
  readonly items: readonly MailedItem[]
}

/** What a set posts under the postal rules it asks for; `null` where it asks for none. */
const mailingOf = oncePerSet((judged): Mailing | null => {
  const pack = judged.set.mail === null ? null : mailPack(judged.set.mail)
  return pack === null ? null : { pack, items: itemsFor(judged, pack) }
})

/** `usps-letter (US Postal Service letter, machinable, as of 2021-01-24)` */
export const packInWords = (pack: MailPack): string =>
  `${pack.id} (${pack.operator}, ${pack.itemClass}, ${pack.edition === null ? 'undated edition' : `edition of ${pack.edition}`}${pack.confidence === 'memory' ? ', from memory' : ''})`

/** Every message about mail ends so: postal checks are advice. */
export const advice = 'Advice only: ask the post office before you promise anything.'

/**
 * Findings of a rule about mail, one an item; unchecked where the set asks for postal rules and posts nothing.
 * @param names whether the postal rules say anything about what this rule judges
 */
export function judgeMail(
  judged: JudgedSet,
  names: (pack: MailPack) => boolean,
  judgeItem: (pack: MailPack, item: MailedItem) => Pick<Finding, 'severity' | 'measure' | 'message'>,
): readonly Finding[] {
  const mailing = mailingOf(judged)
  if (mailing === null || !names(mailing.pack)) return []
  const { pack, items } = mailing
  if (items.length === 0)
    return [
      {
        subject: judged.set.name,
        severity: 'unchecked',
        measure: null,
        message: `Nothing in this set is posted as ${packInWords(pack)}: no ${pack.item === 'card' ? 'card' : 'fit puts anything into an envelope'}.`,
        path: ['mail'],
      },
    ]
  return items.map((item) => ({ subject: item.subject, path: item.path, ...judgeItem(pack, item) }))
}
