/** Why the browser keeps nothing just now. */
export type StorageProblem = 'full' | 'refused' | 'newer' | 'broken'

/** What a storage throws. */
export class StorageError extends Error {
  readonly problem: StorageProblem
  constructor(problem: StorageProblem) {
    super(problem)
    this.problem = problem
  }
}

const sentences: Readonly<Record<StorageProblem, string>> = {
  full: "The browser's store is full, so the last change is not kept: save the sheet to a file, or delete sheets that you no longer need in My sheets.",
  refused:
    'This browser keeps nothing for the page, as in some private windows: save the sheet to a file before you close it.',
  newer:
    'The sheets kept here belong to a newer version of the page, so this one leaves them alone: load the page again to get that version, and save this sheet to a file until then.',
  broken:
    'The store of kept sheets cannot be read, and was left as it is: save the sheet to a file before you close the page.',
}

/** One sentence for the user: what is the matter, and what to do. */
export function describeProblem(problem: StorageProblem): string {
  return sentences[problem]
}

/** Which problem an error of the browser's store is. */
export function problemOf(error: unknown): StorageProblem {
  if (error instanceof StorageError) return error.problem
  const name = error instanceof Error || error instanceof DOMException ? error.name : ''
  if (name === 'QuotaExceededError') return 'full'
  return ['NotFoundError', 'UnknownError', 'DataError', 'DataCloneError'].includes(name)
    ? 'broken'
    : 'refused'
}
