/** How a set is judged; everything the engine does not read from the text. */
export interface CheckOptions {
  /** Path the set is reported under. */
  readonly file: string
  /** Today, YYYY-MM-DD: the engine has no clock of its own. */
  readonly asOf: string
  /** Judge for these makers instead of the workspace's. */
  readonly workmanship?: string
  /** Judge every piece as if cut from this stock. */
  readonly paper?: string
  /** Print scale of printed pieces, 1 for true size. */
  readonly scale?: number
  /** Also work out the smallest change that passes for each verdict that does not. */
  readonly fixes?: boolean
  /** Also work out the window of print scales of each fit. */
  readonly scales?: boolean
}
