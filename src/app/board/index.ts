export { Board } from './Board'
export { paintItems } from './paint'
export { drawnScene, type ViewOptions } from './scene'
export { useTheme } from './useScreen'
