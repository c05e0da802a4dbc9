import {
  PDFContext,
  PDFHexString,
  PDFName,
  PDFNumber,
  PDFRawStream,
  PDFWriter,
  type PDFDict,
  type PDFRef,
} from 'pdf-lib'
import type { LayerName, Page } from '../../drawing/drawing.ts'
import { layerOrder, layerTitles } from '../../drawing/line-styles.ts'
import { engineVersion } from '../../edition.ts'
import { asciiBytes } from './ascii-bytes.ts'
import { pageContent, roleTags, type TaggedText } from './page-content.ts'
import { embedFont, streamOf, type Deflate, type UsedFont } from './pdf-fonts.ts'
import { processingSteps } from './processing-steps.ts'
import type { TrueTypeFont } from './true-type.ts'

/** A font by weight; the first that has a character draws it. */
export interface DocumentFont {
  readonly font: TrueTypeFont
  readonly isBold: boolean
}

export interface PdfOptions {
  readonly title: string
  readonly author: string
  /** BCP 47 language of the text. */
  readonly language: string
  readonly fonts: readonly DocumentFont[]
  /** Packs streams; without it they stay readable, and larger. */
  readonly deflate: Deflate | null
  /** Hexadecimal digest of what the document was made from; its identity, so that the same input gives the same bytes. */
  readonly digest: string
  /** Only these layers; `null` for all. */
  readonly layers: ReadonlySet<LayerName> | null
}

const points = 72 / 25.4

