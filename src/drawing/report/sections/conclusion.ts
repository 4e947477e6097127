import { heading, paragraph } from '../blocks'
import type { Section } from '../section'

/** What the tester concludes; nothing is said where nothing was written. */
export const conclusion: Section = {
  name: 'conclusion',
  blocks: ({ sheet, width }) => {
    const text = sheet.report?.conclusion?.trim() ?? ''
    return text === '' ? [] : [heading('Conclusion', width), paragraph(text, width)]
  },
}
