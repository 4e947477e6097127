import { type Sheet, serializeSheet } from '../../sheet'
import { download } from './download'
import { fileNameOf } from './file-name'

/** The sheet as a file of its own, under the name that it is saved by. */
export function toSheetFile(sheet: Sheet): File {
  const name = fileNameOf(sheet, 'phasogon.json')
  return new File([serializeSheet(sheet)], name, { type: 'application/json' })
}

/** Saves a sheet as a file that opens here again; returns its name. */
export function saveSheet(sheet: Sheet): string {
  const file = toSheetFile(sheet)
  download(file, file.name)
  return file.name
}