/** Text in XML of ASCII only: marks of its syntax and every other character by number. */
const xmlText = (content: string): string =>
  [...content]
    .filter(
      (character) =>
        character === '\t' ||
        (character >= ' ' && !/[\ud800-\udfff\ufffe\uffff]/.test(character)) ||
        character.length === 2,
    )
    .map((character) =>
      /[ -~]/.test(character) && !/[&<>"']/.test(character)
        ? character
        : `&#${String(character.codePointAt(0) ?? 32)};`,
    )
    .join('')

/** The title and language once more as metadata that search tools read. */
function metadataOf(options: PdfOptions): Uint8Array {
  return asciiBytes(
    `<?xpacket begin="" id="W5M0MpCehiHzreSzNTczkc9d"?>\n<x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"><rdf:Description rdf:about="" xmlns:dc="http://purl.org/dc/elements/1.1/"><dc:title><rdf:Alt><rdf:li xml:lang="x-default">${xmlText(options.title)}</rdf:li></rdf:Alt></dc:title><dc:language><rdf:Bag><rdf:li>${xmlText(options.language)}</rdf:li></rdf:Bag></dc:language></rdf:Description></rdf:RDF></x:xmpmeta>\n<?xpacket end="w"?>`,
  )
}

/** One optional-content group an operation, with its processing step. */
function layerGroup(context: PDFContext, layer: LayerName): PDFRef {
  const { group, type } = processingSteps[layer]
  return context.register(
    context.obj({
      Type: 'OCG',
      Name: PDFHexString.fromText(layerTitles[layer]),
      GTS_Metadata: context.obj({ GTS_ProcStepsGroup: group, ...(type === null ? {} : { GTS_ProcStepsType: type }) }),
    }),
  )
}

/** A spot colour that shows black: full tint of the colorant is no light at all. */
function spotColour(context: PDFContext, layer: LayerName): PDFRef {
  const tint = context.obj({ FunctionType: 2, Domain: [0, 1], C0: [1], C1: [0], N: 1 })
  return context.register(
    context.obj(['Separation', PDFName.of(`Foldgauge ${layerTitles[layer]}`), 'DeviceGray', context.register(tint)]),
  )
}

/** Labels of a drawing that follow one another are one element; every heading and paragraph is one of its own. */
function groupTexts(
  texts: readonly TaggedText[],
): readonly { readonly role: TaggedText['role']; readonly ids: readonly number[] }[] {
  const groups: { role: TaggedText['role']; ids: number[] }[] = []
  for (const { role, id } of texts) {
    const last = groups[groups.length - 1]
    if (role === 'label' && last?.role === 'label') last.ids.push(id)
    else groups.push({ role, ids: [id] })
  }
  return groups
}

/** The tree that gives tagged text its order and role, page by page. */
function structure(
  context: PDFContext,
  pageRefs: readonly PDFRef[],
  tagged: readonly (readonly TaggedText[])[],
): PDFRef {
  const root = context.nextRef()
  const document = context.nextRef()
  const numbers: (PDFNumber | PDFRef)[] = []
  const sections = pageRefs.map((page, index) => {
    const section = context.nextRef()
    const parents: PDFRef[] = []
    const kids = groupTexts(tagged[index] ?? []).map(({ role, ids }) => {
      const element = context.register(
        context.obj({
          Type: 'StructElem',
          S: roleTags[role],
          P: section,
          Pg: page,
          K: ids.length === 1 ? (ids[0] ?? 0) : [...ids],
        }),
      )
      ids.forEach(() => parents.push(element))
      return element
    })
    context.assign(section, context.obj({ Type: 'StructElem', S: 'Sect', P: document, K: kids }))
    numbers.push(PDFNumber.of(index), context.register(context.obj(parents)))
    return section
  })
  context.assign(document, context.obj({ Type: 'StructElem', S: 'Document', P: root, K: sections }))
  context.assign(
    root,
    context.obj({
      Type: 'StructTreeRoot',
      K: document,
      ParentTree: context.register(context.obj({ Nums: numbers })),
      ParentTreeNextKey: pageRefs.length,
    }),
  )
  return root
}

function pageDict(
  context: PDFContext,
  page: Page,
  index: number,
  parent: PDFRef,
  resources: PDFRef,
  content: PDFRef,
): PDFDict {
  const box = (left: number, bottom: number, right: number, top: number): number[] =>
    [left, bottom, right, top].map((value) => Math.round(value * points * 10000) / 10000)
  const trim = page.trim ?? { left: 0, bottom: 0, right: page.width, top: page.height }
  return context.obj({
    Type: 'Page',
    Parent: parent,
    MediaBox: box(0, 0, page.width, page.height),
    TrimBox: box(trim.left, trim.bottom, trim.right, trim.top),
    ...(page.trim === null ? {} : { BleedBox: box(0, 0, page.width, page.height) }),
    Resources: resources,
    Contents: content,
    StructParents: index,
    Tabs: 'S',
  })
}

/**
 * Writes pages as a PDF 1.7 at true size: layers with processing steps, spot colours with overprint, tagged text in an
 * embedded subset font, no scaling preset for printing. The same input gives the same bytes.
 */
export async function writePdf(pages: readonly Page[], options: PdfOptions): Promise<Uint8Array> {
  const context = PDFContext.create()
  const fonts: readonly UsedFont[] = options.fonts.map((font, index) => ({
    ...font,
    name: `F${String(index)}`,
    codePointByGlyph: new Map<number, number>(),
  }))
  const regular = fonts.filter((font) => !font.isBold)
  const bold = [...fonts.filter((font) => font.isBold), ...regular]
  const contents = pages.map((page) => pageContent(page, (isBold) => (isBold ? bold : regular), options.layers))
  const used = layerOrder.filter((layer) => contents.some((content) => content.layers.has(layer)))
  const groups = new Map(used.map((layer) => [layer, layerGroup(context, layer)]))
  const colours = new Map(used.map((layer) => [layer, spotColour(context, layer)]))
  const byName = (prefix: string, refs: ReadonlyMap<LayerName, PDFRef>): Record<string, PDFRef> =>
    Object.fromEntries([...refs].map(([layer, ref]) => [`${prefix}_${layer}`, ref]))
  const embedded = fonts.filter((font) => font.codePointByGlyph.size > 0)
  const resources = context.register(
    context.obj({
      Properties: byName('L', groups),
      ColorSpace: byName('S', colours),
      ExtGState: { Over: { Type: 'ExtGState', OP: true, op: true, OPM: 1 } },
      Font: Object.fromEntries(embedded.map((font) => [font.name, embedFont(context, font, options.deflate)])),
    }),
  )
  const parent = context.nextRef()
  const pageRefs = pages.map((page, index) => {
    const stream = context.register(streamOf(context, asciiBytes(contents[index]?.stream ?? ''), options.deflate))
    return context.register(pageDict(context, page, index, parent, resources, stream))
  })
  context.assign(parent, context.obj({ Type: 'Pages', Kids: pageRefs, Count: pageRefs.length }))
  const order = [...groups.values()]
  const metadata = PDFRawStream.of(context.obj({ Type: 'Metadata', Subtype: 'XML' }), metadataOf(options))
  const root = context.register(
    context.obj({
      Type: 'Catalog',
      Pages: parent,
      Lang: PDFHexString.fromText(options.language),
      MarkInfo: { Marked: true },
      StructTreeRoot: structure(
        context,
        pageRefs,
        contents.map((content) => content.tagged),
      ),
      Metadata: context.register(metadata),
      ViewerPreferences: { PrintScaling: 'None', Duplex: 'Simplex', PickTrayByPDFSize: true, DisplayDocTitle: true },
      ...(order.length === 0
        ? {}
        : {
            OCProperties: {
              OCGs: order,
              D: { Name: PDFHexString.fromText('Template'), BaseState: 'ON', Order: order, ON: order },
            },
          }),
    }),
  )
  const info = context.register(
    context.obj({
      Title: PDFHexString.fromText(options.title),
      Author: PDFHexString.fromText(options.author),
      Producer: PDFHexString.fromText(`Foldgauge ${engineVersion}`),
    }),
  )
  const identity = PDFHexString.of(
    options.digest
      .replace(/[^0-9a-f]/gi, '')
      .padEnd(32, '0')
      .slice(0, 32),
  )
  context.trailerInfo.Root = root
  context.trailerInfo.Info = info
  context.trailerInfo.ID = context.obj([identity, identity])
  return PDFWriter.forContext(context, Number.MAX_SAFE_INTEGER).serializeToBuffer()
}
