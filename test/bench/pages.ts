import { mkdtempSync, rmSync } from 'node:fs'
import type { Server } from 'node:http'
import { tmpdir } from 'node:os'
import { join, resolve } from 'node:path'
import { type Browser, chromium } from 'playwright-core'
import { build } from 'vite'
import { browserFlags, maybeBrowser } from '../../src/command/browser.mjs'
import { createStaticServer, listen } from '../../src/command/static-server.mjs'

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
export async function withPages<Value>(work: (pages: Pages) => Promise<Value>): Promise<Value> {
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
    const ours = await open('vite.config.ts', 'ours')
    const bare = await open('test/bench/bare/vite.config.ts', 'bare')
    const executablePath = await maybeBrowser()
    if (executablePath === undefined) throw new Error('There is no Chromium on this machine.')
    const browser = await chromium.launch({ executablePath, args: browserFlags })
    try {
      return await work({ browser, ours, bare })
    } finally {
      await browser.close()
    }
  } finally {
    for (const server of servers) server.close()
    rmSync(folder, { recursive: true, force: true })
  }
}
