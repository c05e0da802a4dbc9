/** A piece whose sizes leave nothing that could be folded. Expected: the check turns it into a problem at the piece. */
export class ImpossiblePiece extends Error {
  constructor(
    readonly piece: string,
    /** The fact, in the author's nouns. */
    message: string,
    readonly hint: string,
    /** Key of the piece that holds the size. */
    readonly key: string | null = null,
  ) {
    super(message)
  }
}
