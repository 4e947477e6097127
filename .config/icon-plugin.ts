import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import type { Plugin } from 'vite'

const file = join(import.meta.dirname, '..', 'public', 'icon.svg')

/**
 * Writes the page's icon into the page itself: a browser asks for an icon's file again and again, as
 * often as the address changes, and the page is to ask for nothing once it is loaded.
 */
export function iconPlugin(): Plugin {
  return {
    name: 'icon',
    apply: 'build',
    transformIndexHtml: {
      order: 'post',
      handler: (html) => {
        const drawing = readFileSync(file, 'utf8').replace(/\s+/g, ' ').trim()
        const address = `data:image/svg+xml,${encodeURIComponent(drawing)}`
        return html.replace(/href="[^"]*\bicon\.svg"/, `href="${address}"`)
      },
    },
  }
}
