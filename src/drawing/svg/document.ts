import { svgOf } from '../primitives'
import type { Item, Scene } from '../scene'
import { escapeJson, escapeText } from './escape'
import { formatMillimetres } from './number'

/** Where the sheet stands inside the drawing's metadata. */
export const SHEET_NAMESPACE = 'urn:phasogon:sheet'
/** The upright face, and what stands in for it. */
export const FAMILY = 'Phasogon Sans, DejaVu Sans, Verdana, sans-serif'

/** What of a scene, or of a page of a report, an SVG is written from. */
export type SvgScene = Pick<Scene, 'width' | 'height' | 'items' | 'title' | 'description'>

/**
 * The scene as an SVG document whose millimetres are true: `width` and `height` in mm, one unit of
 * the `viewBox` a millimetre, text as text, presentation attributes only. The sheet's text is kept
 * in the metadata, so that the drawing can be opened as a sheet again.
 *
 * @param sheetText The sheet as JSON.
 */
export function svg(scene: SvgScene, sheetText: string): string {
  const [width, height] = [formatMillimetres(scene.width), formatMillimetres(scene.height)]
  const size = `width="${width}mm" height="${height}mm" viewBox="0 0 ${width} ${height}"`
  const named = 'role="img" aria-labelledby="phasogon-title phasogon-description"'
  const parts = [
    '<?xml version="1.0" encoding="UTF-8"?>\n',
    `<svg xmlns="http://www.w3.org/2000/svg" ${size} ${named} font-family="${FAMILY}"`,
    ' xml:space="preserve">',
    `<title id="phasogon-title">${escapeText(scene.title.trim() || 'Untitled')}</title>`,
    `<desc id="phasogon-description">${escapeText(scene.description)}</desc>`,
    `<metadata><sheet xmlns="${SHEET_NAMESPACE}">${escapeJson(sheetText)}</sheet></metadata>`,
  ]
  let part: Item['part'] | undefined
  for (const item of scene.items) {
    if (item.part !== part) {
      parts.push(part === undefined ? '\n' : '</g>\n', `<g id="phasogon-${item.part}">`)
      part = item.part
    }
    parts.push(svgOf(item, scene.height))
  }
  parts.push(part === undefined ? '\n' : '</g>\n', '</svg>\n')
  return parts.join('')
}
