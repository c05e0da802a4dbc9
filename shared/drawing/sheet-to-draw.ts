import type { Blank } from '../pieces/blank.ts'

/** A sheet as its page heads it. */
export interface SheetToDraw {
  readonly piece: string
  readonly blank: Blank
  readonly copies: number
  readonly paper: string
}
