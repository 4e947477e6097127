export { DrawingMenu } from './DrawingMenu'
export { fileNameOf } from './file-name'
