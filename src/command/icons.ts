import { mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { chromium } from 'playwright-core'
import { browserFlags, maybeBrowser } from './browser.mjs'
import { projectFolder } from './run.mjs'

// Draws the icons that an installed page needs as pictures, from public/icon.svg.
const folder = join(projectFolder, 'public', 'icons')
const drawing = readFileSync(join(projectFolder, 'public', 'icon.svg'), 'utf8')

/** An icon that a system cuts to its own shape needs paper to its edges, and all else well inside. */
const icons = [
  { name: 'icon-180.png', size: 180, margin: 0.08, ground: '#fffffb' },
  { name: 'icon-192.png', size: 192, margin: 0, ground: 'transparent' },
  { name: 'icon-512.png', size: 512, margin: 0, ground: 'transparent' },
  { name: 'icon-maskable-512.png', size: 512, margin: 0.1, ground: '#fffffb' },
]

const executablePath = await maybeBrowser()
if (executablePath === undefined) throw new Error('There is no Chromium on this machine.')
const browser = await chromium.launch({ executablePath, args: browserFlags })
try {
  mkdirSync(folder, { recursive: true })
  for (const { name, size, margin, ground } of icons) {
    const page = await browser.newPage({ viewport: { width: size, height: size } })
    const inner = Math.round(size * (1 - 2 * margin))
    const frame = margin > 0 ? drawing.replace(/<rect[^>]*>/, '') : drawing
    const sized = frame.replace(/width="32" height="32"/, `width="${inner}" height="${inner}"`)
    await page.setContent(
      `<body style="margin:0;height:100vh;display:grid;place-items:center;background:${ground}">${sized}`,
    )
    const picture = await page.screenshot({ omitBackground: true })
    writeFileSync(join(folder, name), picture)
    await page.close()
    console.log(name)
  }
} finally {
  await browser.close()
}
