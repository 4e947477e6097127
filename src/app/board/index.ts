export { Board } from './Board'
export { paintItems } from './paint'
export { drawnScene } from './scene'
export { useTheme } from './useScreen'
