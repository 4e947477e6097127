/** The part without its fields that are numbers too large to be written down: they are left open. */
export function onlyFinite<Part extends object>(part: Part): Part {
  const fields = Object.entries(part)
  if (fields.every(([, value]) => isWritable(value))) return part
  return Object.fromEntries(fields.filter(([, value]) => isWritable(value))) as Part
}

function isWritable(value: unknown): boolean {
  return typeof value !== 'number' || Number.isFinite(value)
}
