import { join } from 'node:path'
import { projectFolder } from '../../src/command/run.mjs'
import { createStaticServer, listen } from '../../src/command/static-server.mjs'

/** A server of the built page, or of a copy of it, that a test can watch and take down. */
export interface OwnServer {
  readonly address: string
  /** The path of each request, in their order. */
  readonly requests: readonly string[]
  stop(): void
}

/** Serves a folder below a sub-path, on a port of its own. */
export async function serve(folder: string = join(projectFolder, 'dist')): Promise<OwnServer> {
  const base = '/switchboard/'
  const server = createStaticServer(folder, base)
  const port = await listen(server, [0])
  const requests: string[] = []
  server.on('request', (request) => requests.push(request.url ?? ''))
  return {
    address: `http://127.0.0.1:${port}${base}`,
    requests,
    stop: () => {
      server.close()
      server.closeAllConnections()
    },
  }
}
