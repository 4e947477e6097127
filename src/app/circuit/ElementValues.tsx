import {
  assumedOf,
  type CircuitElement,
  countedValue,
  type ElementValue,
  formatElementLimit,
  formatElementValue,
  markedValue,
  nameOfElementValue,
  type Sheet,
  type Typed,
  valuesOfKind,
} from '../../sheet'
import { Cell } from '../schedule/Cell'
import { usePageStore } from '../store'
import { commitElementLimit, commitElementValue, type Standing } from './commit'

const EXAMPLES: { readonly [value in ElementValue]: string } = {
  resistance: '47 Ω',
  inductance: '150 mH',
  capacitance: '16 µF',
  reactance: '35 Ω',
  dcResistance: '8.1 Ω',
}

/** A value as it stands somewhere; undefined where nothing is typed yet. */
interface Line {
  readonly value: ElementValue
  readonly standing: Standing | undefined
  readonly typed: Typed | undefined
}

/** The values of an element, each with its tolerance: on its nameplate, or counted in the check. */
export function ElementValues(properties: {
  readonly sheet: Sheet
  readonly element: CircuitElement
  readonly name: string
}) {
  const { sheet, element, name } = properties
  return (
    <div className="element-values">
      {linesOf(element).map((line) => (
        <ValueLine
          key={`${line.value} ${line.standing === 'counted' && markedValue(element, line.value) ? 'counted' : ''}`}
          sheet={sheet}
          element={element}
          name={name}
          line={line}
        />
      ))}
    </div>
  )
}

function linesOf(element: CircuitElement): readonly Line[] {
  const values = valuesOfKind(element.kind).flatMap((value): readonly Line[] => {
    const [marked, counted] = [markedValue(element, value), countedValue(element, value)]
    if (marked === undefined && counted === undefined) {
      return [{ value, standing: undefined, typed: undefined }]
    }
    return [
      ...(marked ? [{ value, standing: 'marked' as const, typed: marked }] : []),
      ...(counted ? [{ value, standing: 'counted' as const, typed: counted }] : []),
    ]
  })
  if (element.kind !== 'coil') return values
  const typed = countedValue(element, 'dcResistance')
  return [...values, { value: 'dcResistance', standing: undefined, typed }]
}

function ValueLine(properties: {
  readonly sheet: Sheet
  readonly element: CircuitElement
  readonly name: string
  readonly line: Line
}) {
  const { sheet, element, name, line } = properties
  const { value, standing, typed } = line
  const store = usePageStore()
  const caption = nameOfElementValue(value)
  const whose = `${caption} of ${name}${standing === 'counted' ? ', counted' : ''}`
  const limit = typed && formatElementLimit(typed, value)
  const { elementPercent } = assumedOf(sheet)
  return (
    <div className="element-value">
      <span className="value-name">
        {caption}
        {standing && <small>{standing}</small>}
      </span>
      <Cell
        name={`${capital(whose)}`}
        column="element-value"
        shown={typed ? formatElementValue(typed, value) : ''}
        typed={typed?.text ?? (typed ? formatElementValue(typed, value) : '')}
        placeholder={EXAMPLES[value]}
        onCommit={(text) => commitElementValue(store, element, value, standing, typed, text)}
      />
      <Cell
        name={`Tolerance of the ${whose}`}
        column="element-limit"
        shown={limit ?? ''}
        typed={limit ?? ''}
        placeholder={`± ${elementPercent} % assumed`}
        onCommit={(text) => commitElementLimit(store, element, value, standing, typed, text)}
      />
    </div>
  )
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}
