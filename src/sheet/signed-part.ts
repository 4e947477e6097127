import { without } from './edits/change'
import type { Sheet } from './types'

/**
 * What a signature stands for: all of the sheet but the signatures themselves, and but the paper on which
 * it is printed.
 */
export function signedPartOf({ job, drawing, ...others }: Sheet): object {
  return {
    ...others,
    ...maybe(
      'job',
      job && without(job, 'checkedBy', 'checkedDate', 'approvedBy', 'approvedDate', 'voided'),
    ),
    ...maybe('drawing', drawing && without(drawing, 'paper', 'orientation', 'origin')),
  }
}

/** A field with a part in it; nothing where the part is empty, since an edit leaves that out. */
function maybe(field: string, part: object | undefined): object {
  return part === undefined || Object.keys(part).length === 0 ? {} : { [field]: part }
}

/** Whether two JSON values are equal, whatever the order of their fields. What they share is not looked into. */
export function isSameValue(one: unknown, other: unknown): boolean {
  if (Object.is(one, other)) return true
  if (!isObject(one) || !isObject(other) || Array.isArray(one) !== Array.isArray(other)) {
    return one === other
  }
  const fields = Object.keys(one)
  return (
    fields.length === Object.keys(other).length &&
    fields.every((field) => Object.hasOwn(other, field) && isSameValue(one[field], other[field]))
  )
}

function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null
}
