import { join } from 'node:path'
import { chromium } from 'playwright-core'
import { browserFlags, maybeBrowser } from './browser.mjs'
import { projectFolder } from './run.mjs'
import { createStaticServer, listen } from './static-server.mjs'

// Takes the pictures of the README and of the manifest from the built page, as a first visit shows it.
const pictures = [
  { name: 'screenshot.png', viewport: { width: 1360, height: 850 }, deviceScaleFactor: 1 },
  { name: 'screenshot-narrow.png', viewport: { width: 390, height: 844 }, deviceScaleFactor: 2 },
]

const executablePath = await maybeBrowser()
if (executablePath === undefined) throw new Error('There is no Chromium on this machine.')

const server = createStaticServer(join(projectFolder, 'dist'))
const port = await listen(server, [0])
const browser = await chromium.launch({ executablePath, args: browserFlags })
try {
  for (const { name, ...screen } of pictures) {
    const page = await browser.newPage({ ...screen, colorScheme: 'light' })
    await page.goto(`http://127.0.0.1:${port}/`)
    await page.waitForSelector('html[data-settled]', { state: 'attached' })
    const path = join(projectFolder, 'public', name)
    await page.screenshot({ path })
    await page.close()
    console.log(path)
  }
} finally {
  await browser.close()
  server.close()
}
