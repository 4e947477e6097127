/** A browser with one window, driven alike whatever its engine. */
export interface Visitor {
  open(address: string): Promise<void>
  /** Runs an expression in the page, and promises what it gives. */
  run<Value>(expression: string): Promise<Value>
  end(): Promise<void>
}
