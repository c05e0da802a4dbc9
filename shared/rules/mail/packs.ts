import { mailPackNames, type MailPackName } from '../../template/mail-pack-names.ts'
import type { Range } from '../../units/units.ts'

/** Where a limit was read: in the operator's own text, in somebody else's, or nowhere. */
export type MailConfidence = 'read' | 'secondary' | 'memory'

/** Postal rules of one class of mail, as they stood in one edition. Millimetres and grams; `null` ends are open. */
export interface MailPack {
  readonly id: MailPackName
  readonly operator: string
  readonly itemClass: string
  /** What is posted: a filled envelope, or a card by itself. */
  readonly item: 'envelope' | 'card'
  /** Date of the edition the figures stand in, YYYY-MM-DD; `null` where the page bore none. */
  readonly edition: string | null
  readonly length: Range
  readonly width: Range
  readonly thickness: Range
  readonly weight: Range
  /** Length divided by width. */
  readonly ratio: Range | null
  /** Length, width and thickness together at most. */
  readonly sum: number | null
  /** A larger least thickness for pieces beyond either of these sizes. */
  readonly largeLeast: { readonly length: number; readonly width: number; readonly thickness: number } | null
  /** At least one of these must be exceeded, else the piece belongs to a smaller class. */
  readonly exceeds: { readonly length: number; readonly width: number; readonly thickness: number } | null
  /** Operator's own tolerance on length and width. */
  readonly tolerance: number
  readonly note: string | null
  readonly source: string
  readonly confidence: MailConfidence
}

const any: Range = { min: null, max: null }
const upTo = (max: number): Range => ({ min: null, max })
const between = (min: number, max: number): Range => ({ min, max })
const from = (min: number): Range => ({ min, max: null })
const inches = (value: number): number => value * 25.4

const plain = {
  item: 'envelope',
  edition: null,
  weight: any,
  ratio: null,
  sum: null,
  largeLeast: null,
  exceeds: null,
  tolerance: 0,
  note: null,
} as const

const usps = { ...plain, operator: 'US Postal Service' } as const
const royalMail = {
  ...plain,
  operator: 'Royal Mail',
  source: "Ofcom and two merchants' tables of Royal Mail sizes",
  confidence: 'secondary',
} as const
const canadaPost = {
  ...plain,
  operator: 'Canada Post',
  source: 'Canada Post, Lettermail, size requirements',
  confidence: 'read',
} as const
const deutschePost = { ...plain, operator: 'Deutsche Post', confidence: 'secondary' } as const
const upu = { ...plain, operator: 'Universal Postal Union' } as const

type Figures = Omit<MailPack, 'id'>

