import { Menu } from '../shell/Menu'
import { usePageStore } from '../store'
import { copyPicture, savePng, saveSvg } from './save'

/** The ways the drawing leaves the page. */
export function DrawingMenu() {
  const store = usePageStore()
  return (
    <Menu
      verb="Save drawing"
      entries={[
        { verb: 'SVG, true to scale', onChoose: () => saveSvg(store) },
        { verb: 'PNG picture', onChoose: () => savePng(store) },
        { verb: 'Picture to the clipboard', onChoose: () => copyPicture(store) },
      ]}
    />
  )
}
