export { DrawingMenu } from './DrawingMenu'
export { fileNameOf } from './file-name'
export { download } from './save'
export { saveSheet, toSheetFile } from './save-sheet'
