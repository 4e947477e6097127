import type { Sheet } from '../../sheet'

/** Names that some systems keep for devices, whatever their ending. */
const DEVICE = /^(?:con|prn|aux|nul|com\d|lpt\d)(?=\.|$)/i
const LONGEST_STEM = 80

/** A file name from job number and title: what a file system refuses becomes a hyphen. */
export function fileNameOf(sheet: Sheet, ending: string): string {
  const stem = [sheet.job?.number, sheet.title]
    .filter((part) => part !== undefined && part.trim() !== '')
    .join(' ')
    .normalize('NFC')
    .replace(/[\p{Cc}\p{Cf}<>:"/\\|?*]+/gu, '-')
    .replace(/\s+/g, ' ')
  const short = [...trimmed(stem)].slice(0, LONGEST_STEM).join('')
  const name = trimmed(short).replace(DEVICE, '$&-')
  return `${name || 'Phasogon sheet'}.${ending}`
}

/** Without the dots, blanks and hyphens at its ends, which hide a file or are taken off unasked. */
function trimmed(stem: string): string {
  return stem.replace(/^[.\s-]+|[.\s-]+$/g, '')
}
