import { type Page, pageSvg } from '../../drawing/report'

/** A page as an element of the document, with true millimetres. */
export function pageElement(page: Page): Element {
  const parsed = new DOMParser().parseFromString(pageSvg(page), 'image/svg+xml')
  return document.importNode(parsed.documentElement, true)
}
