export interface Complex {
  readonly re: number
  readonly im: number
}
