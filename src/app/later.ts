/**
 * Fetches what the page needs only later, once it is drawn: from then on it asks for nothing. Whatever is
 * imported at need elsewhere is named here too.
 */
export async function fetchLater(): Promise<void> {
  await Promise.allSettled([
    import('papaparse'),
    import('./share/qr-code'),
    import('./circuit/Circuit'),
    import('./link/read-file'),
    import('./details/TitleFields'),
    import('./details/DrawingFields'),
    import('./report/Hazards'),
    import('./report/FindingFields'),
    import('./report/ReportDialog'),
    import('./report/save-pdf'),
    import('../drawing/pdf'),
    import('./report/print-fonts').then(({ loadPrintFonts }) => loadPrintFonts()),
  ])
}
