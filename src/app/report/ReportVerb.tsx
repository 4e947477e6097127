import { lazy, Suspense, useState } from 'react'

const ReportDialog = lazy(async () => ({
  default: (await import('./ReportDialog')).ReportDialog,
}))

/** The verb that shows the report as it will be printed. */
export function ReportVerb() {
  const [isOpen, setOpen] = useState(false)
  return (
    <>
      <button type="button" className="verb" onClick={() => setOpen(true)}>
        Report
      </button>
      {isOpen && (
        <Suspense>
          <ReportDialog onClose={() => setOpen(false)} />
        </Suspense>
      )}
    </>
  )
}
