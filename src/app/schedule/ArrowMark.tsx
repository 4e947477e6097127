import { SAMPLE_SIZE, sampleArrow } from '../../drawing'
import type { Quantity } from '../../sheet'
import { useTheme } from '../board'

/** The arrow that stands for a quantity on the sheet: shape first, hue second. */
export function ArrowMark({ quantity }: { readonly quantity: Quantity }) {
  const { width, height } = SAMPLE_SIZE
  return (
    <svg className="mark" viewBox={`0 0 ${width} ${height}`} aria-hidden="true">
      {sampleArrow(quantity, useTheme()).map((item) =>
        item.kind === 'lines' ? (
          <path
            key="shaft"
            d={`M ${item.segments.slice(0, 2).join(' ')} L ${item.segments.slice(2).join(' ')}`}
            stroke={item.stroke}
            strokeWidth={item.width}
          />
        ) : (
          <polygon key="head" points={item.points.join(' ')} fill={item.fill} />
        ),
      )}
    </svg>
  )
}
