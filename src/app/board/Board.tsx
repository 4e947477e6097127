import { type KeyboardEvent, useId, useMemo, useRef, useState } from 'react'
import { Layer, Stage } from 'react-konva/lib/ReactKonvaCore'
import type { Grip, Item, Scene, Stroke } from '../../drawing'
import { useFonts } from '../fonts'
import { HandVerbs, StrokeForm } from '../hand'
import { answerOf, hiddenSums, shownSheet, usePage, usePageStore } from '../store'
import { BoardVerbs } from './BoardVerbs'
import { CarriedShape } from './CarriedShape'
import { describeBoard } from './describe'
import { createGestures, type DrawnStroke, type Readout } from './gestures'
import { viewAfterKey } from './keys'
import { Loupe } from './Loupe'
import { ReadoutLabel } from './ReadoutLabel'
import { SceneShape } from './SceneShape'
import { SelectionShape } from './SelectionShape'
import { StrokeReadout } from './StrokeReadout'
import { StrokeShape } from './StrokeShape'
import { greyed, isGround, sceneOfAnswer } from './scene'
import { useMovingScene } from './useMovingScene'
import { useNudgeKeys } from './useNudgeKeys'
import { usePointers } from './usePointers'
import { useBoardSize, usePixelRatio, useTheme } from './useScreen'
import { fitView, type View, zoomView } from './view'

/** Notes when the first shafts stand on the screen, and when the labels do too. */
function markDrawn(hasLabels: boolean): void {
  if (performance.getEntriesByName('first-shafts').length === 0) performance.mark('first-shafts')
  if (hasLabels) document.documentElement.dataset.ready = 'true'
}

/** The drawing sheet on its desk: the scene, and the gestures that change it. */
export function Board() {
  const store = usePageStore()
  const sheet = usePage((state) => state.history.sheet)
  const shown = usePage(shownSheet)
  const selection = usePage((state) => state.selection)
  const theme = useTheme()
  const hasFonts = useFonts()
  const pixelRatio = usePixelRatio()
  const root = useRef<HTMLDivElement>(null)
  const size = useBoardSize(root)
  const [chosenView, setView] = useState<View>()
  const [base, setBase] = useState<Scene>()
  const [readout, setReadout] = useState<Readout>()
  const [grip, setGrip] = useState<Grip>()
  const [drawn, setDrawn] = useState<DrawnStroke>()
  const [finished, setFinished] = useState<Stroke>()
  const description = useId()

  const answer = usePage((state) => answerOf(state.history.sheet))
  const values = usePage((state) => state.values)
  const pen = usePage((state) => state.pen)
  const chosenSum = usePage((state) => state.chosenSum)
  const hidden = hiddenSums(sheet, pen, chosenSum)
  const viewOptions = useMemo(
    () => ({
      hidden,
      construction: pen.construction,
      terminals: pen.areTerminalsShown,
      areRegionsShown: pen.areRegionsShown,
      withoutPrediction: pen.isPredictionHidden,
      values,
    }),
    [
      hidden,
      pen.construction,
      pen.areTerminalsShown,
      pen.areRegionsShown,
      pen.isPredictionHidden,
      values,
    ],
  )
  const scene = useMemo(
    () => base ?? sceneOfAnswer(answer, theme, viewOptions),
    [base, answer, theme, viewOptions],
  )
  const view = useMemo(() => chosenView ?? fitView(size, scene), [chosenView, size, scene])
  const moving = useMovingScene(base, theme, viewOptions)
  const ground = useMemo(
    () => scene.items.filter((item) => isGround(item) && (hasFonts || item.kind !== 'text')),
    [scene, hasFonts],
  )
  const still = useMemo(
    () =>
      scene.items
        .filter(
          (item) =>
            !isGround(item) &&
            (hasFonts || item.kind !== 'text') &&
            !(item.arrow !== undefined && moving.moved.has(item.arrow)),
        )
        // While something moves, the verdict and what was solved are of what was there before.
        .map((item) =>
          moving.moved.size > 0 && (isOfAnswer(item) || moving.former.has(item.arrow ?? ''))
            ? greyed(item, theme)
            : item,
        ),
    [scene, moving.moved, moving.former, hasFonts, theme],
  )

  const words = useMemo(
    () => describeBoard(sheet, answer.evaluation, scene),
    [sheet, answer, scene],
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
        // Several moves may come before the next rendering: each goes on from the one before.
        setView: (next) => {
          latest.current = { ...latest.current, view: next }
          setView(next)
        },
        setBase,
        setReadout,
        setGrip: (next) => setGrip((old) => (isSameGrip(old, next) ? old : next)),
        setStroke: setDrawn,
        finishStroke: setFinished,
      }),
    [store],
  )
  usePointers(root, gestures)
  useNudgeKeys(scene)

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return
    const next = viewAfterKey(event.key, view, size, scene)
    if (!next) return
    event.preventDefault()
    setView(next)
  }

  const stroke = drawn?.stroke ?? finished
  const touched = drawn?.touch ? drawn.at : readout?.touch ? readout.at : undefined

  return (
    <section
      className="board"
      ref={root}
      aria-label="Drawing"
      data-pen={pen.mode === undefined || pen.isAdjusting ? undefined : pen.mode}
      data-grip={grip ? (grip.held === undefined ? grip.at : 'held') : undefined}
      data-busy={base ? true : undefined}
    >
      <div role="img" aria-label="Phasor diagram" aria-describedby={description}>
        <Stage key={pixelRatio} width={size.width} height={size.height} listening={false}>
          <Layer listening={false}>
            <SceneShape items={ground} view={view} height={scene.height} />
          </Layer>
          <Layer listening={false} onDraw={() => markDrawn(hasFonts)}>
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
            {stroke && (
              <StrokeShape stroke={stroke} view={view} height={scene.height} theme={theme} />
            )}
          </Layer>
        </Stage>
      </div>
      <p id={description} className="visually-hidden">
        {words}
      </p>
      {touched && <Loupe at={touched} board={root} />}
      {drawn && <StrokeReadout drawn={drawn} scene={scene} sheet={sheet} board={size} />}
      {finished && (
        <StrokeForm stroke={finished} scene={scene} onDone={() => setFinished(undefined)} />
      )}
      <HandVerbs />
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

function isOfAnswer({ part }: Item): boolean {
  return part === 'stamp' || part === 'region'
}

function isSameGrip(one: Grip | undefined, other: Grip | undefined): boolean {
  return one?.arrow === other?.arrow && one?.at === other?.at && one?.held === other?.held
}
