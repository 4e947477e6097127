import { useEffect, useRef, useState } from 'react'
import type { Item } from '../../drawing'
import type { Sheet } from '../../sheet'
import { drawnScene, paintItems } from '../board'

const dotsPerMillimetre = 1.1
/** What would only be grey at this size. */
const left: ReadonlySet<Item['part']> = new Set(['grid', 'title-block', 'scale-bar', 'axis'])

/** A small picture of a sheet's drawing; it is painted once it is seen. */
export function SheetPicture({ sheet }: { readonly sheet: Sheet | undefined }) {
  const canvas = useRef<HTMLCanvasElement>(null)
  const [isSeen, setSeen] = useState(false)

  useEffect(() => {
    if (!canvas.current) return
    const observer = new IntersectionObserver((entries) => {
      if (entries.some(({ isIntersecting }) => isIntersecting)) setSeen(true)
    })
    observer.observe(canvas.current)
    return () => observer.disconnect()
  }, [])

  useEffect(() => {
    const pen = canvas.current?.getContext('2d')
    if (!isSeen || !canvas.current || !pen || !sheet) return
    const scene = drawnScene(sheet, 'light')
    canvas.current.width = Math.round(scene.width * dotsPerMillimetre)
    canvas.current.height = Math.round(scene.height * dotsPerMillimetre)
    pen.scale(dotsPerMillimetre, dotsPerMillimetre)
    const items = scene.items.filter(({ part }) => !left.has(part))
    paintItems(pen, items, scene.height)
  }, [isSeen, sheet])

  return <canvas ref={canvas} className="sheet-picture" />
}
