/** The fields of every member of a union. */
type FieldOf<Part> = Part extends unknown ? keyof Part : never
/** What a field holds in those members of a union that have it. */
type ValueOf<Part, Field> = Part extends unknown
  ? Field extends keyof Part
    ? Part[Field]
    : never
  : never

/** New values for some fields of a part; null takes a field away. */
export type Change<Part> = {
  readonly [Field in FieldOf<Part>]?: ValueOf<Part, Field> | null
}

/** The part with the change made to a copy; the sheet that comes of it is checked as a whole. */
export function withChange<Part extends object>(part: Part, change: Change<Part>): Part {
  const kept = Object.entries(part).filter(([field]) => !Object.hasOwn(change, field))
  const changed = Object.entries(change).filter(([, value]) => value !== null)
  return Object.fromEntries([...kept, ...changed]) as Part
}

/** The part without some of its optional fields. */
export function without<Part extends object, Field extends keyof Part>(
  part: Part,
  ...fields: readonly Field[]
): Omit<Part, Field> {
  const left = { ...part }
  for (const field of fields) delete left[field]
  return left
}
