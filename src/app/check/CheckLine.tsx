import { drawnScene } from '../board'
import { PhasorSymbol } from '../shell/PhasorSymbol'
import {
  checkedSum,
  formerPhasors,
  hiddenSums,
  nameOfSum,
  quantityOfSum,
  shownAnswer,
  shownSheet,
  usePage,
  usePageStore,
} from '../store'
import { checkText } from './text'

/** The line under the drawing that says whether it is right: one sum, calculated beside measured. */
export function CheckLine() {
  const store = usePageStore()
  const sheet = usePage(shownSheet)
  const answer = usePage(shownAnswer)
  const kept = usePage((state) => state.history.sheet)
  const chosen = usePage((state) => state.chosenSum)
  const hasFailed = usePage(({ progress }) => progress.state === 'failed')
  const pen = usePage((state) => state.pen)
  const sum = checkedSum(sheet, chosen)
  if (!sum) {
    return (
      <section className="check" aria-label="Check">
        <div>
          <p className="name">Nothing to check yet</p>
          <p className="under">
            Add a sum to see its exact resultant here, beside what was measured.
          </p>
        </div>
      </section>
    )
  }
  // A drag keeps the scale of the drawing that it began on.
  const scale = drawnScene(kept, 'light').unitsPerCentimetre[quantityOfSum(sheet, sum)]
  const isHidden = hiddenSums(kept, pen, sum.id).has(sum.id)
  const { evaluation, whole, former } = answer
  const before =
    whole === undefined && !hasFailed
      ? { evaluation: former, phasors: formerPhasors(answer) }
      : undefined
  const text = checkText(sheet, evaluation, sum, scale, isHidden, before)
  return (
    <section
      className="check"
      aria-label="Check"
      data-hand={text.figures.length > 4 || undefined}
      data-judged={sum.equals !== undefined || undefined}
    >
      <div>
        <p className="name">{text.drawn}</p>
        <p className="figure">
          {(sheet.sums?.length ?? 0) > 1 ? (
            <select
              className="choice"
              aria-label="Sum to check"
              value={sum.id}
              onChange={(event) => store.getState().chooseSum(event.target.value)}
            >
              {sheet.sums?.map((each) => (
                <option key={each.id} value={each.id}>
                  {nameOfSum(sheet, each)}
                </option>
              ))}
            </select>
          ) : (
            <PhasorSymbol label={nameOfSum(sheet, sum)} />
          )}
        </p>
        <p className="under">{text.scale}</p>
      </div>
      {text.figures.map(({ name, figure, under, isFormer }) => (
        <dl key={name} data-former={isFormer}>
          <dt>{name}</dt>
          <dd className="figure">{figure}</dd>
          <dd className="under">{under}</dd>
        </dl>
      ))}
    </section>
  )
}
