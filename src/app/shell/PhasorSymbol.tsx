import { labelRuns } from '../../drawing'

/** A phasor's label as ISO 80000-1 sets it, as on the drawing: italic symbol, upright subscript. */
export function PhasorSymbol({ label }: { readonly label: string }) {
  return (
    <span className="symbol">
      {labelRuns(label, 1).map(({ text, face, rise }) => {
        if (face === 'symbol') return <i key="symbol">{text}</i>
        return rise ? <sub key="subscript">{text}</sub> : <span key="words">{text}</span>
      })}
    </span>
  )
}
