import { useState } from 'react'
import { type Scene, svg, type Theme } from '../../drawing'
import {
  schematicScene,
  type TriangleSubject,
  triangleScene,
  triangleSubjects,
} from '../../drawing/circuit'
import { type Evaluation, type Sheet, serializeSheet } from '../../sheet'
import { useTheme } from '../board'
import { download, fileNameOf } from '../export'
import { usePageStore } from '../store'
import { ScenePicture } from './ScenePicture'

const DIAGRAMS = {
  circuit: 'Circuit',
  impedance: 'Impedance triangle',
  power: 'Power triangle',
} as const

type Diagram = keyof typeof DIAGRAMS
const DIAGRAM_LIST = Object.keys(DIAGRAMS) as readonly Diagram[]

/** The circuit's own diagrams: its schematic, and the triangles of impedance and power, to scale. */
export function Diagrams(properties: { readonly sheet: Sheet; readonly evaluation: Evaluation }) {
  const { sheet, evaluation } = properties
  const store = usePageStore()
  const theme = useTheme()
  const [diagram, setDiagram] = useState<Diagram>('circuit')
  const [picked, setPicked] = useState('total')
  const subjects = triangleSubjects(sheet, evaluation)
  const subject = subjects.find(({ of }) => of === picked) ?? subjects[0]
  const scene = sceneOf(sheet, diagram, subject, theme)

  const save = () => {
    const printed = sceneOf(sheet, diagram, subject, 'light')
    if (printed === undefined) return
    const named = { ...sheet, title: `${sheet.title} ${DIAGRAMS[diagram].toLowerCase()}` }
    const name = fileNameOf(named, 'svg')
    const text = svg(printed, serializeSheet(sheet))
    download(new Blob([text], { type: 'image/svg+xml' }), name)
    store.getState().notify({
      tone: 'news',
      text: `Saved “${name}”. Its millimetres are true, and it opens here again as this sheet.`,
    })
  }

  return (
    <fieldset className="diagrams">
      <legend>Diagrams of the circuit</legend>
      <div className="diagram-choice">
        {DIAGRAM_LIST.map((each) => (
          <label key={each}>
            <input
              type="radio"
              name="diagram"
              checked={diagram === each}
              onChange={() => setDiagram(each)}
            />
            {DIAGRAMS[each]}
          </label>
        ))}
      </div>
      {diagram !== 'circuit' && subjects.length > 0 && (
        <label className="field">
          Triangle of
          <select value={subject?.of} onChange={({ target }) => setPicked(target.value)}>
            {subjects.map(({ of, name }) => (
              <option key={of} value={of}>
                {name}
              </option>
            ))}
          </select>
        </label>
      )}
      {scene ? (
        <>
          <ScenePicture scene={scene} />
          <div className="verbs">
            <button type="button" className="verb" onClick={save}>
              Save this diagram, SVG
            </button>
          </div>
        </>
      ) : (
        <p className="circuit-lead">
          There is nothing to draw yet: it takes a voltage and its current, read or predicted.
        </p>
      )}
    </fieldset>
  )
}

function sceneOf(
  sheet: Sheet,
  diagram: Diagram,
  subject: TriangleSubject | undefined,
  theme: Theme,
): Scene | undefined {
  if (diagram === 'circuit') return schematicScene(sheet, theme)
  return subject && triangleScene(diagram, subject, sheet.title, theme)
}