const packs: Readonly<Record<MailPackName, Figures>> = {
  'usps-letter': {
    ...usps,
    itemClass: 'letter, machinable',
    edition: '2021-01-24',
    length: between(inches(5), inches(11.5)),
    width: between(inches(3.5), inches(6.125)),
    thickness: between(inches(0.007), inches(0.25)),
    largeLeast: { length: inches(6), width: inches(4.25), thickness: inches(0.009) },
    weight: upTo(99.2),
    ratio: between(1.3, 2.5),
    note: 'A letter outside the ratio, or with clasps, uneven or stiff contents, goes at a surcharge.',
    source: 'US Postal Service, Domestic Mail Manual 101, 1.1 and 1.2',
    confidence: 'read',
  },
  'usps-flat': {
    ...usps,
    itemClass: 'flat (large envelope)',
    length: upTo(inches(15)),
    width: upTo(inches(12)),
    thickness: between(inches(0.007), inches(0.75)),
    exceeds: { length: inches(11.5), width: inches(6.125), thickness: inches(0.25) },
    weight: upTo(368.5),
    note: 'Flexible, rectangular and uniformly thick. The 13 oz limit is from memory.',
    source: "A printer's summary of Domestic Mail Manual 101, 2",
    confidence: 'secondary',
  },
  'usps-postcard': {
    ...usps,
    item: 'card',
    itemClass: 'card at the card price, single',
    length: between(inches(5), inches(6)),
    width: between(inches(3.5), inches(4.25)),
    thickness: between(inches(0.007), inches(0.016)),
    source: 'US Postal Service, Business Mail 101, sizes for postcards',
    confidence: 'read',
  },
  'usps-postcard-large': {
    ...usps,
    item: 'card',
    itemClass: 'card at the card price, presorted',
    edition: '2021-08-13',
    length: between(inches(5), inches(9)),
    width: between(inches(3.5), inches(6)),
    thickness: between(inches(0.007), inches(0.016)),
    largeLeast: { length: inches(6), width: inches(4.25), thickness: inches(0.009) },
    source: 'US Postal Service, PostalPro, questions on the larger postcard',
    confidence: 'read',
  },
  'royal-mail-letter': {
    ...royalMail,
    itemClass: 'letter',
    length: between(100, 240),
    width: between(70, 165),
    thickness: upTo(5),
    weight: upTo(100),
    note: 'The least size is from memory.',
  },
  'royal-mail-large-letter': {
    ...royalMail,
    itemClass: 'large letter',
    length: upTo(353),
    width: upTo(250),
    thickness: upTo(25),
    weight: upTo(750),
  },
  'canada-post-letter': {
    ...canadaPost,
    itemClass: 'standard lettermail',
    length: between(140, 245),
    width: between(90, 156),
    thickness: between(0.18, 5),
    weight: between(2, 50),
  },
  'canada-post-oversize': {
    ...canadaPost,
    itemClass: 'non-standard and oversize lettermail',
    length: between(140, 380),
    width: between(90, 270),
    thickness: between(0.18, 20),
    weight: between(3, 500),
  },
  'deutsche-post-standard': {
    ...deutschePost,
    itemClass: 'Standardbrief',
    length: between(140, 235),
    width: between(90, 125),
    thickness: upTo(5),
    weight: upTo(20),
    ratio: from(1.414),
    note: 'One source gives 120 mm as the greatest width.',
    source: "Reference pages on the operator's letter conditions",
  },
  'deutsche-post-kompakt': {
    ...deutschePost,
    itemClass: 'Kompaktbrief',
    length: between(100, 235),
    width: between(70, 125),
    thickness: upTo(10),
    weight: upTo(50),
    ratio: from(1.414),
    note: 'The ratio is from memory for this class.',
    source: "Reference pages on the operator's letter conditions",
  },
  'deutsche-post-gross': {
    ...deutschePost,
    itemClass: 'Großbrief',
    length: between(100, 353),
    width: between(70, 250),
    thickness: upTo(20),
    weight: upTo(500),
    note: 'Square envelopes pay at least this class. The least size is from memory.',
    source: "Reference pages on the operator's letter conditions",
  },
  'deutsche-post-maxi': {
    ...deutschePost,
    itemClass: 'Maxibrief',
    length: between(100, 353),
    width: between(70, 250),
    thickness: upTo(50),
    weight: upTo(1000),
    source: 'From memory but for the sizes',
    confidence: 'memory',
  },
  'upu-letter': {
    ...upu,
    itemClass: 'letter',
    length: between(140, 600),
    width: from(90),
    thickness: any,
    weight: upTo(2000),
    sum: 900,
    tolerance: 2,
    source: 'Korea Post, which states the Letter Post Regulations of the Universal Postal Union',
    confidence: 'read',
  },
  'upu-standardized': {
    ...upu,
    itemClass: 'standardized letter',
    length: between(140, 235),
    width: between(90, 120),
    thickness: upTo(5),
    weight: upTo(20),
    ratio: from(1.4),
    tolerance: 2,
    note: 'Another text gives 125 mm as the greatest width.',
    source: 'Korea Post, which states the Letter Post Regulations of the Universal Postal Union',
    confidence: 'read',
  },
  'upu-small-letter': {
    ...upu,
    itemClass: 'small letter, format P',
    length: between(140, 245),
    width: between(90, 165),
    thickness: upTo(5),
    weight: upTo(100),
    source: 'Letter Post Regulations, not read',
    confidence: 'memory',
  },
  'upu-large-letter': {
    ...upu,
    itemClass: 'large letter, format G',
    length: upTo(381),
    width: upTo(305),
    thickness: upTo(20),
    weight: upTo(500),
    source: 'Letter Post Regulations, not read',
    confidence: 'memory',
  },
  'bpost-standard': {
    ...plain,
    operator: 'bpost',
    itemClass: 'standardised item',
    length: between(140, 235),
    width: between(90, 125),
    thickness: between(0.15, 5),
    weight: upTo(50),
    source: 'The Belgian regulator on standardised items',
    confidence: 'read',
  },
}

const isMailPackName = (name: string): name is MailPackName => mailPackNames.some((known) => known === name)

/** Postal rules by name; `null` where there are none of that name. */
export const mailPack = (name: string): MailPack | null => (isMailPackName(name) ? { id: name, ...packs[name] } : null)
