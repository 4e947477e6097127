import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { runInNewContext } from 'node:vm'
import { describe, expect, test } from 'vitest'
import { writeServiceWorker } from '../../.config/offline-plugin'

const template = readFileSync('.config/service-worker.js', 'utf8')

/** The list of files and the version, as the service worker itself reads them. */
function stateOf(source: string): { version: string; files: string[] } {
  const self = { location: { href: 'https://sheet.example/sub/service-worker.js' } }
  const quiet = { ...self, addEventListener: () => undefined }
  return runInNewContext(`${source}\n;({ version, files })`, { self: quiet, URL })
}

const files = [
  { name: 'index.html', content: '<p>' },
  { name: 'assets/b-1.js', content: 'b' },
  { name: 'fonts/a.woff2', content: new Uint8Array([1, 2]) },
]

describe('the service worker that the build writes', () => {
  test('lists every file, the page as its folder, and leaves out what only hosts and readers want', () => {
    const extra = [
      '_headers',
      'licences.md',
      'screenshot.png',
      'screenshot-narrow.png',
      'assets/b-1.js.map',
    ]
    const all = [...files, ...extra.map((name) => ({ name, content: '' }))]
    expect(stateOf(writeServiceWorker(template, all)).files).toEqual([
      'assets/b-1.js',
      'fonts/a.woff2',
      './',
    ])
  })

  test('has the same version for the same files in any order, and another for another byte', () => {
    const { version } = stateOf(writeServiceWorker(template, files))
    expect(version).toMatch(/^[0-9a-f]{16}$/)
    expect(stateOf(writeServiceWorker(template, [...files].reverse())).version).toBe(version)
    const changed = files.map((file, at) => (at === 1 ? { ...file, content: 'c' } : file))
    expect(stateOf(writeServiceWorker(template, changed)).version).not.toBe(version)
  })

  test('changes its version when it itself is changed', () => {
    const { version } = stateOf(writeServiceWorker(template, files))
    expect(stateOf(writeServiceWorker(`${template}\n`, files)).version).not.toBe(version)
  })
})

/** Width and height of a PNG, read from its header. */
function sizeOfPng(path: string): string {
  const bytes = readFileSync(path)
  expect(bytes.subarray(1, 4).toString('latin1')).toBe('PNG')
  return `${bytes.readUInt32BE(16)}x${bytes.readUInt32BE(20)}`
}

describe('the manifest', () => {
  const manifest = JSON.parse(readFileSync('public/manifest.webmanifest', 'utf8'))

  test('names icons and screenshots that exist, at the sizes that it states', () => {
    const pictures = [...manifest.icons, ...manifest.screenshots]
    expect(pictures.length).toBeGreaterThan(4)
    for (const { src, sizes } of pictures) {
      const path = join('public', src)
      if (src.endsWith('.svg')) expect(readFileSync(path, 'utf8')).toContain('<svg')
      else expect(sizeOfPng(path), src).toBe(sizes)
    }
  })

  test('has only relative addresses, so that the page can be installed from any path', () => {
    const { start_url, scope, id, icons, screenshots, file_handlers } = manifest
    const addresses = [start_url, scope, id, file_handlers[0].action]
    for (const { src } of [...icons, ...screenshots]) addresses.push(src)
    for (const address of addresses) expect(address).not.toMatch(/^(\/|\w+:)/)
  })

  test('takes sheets, and the drawings and reports that carry one', () => {
    expect(manifest.file_handlers[0].accept).toEqual({
      'application/json': ['.phasogon.json'],
      'image/svg+xml': ['.svg'],
      'application/pdf': ['.pdf'],
    })
  })
})
