import { type Evaluation, quick, type Sheet, withFormerValues } from '../../sheet'
import { type LayoutOptions, layout } from '../layout'
import { isOffPaper } from '../paper'
import type { Scene } from '../scene'
import { footItems } from './foot'
import { type Page, paperOf, type ReportOptions } from './page'

/**
 * The drawing as a page, at exactly the scale that it states, on the paper that the sheet names.
 *
 * @param options Also how many pages belong together and which of them it is; else it stands alone.
 */
export function drawingPage(
  sheet: Sheet,
  evaluation: Evaluation,
  options: ReportOptions & { readonly count?: number; readonly number?: number } = {},
): Page {
  const { count = 1, number = 1, fingerprint, terminals, hidden } = options
  const scene = drawnScene(sheet, evaluation, {
    theme: 'print',
    sheetNumber: `Sheet ${number} of ${count}`,
    ...(terminals !== undefined && { terminals }),
    ...(hidden && { hidden }),
  })
  return {
    ...paperOf(sheet),
    width: scene.width,
    height: scene.height,
    items: [...scene.items, ...footItems(scene, fingerprint)],
    title: `Drawing: ${sheet.title.trim() || 'Untitled'}, sheet ${number} of ${count}`,
    description: scene.description,
    number,
    count,
    remarks: remarksOn(scene),
  }
}

/** The drawing as it is printed: values as they were read, and solved ones where none was. */
export function drawnScene(sheet: Sheet, evaluation: Evaluation, options: LayoutOptions): Scene {
  const { phasors } = withFormerValues(sheet, quick(sheet), evaluation)
  return layout(sheet, { ...evaluation, phasors }, options)
}

function remarksOn(scene: Scene): readonly string[] {
  const { labelsLeftOut } = scene
  return [
    ...(isOffPaper(scene)
      ? ['The drawing reaches beyond its frame: fit it to the paper, or take a larger one.']
      : []),
    ...(labelsLeftOut > 0
      ? [
          `${labelsLeftOut === 1 ? '1 label finds' : `${labelsLeftOut} labels find`} no free place on the drawing: the schedule names every phasor. A larger paper has more room.`,
        ]
      : []),
    ...(scene.isStampLeftOut
      ? ['The drawing leaves no room for the stamp: the verdict stands on the next page.']
      : []),
  ]
}
