import { useEffect, useRef } from 'react'
import { type Item, layout, type Theme } from '../../drawing'
import { type Alternative, asAlternative, type Evaluation, type Sheet } from '../../sheet'
import { paintItems, useTheme } from '../board'
import { usePageStore } from '../store'
import { describeAlternative } from './text'

const dotsPerMillimetre = 1.1
const painted: ReadonlySet<Item['part']> = new Set(['paper', 'arrow', 'angle', 'gap'])

/** Every drawing that the readings allow, as a small picture; one click takes another. */
export function Alternatives(properties: {
  readonly sheet: Sheet
  readonly evaluation: Evaluation
  /** It is of the sheet before: nothing can be taken from it. */
  readonly isFormer: boolean
}) {
  const { sheet, evaluation, isFormer } = properties
  const store = usePageStore()
  const theme = useTheme()
  const { alternatives = [] } = evaluation
  if (alternatives.length < 2) return null
  return (
    <div>
      <p>
        The readings allow {alternatives.length} drawings. The first is drawn; take another where
        you know better.
      </p>
      <ul className="alternatives">
        {alternatives.map((alternative, at) => {
          const description = describeAlternative(sheet, alternatives, at)
          return (
            <li key={JSON.stringify(alternative)}>
              <button
                type="button"
                aria-pressed={at === 0}
                disabled={isFormer}
                onClick={() => {
                  if (at === 0) return
                  store.getState().edit({ kind: 'choose', chosen: chosenOf(alternative) })
                }}
              >
                <AlternativePicture
                  sheet={sheet}
                  evaluation={evaluation}
                  alternative={alternative}
                  theme={theme}
                />
                <span>{description === '' ? `Drawing ${at + 1}` : description}</span>
              </button>
            </li>
          )
        })}
      </ul>
    </div>
  )
}

/** The drawing as the sheet names the one that is meant. */
function chosenOf({ phasors }: Alternative): NonNullable<Sheet['chosen']> {
  return phasors.map(({ id, magnitude, angle }) => ({ phasor: id, magnitude, angle }))
}

function AlternativePicture(properties: {
  readonly sheet: Sheet
  readonly evaluation: Evaluation
  readonly alternative: Alternative
  readonly theme: Theme
}) {
  const { sheet, evaluation, alternative, theme } = properties
  const canvas = useRef<HTMLCanvasElement>(null)

  useEffect(() => {
    const pen = canvas.current?.getContext('2d')
    if (!canvas.current || !pen) return
    const shown = asAlternative(sheet, evaluation, alternative)
    const scene = layout(sheet, shown, { theme, labels: false })
    canvas.current.width = Math.round(scene.width * dotsPerMillimetre)
    canvas.current.height = Math.round(scene.height * dotsPerMillimetre)
    pen.scale(dotsPerMillimetre, dotsPerMillimetre)
    paintItems(
      pen,
      scene.items.filter(({ part }) => painted.has(part)),
      scene.height,
    )
  }, [sheet, evaluation, alternative, theme])

  return <canvas ref={canvas} className="sheet-picture" />
}
