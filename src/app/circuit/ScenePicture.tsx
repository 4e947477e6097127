import { useEffect, useRef } from 'react'
import type { Scene } from '../../drawing'
import { paintItems } from '../board'
import { useFonts } from '../fonts'

/** Pixels for each millimetre: as sharp as screens show it. */
const dotsPerMillimetre = 10

/** A scene as a picture in the page, as wide as there is room for. */
export function ScenePicture({ scene }: { readonly scene: Scene }) {
  const canvas = useRef<HTMLCanvasElement>(null)
  const hasFonts = useFonts()

  useEffect(() => {
    const pen = canvas.current?.getContext('2d')
    if (!canvas.current || !pen) return
    canvas.current.width = Math.round(scene.width * dotsPerMillimetre)
    canvas.current.height = Math.round(scene.height * dotsPerMillimetre)
    pen.scale(dotsPerMillimetre, dotsPerMillimetre)
    const items = hasFonts ? scene.items : scene.items.filter(({ kind }) => kind !== 'text')
    paintItems(pen, items, scene.height)
  }, [scene, hasFonts])

  return <canvas ref={canvas} className="scene-picture" role="img" aria-label={scene.description} />
}
