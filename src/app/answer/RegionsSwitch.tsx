import { usePage, usePageStore } from '../store'

/** Whether the 95 % regions of the best values are drawn at the tips, on the board and in what is saved. */
export function RegionsSwitch() {
  const store = usePageStore()
  const isShown = usePage((state) => state.pen.areRegionsShown)
  return (
    <label className="regions-switch">
      <input
        type="checkbox"
        checked={isShown}
        onChange={({ target }) => store.getState().setPen({ areRegionsShown: target.checked })}
      />
      Draw the 95 % region at each tip, to scale
    </label>
  )
}
