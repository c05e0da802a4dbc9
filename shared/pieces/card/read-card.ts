import { languageDefaults } from '../language-defaults.ts'
import { readPieceBase } from '../reading/read-piece-base.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { CardGiven, CardLayer } from './card-given.ts'
import type { CardWritten } from './card-shape.ts'
import { readBanner } from './read-banner.ts'

type LayerWritten = NonNullable<CardWritten['layers']>[number]

function readLayer(index: number, written: LayerWritten, read: ValueReader): CardLayer {
  const keys = ['layers', index]
  const at = written.at
  if (written.on === 'front' && written.inside === true) {
    read.report(
      [...keys, 'inside'],
      'conflicting-keys',
      'The layer is said to be on the front and inside.',
      'Keep one of “on” and “inside”.',
    )
  }
  return {
    stock: read.stock([...keys, 'stock'], written.stock),
    size: read.size([...keys, 'size'], written.size),
    at:
      at === undefined || at === 'centre'
        ? { x: 0, y: 0 }
        : { x: read.coordinate([...keys, 'at', 0], at[0]), y: read.coordinate([...keys, 'at', 1], at[1]) },
    side: written.inside === true ? 'inside' : (written.on ?? 'front'),
    banner: readBanner(keys, written.banner, read),
  }
}

type Folding = Pick<CardGiven, 'fold' | 'panels' | 'style' | 'panelWidths'>

/** How many panels a style of folding has where the author does not say: two leaves and a back make a gate. */
const usualPanels = { single: 2, roll: 3, accordion: 3, gate: 3 } as const

function readFolding(written: CardWritten, read: ValueReader): Folding {
  const fold = written.fold ?? 'long-edge'
  const widths = written['panel-widths']
  const panelWidths = widths === undefined ? null : read.lengths(['panel-widths'], widths)
  if (fold === 'none') {
    for (const key of ['panels', 'style', 'panel-widths'] as const) {
      if (written[key] === undefined) continue
      read.report(
        [key],
        'conflicting-keys',
        `A card that is not folded has no “${key}”.`,
        `Take “${key}” out, or name the edge it is folded along with “fold”.`,
      )
    }
    return { fold, panels: 1, style: 'single', panelWidths: null }
  }
  const panels = written.panels === undefined ? null : read.count(['panels'], written.panels, 2, 6)
  const count = panels ?? panelWidths?.length
  const style = written.style ?? 'single'
  if (count !== undefined && count > 2 && written.style === undefined) {
    read.report(
      [written.panels === undefined ? 'panel-widths' : 'panels'],
      'missing-key',
      `A card of ${String(count)} panels needs a “style”.`,
      'Write “style” with “roll”, “accordion” or “gate”.',
    )
  } else if (count !== undefined && ((style === 'single' && count !== 2) || (style === 'gate' && count !== 3))) {
    read.report(
      [written.panels === undefined ? 'panel-widths' : 'panels'],
      'conflicting-keys',
      `A ${style} fold has ${style === 'single' ? 'two panels' : 'three panels, a back and two leaves'}, not ${String(count)}.`,
      style === 'single'
        ? 'Write another “style”: “roll”, “accordion” or “gate”.'
        : 'Write “panels: 3”, or another “style”.',
    )
  } else if (panels !== null && panelWidths !== null && panels !== panelWidths.length) {
    read.report(
      ['panel-widths'],
      'conflicting-keys',
      `${String(panelWidths.length)} widths are given for ${String(panels)} panels.`,
      'Give one width a panel.',
    )
  }
  return { fold, panels: count ?? usualPanels[style], style, panelWidths }
}

/** Reads a card. */
export function readCard(name: string, written: CardWritten, read: ValueReader): CardGiven {
  return {
    ...readPieceBase(name, written, read),
    kind: 'card',
    stock: read.stock(['stock'], written.stock),
    folded: read.sizeOrFit(['folded'], written.folded),
    ...readFolding(written, read),
    blank: written.blank === undefined ? null : read.size(['blank'], written.blank),
    raised: written.raised === undefined ? null : read.toleranced(['raised'], written.raised, { allowZero: true }),
    raisedToEdge: written['raised-to-edge'] ?? false,
    layers: (written.layers ?? []).map((layer, index) => readLayer(index, layer, read)),
    insert:
      written.insert === undefined
        ? null
        : {
            stock: read.stock(['insert', 'stock'], written.insert.stock),
            loose: written.insert.loose ?? false,
            folded: written.insert.folded ?? false,
          },
    pocket:
      written.pocket === undefined
        ? null
        : {
            depth: read.length(['pocket', 'depth'], written.pocket.depth),
            side: read.lengthOr(['pocket', 'side'], written.pocket.side, languageDefaults.cardPocketSide.value, {
              allowZero: true,
            }),
          },
  }
}
