import type { PdfFonts } from '../../drawing/pdf'

let loading: Promise<PdfFonts> | undefined

/**
 * The typefaces that go into a PDF, fetched once. Fails where they cannot be had; the next call then
 * tries again.
 */
export function loadPrintFonts(): Promise<PdfFonts> {
  loading ??= fetchAll().catch((error: unknown) => {
    loading = undefined
    throw error
  })
  return loading
}

async function fetchAll(): Promise<PdfFonts> {
  const [sans, bold, symbol] = await Promise.all([
    fetchFace('sans'),
    fetchFace('bold'),
    fetchFace('symbol'),
  ])
  return { sans, bold, symbol }
}

async function fetchFace(face: keyof PdfFonts): Promise<Uint8Array> {
  const address = `${import.meta.env.BASE_URL}fonts/phasogon-print-${face}.ttf`
  const response = await fetch(address)
  if (!response.ok) throw new Error('the typefaces of the PDF could not be fetched.')
  return new Uint8Array(await response.arrayBuffer())
}
