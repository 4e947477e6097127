import type { Sheet } from '../types'
import { calibrationRemarks } from './calibration'
import { loadingRemarks } from './loading'
import { nonsenseRemarks } from './nonsense'
import { rangeRemarks } from './range'
import type { Remark } from './remark'

export type { Remark } from './remark'

/**
 * What is odd about the readings of a sheet, in the order of the sheet: figures that cannot be, meters
 * whose calibration had lapsed on the day of the test, indications beyond the range or the category,
 * meters that load the circuit. Struck readings are not looked at. Nothing here changes a value.
 */
export function remarksOn(sheet: Sheet): readonly Remark[] {
  return [
    ...calibrationRemarks(sheet),
    ...(sheet.readings ?? [])
      .filter(({ struck }) => struck !== true)
      .flatMap((reading) => [
        ...nonsenseRemarks(sheet, reading),
        ...rangeRemarks(sheet, reading),
        ...loadingRemarks(sheet, reading),
      ]),
  ]
}
