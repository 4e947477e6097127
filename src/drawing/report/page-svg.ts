import { svgOf } from '../primitives'
import { FAMILY } from '../svg/document'
import { escapeText } from '../svg/escape'
import { formatMillimetres } from '../svg/number'
import type { Page } from './page'

/**
 * A page as an `<svg>` element to stand in a document with others: its millimetres are true, its ids are
 * its own by the page's number, its texts are text, and it carries presentation attributes only.
 */
export function pageSvg({ width, height, items, title, description, number }: Page): string {
  const [wide, high] = [formatMillimetres(width), formatMillimetres(height)]
  const name = `phasogon-page-${number}`
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${wide}mm" height="${high}mm"`,
    ` viewBox="0 0 ${wide} ${high}" role="img" aria-labelledby="${name}-title ${name}-description"`,
    ` font-family="${FAMILY}" xml:space="preserve">`,
    `<title id="${name}-title">${escapeText(title)}</title>`,
    `<desc id="${name}-description">${escapeText(description)}</desc>`,
    ...items.map((item) => svgOf(item, height)),
    '</svg>',
  ].join('')
}
