/** What a step that can fail on a user's input returns: a value, or one plain sentence that says what to do. */
export type Result<Value> =
  | { readonly ok: true; readonly value: Value }
  | { readonly ok: false; readonly problem: string }

/** A result that holds a value. */
export function success<Value>(value: Value): Result<Value> {
  return { ok: true, value }
}

/** A result that holds a problem: a whole sentence, ready to be shown. */
export function failure(problem: string): { readonly ok: false; readonly problem: string } {
  return { ok: false, problem }
}
