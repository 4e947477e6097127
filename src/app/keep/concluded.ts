import type { Sheet } from '../../sheet'
import { answerOf, describeAnswer } from '../store'

/**
 * What a sheet concludes, a sentence each, for someone who has yet to check it: the conclusion that was
 * written, then what each sum says.
 */
export function concludedOf(sheet: Sheet): readonly string[] {
  const written = sheet.report?.conclusion?.trim()
  const answer = answerOf(sheet)
  const said = (sheet.sums ?? []).slice(0, 4).map(({ id }) => describeAnswer(answer, id))
  return [...(written ? [written] : []), ...said].filter((sentence) => sentence !== '')
}

/** Whose sheet it is, as its title block has it: “Pump 3, no-load test” (job V-118), tested by N. N. */
export function describeOwner(title: string, sheet: Sheet): string {
  const { number, testedBy, date } = sheet.job ?? {}
  return [
    `“${title || 'Untitled sheet'}”`,
    ...(number ? [` (job ${number})`] : []),
    ...(testedBy ? [`, tested by ${testedBy}`] : []),
    ...(date ? [`, ${date}`] : []),
  ].join('')
}
