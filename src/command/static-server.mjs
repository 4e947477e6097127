import { createReadStream, readFileSync } from 'node:fs'
import { realpath, stat } from 'node:fs/promises'
import { createServer } from 'node:http'
import { extname, join, sep } from 'node:path'
import { projectFolder } from './run.mjs'

/** @type {Record<string, string>} */
const types = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.webmanifest': 'application/manifest+json; charset=utf-8',
  '.svg': 'image/svg+xml; charset=utf-8',
  '.png': 'image/png',
  '.ico': 'image/x-icon',
  '.woff2': 'font/woff2',
  '.ttf': 'font/ttf',
  '.txt': 'text/plain; charset=utf-8',
  '.md': 'text/markdown; charset=utf-8',
  '.pdf': 'application/pdf',
}

/** @type {Record<string, string>} */
const policy = JSON.parse(readFileSync(join(projectFolder, '.config', 'headers.json'), 'utf8'))

/**
 * Creates a server of the files of one folder, with the headers that `.config/headers.json` asks of
 * every host. It reads, and never leaves its folder: not by `..`, not by a link, not to a dot file.
 *
 * @param {string} folder
 * @param {string} [base] the path below which the files appear: `/`, or `/some/path/`
 */
export function createStaticServer(folder, base = '/') {
  return createServer((request, response) => {
    answer(folder, base, request).then(
      ({ status, headers, file }) => {
        response.writeHead(status, { ...policy, ...headers })
        if (file === undefined || request.method === 'HEAD') response.end()
        else
          createReadStream(file)
            .on('error', () => response.destroy())
            .pipe(response)
      },
      () => response.writeHead(500, policy).end(),
    )
  })
}

/**
 * @typedef {{ status: number, headers?: Record<string, string | number>, file?: string }} Answer
 */

/**
 * @param {string} folder
 * @param {string} base
 * @param {import('node:http').IncomingMessage} request
 * @returns {Promise<Answer>}
 */
async function answer(folder, base, request) {
  if (request.method !== 'GET' && request.method !== 'HEAD') {
    return { status: 405, headers: { Allow: 'GET, HEAD' } }
  }
  const path = maybePath(request.url ?? '/')
  if (path === undefined) return { status: 400 }
  if (`${path}/` === base) return { status: 301, headers: { Location: base } }
  if (!path.startsWith(base)) return { status: 404 }
  const inside = path.slice(base.length)
  const file = await maybeFile(folder, inside === '' ? 'index.html' : inside)
  if (file === undefined) return { status: 404 }
  return {
    status: 200,
    file: file.path,
    headers: {
      'Content-Type': types[extname(file.path).toLowerCase()] ?? 'application/octet-stream',
      'Content-Length': file.size,
      // The build puts a hash of the content into the names below assets/.
      'Cache-Control': inside.startsWith('assets/')
        ? 'public, max-age=31536000, immutable'
        : 'no-cache',
    },
  }
}

/**
 * The path that a request names, decoded; undefined where it cannot be read.
 *
 * @param {string} url
 */
function maybePath(url) {
  try {
    const path = decodeURIComponent(url.replace(/[?#].*$/s, ''))
    return /[\0\\]/.test(path) ? undefined : path
  } catch {
    return undefined
  }
}

/**
 * The file of that name inside the folder, its links followed; undefined where there is none, or
 * where it is not for others to see.
 *
 * @param {string} folder
 * @param {string} name
 */
async function maybeFile(folder, name) {
  if (name.split('/').some((part) => part.startsWith('.'))) return undefined
  try {
    const root = await realpath(folder)
    const path = await realpath(join(root, name))
    if (!path.startsWith(root + sep)) return undefined
    const found = await stat(path)
    return found.isFile() ? { path, size: found.size } : undefined
  } catch {
    return undefined
  }
}

/**
 * Starts a server and promises the port it got: the first free one of those asked for, in order
 * (0 is any free one).
 *
 * @param {import('node:http').Server} server
 * @param {readonly number[]} ports
 * @param {string} [host]
 * @returns {Promise<number>}
 */
export async function listen(server, ports, host = '127.0.0.1') {
  const [port, ...others] = ports
  if (port === undefined) throw new Error('None of the ports asked for is free.')
  const isTaken = await new Promise((settle, fail) => {
    /** @param {NodeJS.ErrnoException} error */
    const refused = (error) => (error.code === 'EADDRINUSE' ? settle(true) : fail(error))
    server.once('error', refused)
    server.listen(port, host, () => {
      server.off('error', refused)
      settle(false)
    })
  })
  if (isTaken) return listen(server, others, host)
  const address = server.address()
  if (address === null || typeof address === 'string') throw new Error('The server has no port.')
  return address.port
}
