import { defineConfig } from '@playwright/test'
import { browserFlags, maybeBrowser } from '../src/command/browser.mjs'

// Looked for once: the workers read this file again, and find it named.
process.env.PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH ??= (await maybeBrowser()) ?? ''

export default defineConfig({
  testDir: '../e2e',
  outputDir: '../test-results',
  workers: 2,
  fullyParallel: true,
  retries: 0,
  // For what hangs, not for what is slow: a busy machine fails no test.
  timeout: 300_000,
  expect: { timeout: 45_000 },
  reporter: 'list',
  use: {
    // Known once the server is up: it prints its address.
    baseURL: process.env.PHASOGON_ADDRESS ?? '',
    // A trace of every test would take a quarter of the time: --trace on makes one of those asked for.
    trace: 'off',
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: process.env.PLAYWRIGHT_CHROMIUM_EXECUTABLE_PATH,
      args: browserFlags,
    },
  },
  projects: [{ name: 'chromium', use: { browserName: 'chromium' } }],
  webServer: {
    // Below a sub-path, and on a free port: the page must not care where it lies.
    command: 'node src/command/serve.mjs --base /jobs/phasogon/ --port 0',
    cwd: '..',
    wait: { stdout: /Phasogon is at (?<phasogon_address>http\S+)/ },
  },
})
