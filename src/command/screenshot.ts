import { join } from 'node:path'
import { chromium } from 'playwright-core'
import { browserFlags, maybeBrowser } from './browser.mjs'
import { projectFolder } from './run.mjs'
import { createStaticServer, listen } from './static-server.mjs'

// Takes the README's picture from the built page, as a first visit shows it.
const picture = join(projectFolder, 'public', 'screenshot.png')

const executablePath = await maybeBrowser()
if (executablePath === undefined) throw new Error('There is no Chromium on this machine.')

const server = createStaticServer(join(projectFolder, 'dist'))
const port = await listen(server, [0])
const browser = await chromium.launch({ executablePath, args: browserFlags })
try {
  const page = await browser.newPage({
    viewport: { width: 1360, height: 850 },
    colorScheme: 'light',
  })
  await page.goto(`http://127.0.0.1:${port}/`)
  await page.waitForSelector('html[data-ready]', { state: 'attached' })
  await page.screenshot({ path: picture })
  console.log(picture)
} finally {
  await browser.close()
  server.close()
}
