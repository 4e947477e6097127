import { formatNumber } from '../../../core'
import { type Evaluation, limitOf, nameOfReading, type Sheet } from '../../../sheet'
import { stampWordsOf } from '../../stamp/words'
import { gap, heading, lines } from '../blocks'
import { counted } from '../names'
import type { Section } from '../section'
import { INK, STYLES } from '../style'
import { fieldList } from '../table'

const USUAL_CRITERION =
  'All readings together can be true: every one lies within its limits of values that fit the circuit and the sums, at a coverage of 95 %.'

/** What was asked of the readings, what came of it, and what that rests on. */
export const verdict: Section = {
  name: 'verdict',
  blocks: ({ sheet, evaluation, width }) => {
    const words = stampWordsOf(sheet, evaluation)
    const criterion = sheet.report?.criterion?.trim() || USUAL_CRITERION
    return [
      heading('Criterion and verdict', width),
      ...(words
        ? [
            {
              pieces: [
                ...lines(words.head, STYLES.strong, width, INK.verdicts[words.verdict]),
                ...lines(words.figures, STYLES.body, width),
                gap(1),
              ],
              isHeading: true,
            },
          ]
        : []),
      ...fieldList(
        [
          ['Criterion', criterion],
          ['Verdict rests on', groundsOf(sheet, evaluation)],
          ['Limits', limitsText(sheet)],
          ['Not checked by any other', uncheckedText(sheet, evaluation)],
          ['Suspect', suspectsText(sheet, evaluation)],
          ['Other drawings', alternativesText(evaluation)],
        ].flatMap(([caption = '', value = '']) =>
          value === '' ? [] : [[caption, value] as const],
        ),
        width,
      ),
    ]
  },
}

/** Probabilities below this are said to be below it. */
const SMALLEST_PROBABILITY = 0.0001

function groundsOf(sheet: Sheet, { agreement }: Evaluation): string {
  if (agreement === undefined) {
    return 'Nothing yet: whether the readings agree was not worked out when this was printed.'
  }
  const used = (sheet.readings ?? []).filter(({ struck }) => !struck).length
  const { verdict: found, chiSquare, degreesOfFreedom, probability } = agreement
  const from = `${counted(used, 'reading')} and what was typed`
  if (found === 'not-enough') return `${from}: too little to settle every value.`
  if (degreesOfFreedom === 0)
    return `${from}: just enough to settle the values, none to check them.`
  const chance =
    probability < SMALLEST_PROBABILITY
      ? `less than ${formatNumber(SMALLEST_PROBABILITY, 4)}`
      : formatNumber(probability, probability < 0.01 ? 4 : 2)
  return `${from}, ${counted(degreesOfFreedom, 'check')} among them: χ² = ${formatNumber(chiSquare, 2)} with ${counted(degreesOfFreedom, 'degree')} of freedom. Readings that are as good as their limits say would differ at least so much with a probability of ${chance}.`
}

/** Who says how far the readings may be off. */
function limitsText(sheet: Sheet): string {
  const counts = { stated: 0, instrument: 0, assumed: 0 }
  for (const reading of sheet.readings ?? []) {
    const from = reading.struck ? undefined : limitOf(sheet, reading)?.from
    if (from !== undefined) counts[from] += 1
  }
  const { stated, instrument, assumed } = counts
  return [
    ...(stated > 0 ? [`${stated} as stated`] : []),
    ...(instrument > 0 ? [`${instrument} from the accuracy of the instrument`] : []),
    ...(assumed > 0 ? [`${assumed} assumed, since nobody stated one`] : []),
  ].join('; ')
}

function uncheckedText(sheet: Sheet, { agreement }: Evaluation): string {
  return (agreement?.unchecked ?? []).map((id) => nameOfReading(sheet, id)).join('; ')
}

/** How many of the suspects are named. */
const MOST_SUSPECTS = 5

function suspectsText(sheet: Sheet, { agreement, suspects = [] }: Evaluation): string {
  if (agreement?.verdict !== 'disagree') return ''
  return suspects
    .slice(0, MOST_SUSPECTS)
    .map(({ reading, score }) => `${nameOfReading(sheet, reading)} (${formatNumber(score, 1)} σ)`)
    .join('; ')
}

function alternativesText({ alternatives = [] }: Evaluation): string {
  return alternatives.length < 2
    ? ''
    : `The readings allow ${alternatives.length} drawings; the one that was chosen is shown.`
}
