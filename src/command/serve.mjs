import { existsSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { parseArgs } from 'node:util'
import { projectFolder } from './run.mjs'
import { createStaticServer, listen } from './static-server.mjs'

// Serves the built page, prints its address, and stays:
// serve.mjs [FOLDER] [--base /some/path/] [--port NUMBER] [--host ADDRESS]

/** The port that is tried first: what a browser keeps for a page, it keeps for its port. */
const usualPort = 4380

const { values, positionals } = parseArgs({
  allowPositionals: true,
  options: { base: { type: 'string' }, port: { type: 'string' }, host: { type: 'string' } },
})
const folder = resolve(projectFolder, positionals[0] ?? 'dist')
const base = `/${values.base ?? ''}/`.replace(/\/+/g, '/')
const host = values.host ?? '127.0.0.1'
const ports = values.port === undefined ? [usualPort, usualPort + 1, 0] : [Number(values.port)]

if (existsSync(join(folder, 'index.html'))) {
  const port = await listen(createStaticServer(folder, base), ports, host)
  console.log(`Phasogon is at http://${host}:${port}${base}`)
  console.log('Ctrl+C ends it.')
} else {
  console.error(`There is no page in ${folder}: build it with "npm run build".`)
  process.exitCode = 1
}
