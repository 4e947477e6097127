import { usePage, usePageStore } from '../store'

const VALUES = [
  { values: 'read', name: 'As read' },
  { values: 'adjusted', name: 'As adjusted' },
] as const

/** Whether the board draws the readings as read, with their gap, or the best values, which close. */
export function ValuesSwitch() {
  const store = usePageStore()
  const shown = usePage((state) => state.values)
  return (
    <fieldset className="values-switch">
      <legend>The board draws the values</legend>
      {VALUES.map(({ values, name }) => (
        <label key={values}>
          <input
            type="radio"
            name="values"
            checked={shown === values}
            onChange={() => store.getState().showValues(values)}
          />
          {name}
        </label>
      ))}
    </fieldset>
  )
}
