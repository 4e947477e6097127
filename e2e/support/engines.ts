import { existsSync } from 'node:fs'
import { chromium, firefox } from '@playwright/test'
import { browserFlags } from '../../src/command/browser.mjs'
import { maybeFirefox, maybeWebKit } from '../../src/command/engines.mjs'
import type { Visitor } from './visitor'
import { openWebKit } from './webkit'

/** An engine by its name: how to start it, or undefined where this machine has none. */
export interface Engine {
  readonly name: string
  readonly start: (() => Promise<Visitor>) | undefined
}

/** The three engines, as this machine has them. */
export function engines(): readonly Engine[] {
  const chromiumPath = process.env.PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH ?? ''
  const firefoxPath = maybeFirefox()
  const webkit = maybeWebKit()
  return [
    {
      name: 'Chromium',
      start: existsSync(chromiumPath)
        ? async () =>
            toVisitor(await chromium.launch({ executablePath: chromiumPath, args: browserFlags }))
        : undefined,
    },
    {
      name: 'Firefox',
      start: firefoxPath
        ? async () =>
            toVisitor(await firefox.launch({ executablePath: firefoxPath, channel: 'moz-firefox' }))
        : undefined,
    },
    { name: 'WebKit', start: webkit ? () => openWebKit(webkit) : undefined },
  ]
}

async function toVisitor(browser: Awaited<ReturnType<typeof chromium.launch>>): Promise<Visitor> {
  const page = await browser.newPage({ viewport: { width: 1280, height: 800 } })
  return {
    open: async (address) => {
      await page.goto(address)
    },
    run: <Value>(expression: string) => page.evaluate<Value>(expression),
    end: () => browser.close(),
  }
}
