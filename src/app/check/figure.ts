/** One figure of the check line. */
export interface CheckFigure {
  readonly name: string
  readonly figure: string
  readonly under: string
}
