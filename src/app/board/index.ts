export { Board } from './Board'
export { paintItems } from './paint'
export { drawnScene, sceneOfAnswer, type ViewOptions } from './scene'
export { useTheme } from './useScreen'
