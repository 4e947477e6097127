import type { Sheet } from '../../sheet'

/** A file name from job number and title: what a file system refuses becomes a hyphen. */
export function fileNameOf(sheet: Sheet, ending: string): string {
  const stem = [sheet.job?.number, sheet.title]
    .filter((part) => part !== undefined && part.trim() !== '')
    .join(' ')
    .normalize('NFC')
    .replace(/[\p{Cc}\p{Cf}<>:"/\\|?*]+/gu, '-')
    .replace(/\s+/g, ' ')
    .replace(/^[.\s-]+|[.\s-]+$/g, '')
  return `${[...stem].slice(0, 80).join('') || 'Phasogon sheet'}.${ending}`
}
