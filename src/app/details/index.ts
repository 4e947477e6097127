export { DrawingSettings } from './DrawingSettings'
export { TitleBlock } from './TitleBlock'
