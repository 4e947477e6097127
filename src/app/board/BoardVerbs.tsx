import { type KeyboardEvent, useMemo } from 'react'
import { isOffPaper, type Scene } from '../../drawing'
import { usePage, usePageStore } from '../store'

/** The verbs that lie on the desk beside the paper. */
export function BoardVerbs(properties: {
  readonly scene: Scene
  /** Arrows move the sheet, + and − zoom, 0 shows all of it. */
  readonly onKeyDown: (event: KeyboardEvent) => void
  readonly onFit: () => void
  readonly onZoom: (factor: number) => void
}) {
  const { scene, onKeyDown, onFit, onZoom } = properties
  const store = usePageStore()
  const isAdjusted = usePage(({ values }) => values === 'adjusted')
  const { drawing: pinned, hand } = store.getState().history.sheet
  const isPinned = pinned?.origin !== undefined || pinned?.unitsPerCentimetre !== undefined
  const isOff = useMemo(() => isOffPaper(scene), [scene])
  const refit = () =>
    store
      .getState()
      .edit({ kind: 'set-drawing', drawing: { origin: null, unitsPerCentimetre: null } })

  return (
    <div
      className="board-verbs"
      role="toolbar"
      aria-label="View of the sheet; arrow keys move it"
      onKeyDown={onKeyDown}
    >
      {scene.labelsLeftOut > 0 && (
        <p className="board-remark">
          {scene.labelsLeftOut === 1
            ? '1 label left out: no free place'
            : `${scene.labelsLeftOut} labels left out: no free place`}
        </p>
      )}
      {isAdjusted && <p className="board-remark">Drawn as adjusted</p>}
      {scene.isSchematicLeftOut && <p className="board-remark">Circuit left out: no free place</p>}
      {scene.predictedLeftOut !== undefined && (
        <p className="board-remark">Part of the prediction lies beyond the paper</p>
      )}
      {scene.isStampLeftOut && <p className="board-remark">Stamp left out: no free place</p>}
      {isOff && <p className="board-remark">The drawing reaches beyond its frame</p>}
      {/* What a hand drew is true to the scale that it was drawn at. */}
      {isPinned && hand === undefined && (
        <button type="button" className="verb" onClick={refit}>
          Fit drawing to paper
        </button>
      )}
      <button type="button" className="verb small" aria-label="Smaller" onClick={() => onZoom(0.8)}>
        −
      </button>
      <button type="button" className="verb small" aria-label="Larger" onClick={() => onZoom(1.25)}>
        +
      </button>
      <button type="button" className="verb" onClick={onFit}>
        Whole sheet
      </button>
    </div>
  )
}
