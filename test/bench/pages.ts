import { mkdtempSync, rmSync } from 'node:fs'
import type { Server } from 'node:http'
import { tmpdir } from 'node:os'
import { join, resolve } from 'node:path'
import { type Browser, chromium, type Page } from 'playwright-core'
import { build } from 'vite'
import { browserFlags, maybeBrowser } from '../../src/command/browser.mjs'
import { createStaticServer, listen } from '../../src/command/static-server.mjs'
import type {} from './board/main'

/** A page built for production, in a folder of its own, and its address while it is served. */
export interface BuiltPage {
  readonly folder: string
  readonly address: string
}

/** What a measure in a browser works with: our page and the bare one, served alike. */
export interface Pages {
  readonly browser: Browser
  readonly ours: BuiltPage
  readonly bare: BuiltPage
}

/** Builds and serves both pages, starts a browser, runs the work, and clears all of it away. */
export function withPages<Value>(work: (pages: Pages) => Promise<Value>): Promise<Value> {
  const configs = { ours: 'vite.config.ts', bare: 'test/bench/bare/vite.config.ts' }
  return withBuilds(configs, ({ browser, pages }) => work({ browser, ...pages }))
}

/** Builds and serves a page for each configuration, starts a browser, and clears all away afterwards. */
async function withBuilds<Name extends string, Value>(
  configs: { readonly [name in Name]: string },
  work: (built: { browser: Browser; pages: { [name in Name]: BuiltPage } }) => Promise<Value>,
): Promise<Value> {
  const folder = mkdtempSync(join(tmpdir(), 'phasogon-bench-'))
  const servers: Server[] = []
  const open = async (config: string, name: string): Promise<BuiltPage> => {
    const outDir = join(folder, name)
    await build({
      configFile: resolve(config),
      logLevel: 'error',
      build: { outDir, emptyOutDir: true },
    })
    const server = createStaticServer(outDir)
    servers.push(server)
    return { folder: outDir, address: `http://127.0.0.1:${await listen(server, [0])}/` }
  }
  try {
    const pages = {} as { [name in Name]: BuiltPage }
    for (const name in configs) pages[name] = await open(configs[name], name)
    const executablePath = await maybeBrowser()
    if (executablePath === undefined) throw new Error('There is no Chromium on this machine.')
    const browser = await chromium.launch({ executablePath, args: browserFlags })
    try {
      return await work({ browser, pages })
    } finally {
      await browser.close()
    }
  } finally {
    for (const server of servers) server.close()
    rmSync(folder, { recursive: true, force: true })
  }
}

/** Runs the work on the board alone, with a sheet such as `chain=100` or `loose=1000` on it. */
export async function withBoard<Value>(
  sheet: string,
  work: (page: Page) => Promise<Value>,
): Promise<Value> {
  return withBuilds({ board: 'test/bench/board/vite.config.ts' }, async ({ browser, pages }) => {
    const page = await browser.newPage({ viewport: { width: 1000, height: 700 } })
    await page.goto(`${pages.board.address}?${sheet}`)
    await page.waitForFunction(() => window.board !== undefined)
    return work(page)
  })
}
