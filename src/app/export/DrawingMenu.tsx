import { Menu, type MenuEntry } from '../shell/Menu'
import { type Store, usePageStore } from '../store'
import { copyPicture, savePng, saveSvg } from './save'

/** The ways the drawing leaves the page. */
export function DrawingMenu() {
  const store = usePageStore()
  return <Menu verb="Save drawing" entries={drawingVerbs(store)} />
}

/** What can be done with the drawing alone. */
export function drawingVerbs(store: Store): readonly MenuEntry[] {
  return [
    { verb: 'SVG, true to scale', onChoose: () => saveSvg(store) },
    { verb: 'PDF, true to scale', onChoose: () => void saveDrawingPdf(store) },
    { verb: 'PNG picture', onChoose: () => savePng(store) },
    { verb: 'Picture to the clipboard', onChoose: () => copyPicture(store) },
  ]
}

async function saveDrawingPdf(store: Store): Promise<void> {
  const report = await import('../report/save-pdf')
  await report.saveDrawingPdf(store)
}
