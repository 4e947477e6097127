/**
 * A running sum that keeps what each addition rounds off, and what adding up those rounds off in its
 * turn: doubly compensated, so that n terms x that cancel leave at most about (n · 2⁻⁵³)³ · Σ|x|.
 * The method is the cascaded error-free addition of Ogita, Rump and Oishi, "Accurate sum and dot
 * product", SIAM J. Sci. Comput. 26 (2005), with Knuth's exact two-term sum.
 */
export class CompensatedSum {
  private sum = 0
  private firstRest = 0
  private secondRest = 0

  /** Adds a term. */
  add(term: number): void {
    const { sum, firstRest } = this
    const total = sum + term
    const part = total - sum
    const rounding = sum - (total - part) + (term - part)
    const rest = firstRest + rounding
    const restPart = rest - firstRest
    this.secondRest += firstRest - (rest - restPart) + (rounding - restPart)
    this.sum = total
    this.firstRest = rest
  }

  /** The sum of all terms so far; not finite where a term is not, or where they outgrow a double. */
  get total(): number {
    return this.sum + (this.firstRest + this.secondRest)
  }
}
