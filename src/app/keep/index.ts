import './keep.css'

export { type Keeping, openKeeping } from './browser'
export { CopyBanner } from './CopyBanner'
export { KeepingContext, useKeeping } from './context'
export { KeepNotes } from './KeepNotes'
export { MySheetsVerb } from './MySheets'
export { openFiled, openLinked } from './open-kept'
export { useSaveToFile } from './useSaveToFile'
