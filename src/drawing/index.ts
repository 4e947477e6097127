export { measureText } from './font/measure'
export { shorten } from './font/shorten'
export { type LayoutOptions, layout } from './layout'
export { frameOf, paperSizeOf } from './paper'
export type { Frozen } from './placement/place'
export type {
  ArcItem,
  Item,
  LinesItem,
  PathItem,
  PlacedArrow,
  Scene,
  TextItem,
  TextRun,
} from './scene'
export { labelRuns } from './text/label-runs'
export { type Palette, paletteOf, type Theme } from './theme'
