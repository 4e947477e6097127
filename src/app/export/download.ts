/** Hands a file to the browser to be saved. */
export function download(blob: Blob, name: string): void {
  const address = URL.createObjectURL(blob)
  const anchor = document.createElement('a')
  anchor.href = address
  anchor.download = name
  anchor.click()
  setTimeout(() => URL.revokeObjectURL(address), 10_000)
}
