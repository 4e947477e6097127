/** Rows of cells from tab-separated or comma-separated text, as a spreadsheet puts it on the clipboard. */
export async function toTable(text: string): Promise<readonly (readonly string[])[]> {
  const { default: papa } = await import('papaparse')
  const hasTabs = text.includes('\t')
  return papa.parse<string[]>(text.trim(), {
    delimiter: hasTabs ? '\t' : delimiterOf(text),
    skipEmptyLines: false,
  }).data
}

/** A semicolon where there is one, because a comma may then be a decimal comma. */
function delimiterOf(text: string): string {
  return text.includes(';') ? ';' : ','
}
