import { useEffect, useRef } from 'react'
import type { Page } from '../../drawing/report'
import { pageElement } from './page-element'

/** One page as it will be printed, as wide as there is room, with what does not fit on it. */
export function PagePreview({ page }: { readonly page: Page }) {
  const paper = useRef<HTMLDivElement>(null)
  useEffect(() => {
    paper.current?.replaceChildren(pageElement(page))
  }, [page])
  const { number, count, format, orientation, remarks } = page
  return (
    <figure className="page-preview" data-orientation={orientation}>
      <div ref={paper} className="page-paper" />
      <figcaption>
        {`Sheet ${number} of ${count}, ${format} ${orientation}`}
        {remarks.map((remark) => (
          <strong key={remark} className="page-remark">
            {remark}
          </strong>
        ))}
      </figcaption>
    </figure>
  )
}
