export { DrawingMenu, drawingVerbs } from './DrawingMenu'
export { download } from './download'
export { fileNameOf } from './file-name'
export { saveSheet, toSheetFile } from './save-sheet'
