import type { PieceGiven } from '../pieces/given.ts'
import type { Millimetres, Range, Ruler, RulerUnit } from '../units/units.ts'

/** A place in a file, 1-based, columns in UTF-16 units; `path` are the keys that lead to it. */
export interface Place {
  readonly file: string
  readonly line: number
  readonly column: number
  readonly endLine: number
  readonly endColumn: number
  readonly path: readonly (string | number)[]
}

/** Something in a file that cannot be understood: the fact, and what to write instead. */
export interface Problem {
  /** Stable kebab-case word, such as `length-decimal-comma` or `unknown-key`. */
  readonly code: string
  readonly message: string
  readonly hint: string
  readonly at: Place
}

export interface Stock {
  readonly name: string
  readonly title: string | null
  /** Grams per square metre; `null` where neither grammage nor basis weight was given. */
  readonly grammage: number | null
  /** Centred caliper; `null` where it must be estimated from the grammage. */
  readonly caliper: Millimetres | null
  /** Half-width of the caliper; `null` takes the model's default for the grammage. */
  readonly caliperHalfWidth: Millimetres | null
  readonly grain: 'long' | 'short' | null
  /** Sheet it is bought in. */
  readonly sheet: { readonly length: Millimetres; readonly width: Millimetres; readonly name: string } | null
}

/** Half-widths of a class of makers, in millimetres. */
export interface Maker {
  readonly name: string
  readonly cut: Millimetres
  readonly score: Millimetres
  readonly fence: Millimetres
}

/** What a fit must leave, total along each axis. An axis not named takes the default of its relation. */
export interface Clearance {
  /** `name` where it is a named requirement, else `null`. */
  readonly name: string | null
  readonly length: Range | null
  readonly width: Range | null
  readonly depth: Range | null
  readonly headspace: Range | null
  readonly overlap: Range | null
  /** Rattling counts as binding does. */
  readonly strict: boolean
}

export type RuleLevel = 'off' | 'info' | 'warn' | 'fail'

export interface Family {
  readonly name: string
  readonly title: string | null
  readonly mark: string | null
  readonly sizes: readonly string[]
}

export interface NamedSize {
  readonly length: Millimetres
  readonly width: Millimetres
}

/** The design tokens that hold for a set: the workspace's with the set's own over them. */
export interface Tokens {
  readonly units: RulerUnit
  readonly ruler: Ruler
  readonly stocks: ReadonlyMap<string, Stock>
  readonly sizes: ReadonlyMap<string, NamedSize>
  readonly clearances: ReadonlyMap<string, Clearance>
  readonly makers: ReadonlyMap<string, Maker>
  readonly workmanship: string
  readonly checks: ReadonlyMap<string, RuleLevel>
  /** Shares between 0 and 1. */
  readonly target: number
  readonly floor: number
  /** Range of relative humidity in percent the pieces may see; `null` leaves humidity out. */
  readonly humidity: { readonly min: number; readonly max: number } | null
}

export interface Workspace {
  /** Path of `foldgauge.yaml` as given; `null` for a set that stands alone. */
  readonly file: string | null
  readonly title: string | null
  readonly tokens: Tokens
  readonly families: ReadonlyMap<string, Family>
  /** Globs of the set files, relative to the workspace. */
  readonly sets: readonly string[]
  readonly problems: readonly Problem[]
  /** Where each token is written, by `stocks.smooth-270` and the like. */
  placeOf(path: readonly (string | number)[]): Place | null
}

/** One piece, or several kinds at once, put into, over or around another. */
export interface Fit {
  readonly id: string
  /** What is put: one entry for a single piece; counts are per stack. */
  readonly put: readonly { readonly count: number; readonly piece: string }[]
  /** True where the author wrote a list, which is always a stack. */
  readonly isStack: boolean
  readonly relation: 'in' | 'over' | 'around'
  readonly to: string
  readonly stands: 'flat' | 'upright' | null
  readonly count: number
  readonly holding: string | null
  readonly turn: 'quarter' | 'none' | null
  readonly clearance: Clearance | null
  readonly workmanship: string | null
  /** Further stocks to judge with. */
  readonly papers: readonly string[]
}

export interface Waiver {
  readonly rule: string
  /** Piece, fit, or `fit:axis`; `null` waives the rule for the whole set. */
  readonly subject: string | null
  readonly reason: string
  /** Last day it holds, YYYY-MM-DD. */
  readonly until: string
  /** Position in the list, for its place. */
  readonly index: number
}

export interface TemplateSet {
  readonly file: string
  readonly text: string
  readonly name: string
  readonly title: string
  readonly family: string | null
  /** Sizes its family keeps to, by name; empty where it names none. */
  readonly familySizes: ReadonlyMap<string, NamedSize>
  /** What blanks are cut from. */
  readonly sheet: { readonly length: Millimetres; readonly width: Millimetres; readonly name: string }
  readonly mail: string | null
  readonly tokens: Tokens
  /** Tokens this set overrides, as dotted paths. */
  readonly pieces: ReadonlyMap<string, PieceGiven>
  readonly fits: readonly Fit[]
  readonly waivers: readonly Waiver[]
  readonly steps: 'auto' | readonly string[]
  /** Place of the thing at a path; falls back to the nearest enclosing place that exists. */
  placeOf(path: readonly (string | number)[]): Place
}

/** A set read from text: the set, or what is wrong with it. Sizes left open are `open`, to be sized. */
export interface SetReading {
  readonly set: TemplateSet | null
  readonly problems: readonly Problem[]
  /** Paths whose value is `fit`. */
  readonly open: readonly (readonly (string | number)[])[]
}
