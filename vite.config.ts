import react from '@vitejs/plugin-react'
import { defineConfig } from 'vitest/config'
import { iconPlugin } from './.config/icon-plugin.ts'
import { offlinePlugin } from './.config/offline-plugin.ts'
import { policyPlugin } from './.config/policy-plugin.ts'

/** What every page needs and a new release seldom changes: a chunk that browsers keep. */
const frame = /\/node_modules\/(react|react-dom|react-reconciler|scheduler|konva|react-konva)\//

/** What the PDF library would draw web pages with: pages of a report need none of it. */
const unused = ['canvg', 'dompurify', 'html2canvas']

export default defineConfig({
  plugins: [react(), policyPlugin(), iconPlugin(), offlinePlugin()],
  // Relative addresses, so that the page works from any sub-path.
  base: './',
  build: {
    // The policy lets no data address run or style anything.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    // The notices that the packages' licences ask for travel with the page.
    license: { fileName: 'licences.md' },
    rolldownOptions: {
      external: unused,
      output: { codeSplitting: { groups: [{ name: 'frame', test: frame }] } },
    },
  },
  test: {
    include: ['test/**/*.test.{ts,tsx}'],
    environment: 'node',
    // What a file imports is read once for all of them: half the time of the run.
    pool: 'threads',
    isolate: false,
    // For what hangs, not for what is slow: a busy machine fails no test.
    testTimeout: 120_000,
    hookTimeout: 120_000,
  },
})
