import { type Evaluation, formOf, isGroup, type Sheet, type WiredNode } from '../../sheet'
import { ElementRow } from './ElementRow'
import { keyOfPath, nameOfNode } from './names'

/** A part of the circuit as a list inside a list, as its groups stand inside each other. */
export function Branches(properties: {
  readonly sheet: Sheet
  readonly wired: WiredNode
  readonly evaluation: Evaluation | undefined
}) {
  const { sheet, wired, evaluation } = properties
  const { node, branches, path, element } = wired
  if (!isGroup(node)) {
    return element ? <ElementRow sheet={sheet} element={element} evaluation={evaluation} /> : null
  }
  if (branches.length === 0) {
    return (
      <p className="circuit-lead">
        {`Nothing is in ${formOf(node)} yet. Add the first element, then type what it is marked with.`}
      </p>
    )
  }
  return (
    <div className="group">
      <p className="group-name">{`In ${formOf(node)}:`}</p>
      <ul
        className="branches"
        aria-label={path.length === 0 ? 'Elements of the circuit' : nameOfNode(sheet, wired)}
      >
        {branches.map((branch) => (
          <li key={branch.element?.id ?? keyOfPath(branch.path)}>
            <Branches sheet={sheet} wired={branch} evaluation={evaluation} />
          </li>
        ))}
      </ul>
    </div>
  )
}
