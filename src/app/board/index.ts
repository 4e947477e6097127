export { Board } from './Board'
export { paintItems } from './paint'
export { drawnScene, sceneOfAnswer } from './scene'
export { useTheme } from './useScreen'
