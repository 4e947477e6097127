import { chmodSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, expect, test, vi } from 'vitest'
import { maybeBrowser } from '../../src/command/browser.mjs'

const made: string[] = []
afterEach(() => {
  vi.unstubAllEnvs()
  for (const folder of made.splice(0)) rmSync(folder, { recursive: true })
})

/** A folder with a program called chromium that ends with this status. */
function folderWithBrowser(status: number): string {
  const folder = mkdtempSync(join(tmpdir(), 'phasogon-browser-'))
  made.push(folder)
  writeFileSync(join(folder, 'chromium'), `#!/bin/sh\nexit ${status}\n`)
  chmodSync(join(folder, 'chromium'), 0o755)
  return folder
}

test('the browser that is named comes first', async () => {
  const named = join(folderWithBrowser(0), 'chromium')
  vi.stubEnv('PATH', folderWithBrowser(0))
  vi.stubEnv('PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH', named)
  expect(await maybeBrowser()).toBe(named)
})

test('a browser that is there but does not start is passed over', async () => {
  const good = folderWithBrowser(0)
  vi.stubEnv('PATH', `${folderWithBrowser(1)}:${good}`)
  vi.stubEnv('PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH', '')
  expect(await maybeBrowser()).toBe(join(good, 'chromium'))
})
