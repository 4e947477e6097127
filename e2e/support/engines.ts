import { existsSync } from 'node:fs'
import { chromium, firefox } from '@playwright/test'
import { browserFlags } from '../../src/command/browser.mjs'
import { maybeFirefox, maybeWebKit } from '../../src/command/engines.mjs'
import { openWebKit } from './webkit'

/** A browser with one window, driven alike whatever its engine. */
export interface Visitor {
  open(address: string): Promise<void>
  /** Runs an expression in the page, and promises what it gives. */
  run<Value>(expression: string): Promise<Value>
  end(): Promise<void>
}

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
