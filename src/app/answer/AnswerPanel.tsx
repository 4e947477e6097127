import { stampWordsOf } from '../../drawing'
import { hiddenSums, shownAnswer, usePage } from '../store'
import { Alternatives } from './Alternatives'
import './answer.css'
import { ReadingMoves } from './ReadingMoves'
import { RegionsSwitch } from './RegionsSwitch'
import { uncheckedNames } from './text'
import { ValuesSwitch } from './ValuesSwitch'

/** Whether the readings agree, and what follows from them: the verdict, the moves, what is open. */
export function AnswerPanel() {
  const { sheet, whole, former } = usePage(shownAnswer)
  const progress = usePage((state) => state.progress)
  const isHidden =
    usePage(({ history, pen, chosenSum }) => hiddenSums(history.sheet, pen, chosenSum)).size > 0
  const evaluation = whole ?? former
  if (evaluation === undefined && progress.state !== 'failed' && progress.state !== 'slow') {
    return null
  }
  const words = evaluation && stampWordsOf(sheet, evaluation)
  const unchecked = evaluation ? uncheckedNames(sheet, evaluation) : []
  return (
    <section aria-labelledby="answer-heading" className="answer">
      <h2 id="answer-heading">Best values</h2>
      {progress.state === 'slow' && (
        <p className="answer-progress" role="status">
          Working out the best values. The figures as read stand meanwhile; any edit starts anew.
        </p>
      )}
      {progress.state === 'failed' && (
        <p className="problem-text" role="alert">
          {progress.text}
        </p>
      )}
      {isHidden && (
        <p className="unchecked">
          Hidden until the last arrow is drawn by hand, or until you ask for what is calculated.
        </p>
      )}
      {evaluation && !isHidden && (
        <div data-former={whole === undefined || undefined}>
          {words && (
            <p className="verdict" data-verdict={words.verdict}>
              <strong>{words.head}</strong> <span>{words.figures}</span>
            </p>
          )}
          <ValuesSwitch />
          <RegionsSwitch />
          <Cautions cautions={evaluation.cautions ?? []} />
          <ReadingMoves sheet={sheet} evaluation={evaluation} />
          {unchecked.length > 0 && (
            <p className="unchecked">Nothing checks reading {unchecked.join('; ')}.</p>
          )}
          <Alternatives sheet={sheet} evaluation={evaluation} isFormer={whole === undefined} />
        </div>
      )}
    </section>
  )
}

function Cautions({ cautions }: { readonly cautions: readonly { about: string; text: string }[] }) {
  if (cautions.length === 0) return null
  return (
    <ul className="cautions">
      {cautions.map(({ about, text }) => (
        <li key={`${about} ${text}`}>{text}</li>
      ))}
    </ul>
  )
}
