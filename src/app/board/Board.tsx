import { type KeyboardEvent, useEffect, useId, useMemo, useRef, useState } from 'react'
import { Layer, Stage } from 'react-konva/lib/ReactKonvaCore'
import type { Grip, Scene } from '../../drawing'
import { answerOf, shownSheet, usePage, usePageStore } from '../store'
import { BoardVerbs } from './BoardVerbs'
import { CarriedShape } from './CarriedShape'
import { describeBoard } from './describe'
import { createGestures, type Readout } from './gestures'
import { viewAfterKey } from './keys'
import { ReadoutLabel } from './ReadoutLabel'
import { SceneShape } from './SceneShape'
import { SelectionShape } from './SelectionShape'
import { drawnScene, isGround } from './scene'
import { useMovingScene } from './useMovingScene'
import { usePointers } from './usePointers'
import { useBoardSize, usePixelRatio, useTheme } from './useScreen'
import { fitView, type View, zoomView } from './view'

/** The drawing sheet on its desk: the scene, and the gestures that change it. */
export function Board() {
  const store = usePageStore()
  const sheet = usePage((state) => state.history.sheet)
  const shown = usePage(shownSheet)
  const selection = usePage((state) => state.selection)
  const theme = useTheme()
  const pixelRatio = usePixelRatio()
  const root = useRef<HTMLDivElement>(null)
  const size = useBoardSize(root)
  const [chosenView, setView] = useState<View>()
  const [base, setBase] = useState<Scene>()
  const [readout, setReadout] = useState<Readout>()
  const [grip, setGrip] = useState<Grip>()
  const description = useId()

  const scene = useMemo(() => base ?? drawnScene(sheet, theme), [base, sheet, theme])
  const view = useMemo(() => chosenView ?? fitView(size, scene), [chosenView, size, scene])
  const moving = useMovingScene(base, theme)
  const ground = useMemo(() => scene.items.filter(isGround), [scene])
  const still = useMemo(
    () =>
      scene.items.filter(
        (item) => !isGround(item) && !(item.arrow !== undefined && moving.moved.has(item.arrow)),
      ),
    [scene, moving.moved],
  )

  const words = useMemo(
    () => describeBoard(sheet, answerOf(sheet).evaluation, scene),
    [sheet, scene],
  )

  const latest = useRef({ scene, view, size })
  latest.current = { scene, view, size }
  const gestures = useMemo(
    () =>
      createGestures({
        store,
        scene: () => latest.current.scene,
        view: () => latest.current.view,
        size: () => latest.current.size,
        setView,
        setBase,
        setReadout,
        setGrip,
      }),
    [store],
  )
  usePointers(root, gestures)

  useEffect(() => {
    document.documentElement.dataset.ready = 'true'
    performance.mark('first-shafts')
  }, [])

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return
    const next = viewAfterKey(event.key, view, size, scene)
    if (!next) return
    event.preventDefault()
    setView(next)
  }

  return (
    <section
      className="board"
      ref={root}
      aria-label="Drawing"
      data-grip={grip ? (grip.held === undefined ? grip.at : 'held') : undefined}
      data-busy={base ? true : undefined}
    >
      <div role="img" aria-label="Phasor diagram" aria-describedby={description}>
        <Stage key={pixelRatio} width={size.width} height={size.height} listening={false}>
          <Layer listening={false}>
            <SceneShape items={ground} view={view} height={scene.height} />
          </Layer>
          <Layer listening={false}>
            <SceneShape items={still} view={view} height={scene.height} />
          </Layer>
          <Layer listening={false}>
            <SelectionShape
              scene={moving.after ?? scene}
              selection={selection}
              theme={theme}
              view={view}
            />
            {moving.carried.map((group) => (
              <CarriedShape
                key={group.key}
                items={group.items}
                by={group.by}
                view={view}
                size={size}
                height={scene.height}
              />
            ))}
            <SceneShape items={moving.live} view={view} height={scene.height} />
          </Layer>
        </Stage>
      </div>
      <p id={description} className="visually-hidden">
        {words}
      </p>
      {readout && <ReadoutLabel readout={readout} sheet={shown} board={size} />}
      <BoardVerbs
        onKeyDown={onKeyDown}
        onFit={() => setView(undefined)}
        onZoom={(factor) =>
          setView(zoomView(view, factor, { x: size.width / 2, y: size.height / 2 }))
        }
        scene={scene}
      />
    </section>
  )
}
