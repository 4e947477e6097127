import { withChange } from './edits/change'
import { nextRevision } from './revision'
import { isSameValue, signedPartOf } from './signed-part'
import type { Job, Sheet, VoidedSignature } from './types'

/** Which of the signatures. */
export type SignatureKind = VoidedSignature['kind']

/** Who signed, and on which day. */
export interface Signature {
  readonly by: string
  /** ISO 8601. */
  readonly date?: string
}

const FIELDS = {
  checked: { by: 'checkedBy', date: 'checkedDate' },
  approved: { by: 'approvedBy', date: 'approvedDate' },
} as const

const KINDS = ['checked', 'approved'] as const

/** A signature that stands on the sheet; undefined where there is none. */
export function signatureOf({ job }: Sheet, kind: SignatureKind): Signature | undefined {
  const by = job?.[FIELDS[kind].by] ?? ''
  const date = job?.[FIELDS[kind].date]
  return by.trim() === '' ? undefined : { by, ...(date !== undefined && { date }) }
}

/** The last signature of that kind that no longer holds, where none has been given since. */
export function voidedSignatureOf(sheet: Sheet, kind: SignatureKind): VoidedSignature | undefined {
  if (signatureOf(sheet, kind) !== undefined) return undefined
  return sheet.job?.voided?.findLast((voided) => voided.kind === kind)
}

/** The signatures that an edit voided. */
export function voidedBetween(before: Sheet, after: Sheet): readonly VoidedSignature[] {
  return (after.job?.voided ?? []).slice(before.job?.voided?.length ?? 0)
}

/**
 * The sheet that an edit made, with the signatures that it voids taken from their places and kept as
 * voided, and the revision raised. An edit that changes nothing of what was signed voids nothing; one
 * that signs anew keeps its own signature, and one that sets the revision its own revision.
 */
export function withVoidedSignatures(before: Sheet, after: Sheet): Sheet {
  const signed = KINDS.filter((kind) => signatureOf(before, kind) !== undefined)
  if (signed.length === 0 || isSameValue(signedPartOf(before), signedPartOf(after))) return after
  const job = signed.reduce((left: Job, kind) => {
    const signature = signatureOf(before, kind)
    const isLeft = isSameValue(signature, signatureOf(after, kind))
    return isLeft ? withChange(left, { [FIELDS[kind].by]: null, [FIELDS[kind].date]: null }) : left
  }, after.job ?? {})
  const voided = [...(job.voided ?? []), ...signed.map((kind) => voidedOf(before, kind))]
  const isRaised = before.revision !== after.revision
  const revision = isRaised ? after.revision : nextRevision(before.revision)
  return withChange<Sheet>({ ...after, job: { ...job, voided } }, { revision: revision ?? null })
}

function voidedOf(sheet: Sheet, kind: SignatureKind): VoidedSignature {
  const { revision } = sheet
  return {
    kind,
    ...(signatureOf(sheet, kind) ?? { by: '' }),
    ...(revision !== undefined && { revision }),
  }
}
