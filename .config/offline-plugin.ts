import { createHash } from 'node:crypto'
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import type { Plugin } from 'vite'

/** A file of the built page: its address below the page, and what is in it. */
export interface BuiltFile {
  readonly name: string
  readonly content: string | Uint8Array
}

/** What a page without a network does without: what hosts and readers of the project want. */
const leftOut = /^(_headers|licences\.md|screenshot.*\.png|service-worker\.js)$|\.map$/

/**
 * Writes `service-worker.js` beside the page, with the list of all its files and a version that
 * changes whenever one of them does.
 */
export function offlinePlugin(): Plugin {
  let publicFolder = ''
  return {
    name: 'offline',
    apply: 'build',
    enforce: 'post',
    configResolved: (config) => {
      publicFolder = config.publicDir
    },
    generateBundle: {
      order: 'post',
      handler(_, bundle) {
        const built = Object.values(bundle).map((file) => ({
          name: file.fileName,
          content: file.type === 'chunk' ? file.code : file.source,
        }))
        const template = readFileSync(join(import.meta.dirname, 'service-worker.js'), 'utf8')
        const source = writeServiceWorker(template, [...built, ...filesBelow(publicFolder)])
        this.emitFile({ type: 'asset', fileName: 'service-worker.js', source })
      },
    },
  }
}

/** The service worker for these files; the same files always give the same one. */
export function writeServiceWorker(template: string, files: readonly BuiltFile[]): string {
  const kept = files
    .filter(({ name }) => !leftOut.test(name))
    .sort((one, other) => (one.name < other.name ? -1 : 1))
  const hash = createHash('sha256').update(template)
  for (const { name, content } of kept) hash.update(name).update(content)
  // Hosts answer for the folder; the page under its own name may be redirected there.
  const addresses = kept.map(({ name }) => (name === 'index.html' ? './' : name))
  return template
    .replace("'BUILD_VERSION'", JSON.stringify(hash.digest('hex').slice(0, 16)))
    .replace("['BUILD_FILES']", JSON.stringify(addresses))
}

function filesBelow(folder: string): BuiltFile[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => {
      const path = join(entry.parentPath, entry.name)
      return {
        name: path.slice(folder.length + 1).replaceAll('\\', '/'),
        content: readFileSync(path),
      }
    })
}
