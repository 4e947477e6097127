import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { gzipSync } from 'node:zlib'
import type { Browser, Page } from 'playwright-core'
import { type Measure, ratioOfMedians } from '../measure'
import { type BuiltPage, withPages } from '../pages'

/** Opens a page as on a first visit, nothing cached, and waits for its first arrow. */
async function firstVisit<Value>(
  browser: Browser,
  address: string,
  work: (page: Page, fetched: ReadonlySet<string>) => Promise<Value>,
): Promise<Value> {
  const context = await browser.newContext({ viewport: { width: 1280, height: 800 } })
  try {
    const page = await context.newPage()
    const fetched = new Set<string>()
    page.on('requestfinished', (request) => fetched.add(request.url()))
    await page.goto(address)
    await page.waitForFunction(() => performance.getEntriesByName('first-shafts').length > 0)
    return await work(page, fetched)
  } finally {
    await context.close()
  }
}

/** The bytes of everything that a first visit fetches, each file by itself through gzip. */
function bytesOf(browser: Browser, { address, folder }: BuiltPage): Promise<number> {
  return firstVisit(browser, address, async (page, fetched) => {
    await page.waitForLoadState('networkidle')
    const sizes = [...fetched].map((url) => {
      const name = new URL(url).pathname.slice(1)
      return gzipSync(readFileSync(join(folder, name || 'index.html')), { level: 9 }).length
    })
    return sizes.reduce((sum, size) => sum + size, 0)
  })
}

/** The milliseconds from asking for the page to its first arrow. */
function millisecondsTo(browser: Browser, { address }: BuiltPage): Promise<number> {
  return firstVisit(browser, address, (page) =>
    page.evaluate(() => performance.getEntriesByName('first-shafts')[0]?.startTime ?? Number.NaN),
  )
}

export const bytesOfFirstLoad: Measure = {
  name: 'first load, gzipped bytes : bare page with one arrow',
  goal: 1.35,
  measure: () =>
    withPages(
      async ({ browser, ours, bare }) =>
        (await bytesOf(browser, ours)) / (await bytesOf(browser, bare)),
    ),
}

export const firstShaftsOnScreen: Measure = {
  name: 'first shafts on screen : bare page with one arrow',
  goal: 1.15,
  measure: () =>
    withPages(({ browser, ours, bare }) =>
      ratioOfMedians(
        {
          ours: () => millisecondsTo(browser, ours),
          theirs: () => millisecondsTo(browser, bare),
        },
        15,
      ),
    ),
}
