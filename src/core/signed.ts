/** A figure with its sign, plus or true minus; one that is nothing has none. */
export function signed(text: string): string {
  if (/^[−0]/.test(text) && !/[1-9]/.test(text)) return text.replace('−', '')
  return text.startsWith('−') ? text : `+${text}`
}
