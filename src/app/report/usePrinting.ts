import { useEffect } from 'react'
import type { Page } from '../../drawing/report'
import { pageElement } from './page-element'

/**
 * While this is in use, what the browser prints is these pages and nothing else, each on its own paper:
 * they are put into the document when it prints, and taken out behind it.
 */
export function usePrinting(pages: readonly Page[]): void {
  useEffect(() => {
    let printed: Element | undefined
    const takeOut = () => {
      printed?.remove()
      printed = undefined
    }
    const putIn = () => {
      takeOut()
      printed = printedElement(pages)
      document.body.append(printed)
    }
    window.addEventListener('beforeprint', putIn)
    window.addEventListener('afterprint', takeOut)
    return () => {
      takeOut()
      window.removeEventListener('beforeprint', putIn)
      window.removeEventListener('afterprint', takeOut)
    }
  }, [pages])
}

function printedElement(pages: readonly Page[]): Element {
  const element = document.createElement('div')
  element.className = 'printed'
  element.append(
    ...pages.map((page) => {
      const paper = document.createElement('div')
      paper.className = `printed-${page.format}-${page.orientation}`.toLowerCase()
      paper.append(pageElement(page))
      return paper
    }),
  )
  return element
}
