/** One figure of the check line. */
export interface CheckFigure {
  readonly name: string
  readonly figure: string
  readonly under: string
  /** It hangs on an answer to the sheet before. */
  readonly isFormer?: true
}
