import { WIDTHS } from '../items/style'
import { boxOfText } from '../primitives/text'
import type { Item, TextItem } from '../scene'
import type { Palette } from '../theme'
import type { PlacedLabel } from './place-labels'

/** The leaders and texts of placed labels: all leaders first, so that they lie under the texts. */
export function labelItems(labels: readonly PlacedLabel[], palette: Palette): Item[] {
  const leaders = labels.flatMap(({ leader, wish }): Item[] =>
    leader
      ? [
          {
            part: 'label',
            arrow: wish.arrow,
            kind: 'lines',
            segments: [leader.from.x, leader.from.y, leader.to.x, leader.to.y],
            stroke: palette.thin,
            width: WIDTHS.thin,
          },
        ]
      : [],
  )
  return [...leaders, ...labels.map((label) => textItem(label, palette))]
}

function textItem({ wish, runs, box }: PlacedLabel, palette: Palette): TextItem {
  const origin = { at: { x: 0, y: 0 }, anchor: 'start', runs } as const
  const { bottom } = boxOfText(origin)
  return {
    part: 'label',
    arrow: wish.arrow,
    kind: 'text',
    ...origin,
    at: { x: box.left, y: box.bottom - bottom },
    fill: wish.fill,
    halo: palette.paper,
  }
}
