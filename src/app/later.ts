/**
 * Fetches what the page needs only later, once it is drawn: from then on it asks for nothing. Whatever is
 * imported at need elsewhere is named here too.
 */
export async function fetchLater(): Promise<void> {
  await Promise.allSettled([
    import('papaparse'),
    import('./share/qr-code'),
    import('./circuit/Circuit'),
  ])
}
