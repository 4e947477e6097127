import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs'
import { type IncomingHttpHeaders, request, type Server } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import fc from 'fast-check'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { createStaticServer, listen } from '../../src/command/static-server.mjs'

const parent = mkdtempSync(join(tmpdir(), 'phasogon-server-'))
const folder = join(parent, 'dist')
const base = '/jobs/phasogon/'
const servers: Server[] = []
let port = 0

beforeAll(async () => {
  mkdirSync(join(folder, 'assets'), { recursive: true })
  mkdirSync(join(parent, 'dist-other'))
  writeFileSync(join(folder, 'index.html'), '<title>page</title>')
  writeFileSync(join(folder, 'assets', 'a-1234.js'), 'export {}')
  writeFileSync(join(folder, 'sum Ω.svg'), '<svg/>')
  writeFileSync(join(folder, '.hidden'), 'secret')
  writeFileSync(join(parent, 'secret.txt'), 'secret')
  writeFileSync(join(parent, 'dist-other', 'secret.txt'), 'secret')
  symlinkSync(join(parent, 'secret.txt'), join(folder, 'way-out.txt'))
  port = await start(createStaticServer(folder, base), [0])
})

afterAll(() => {
  for (const server of servers) server.close()
  rmSync(parent, { recursive: true })
})

async function start(server: Server, ports: number[]): Promise<number> {
  servers.push(server)
  return listen(server, ports)
}

interface Reply {
  status: number
  headers: IncomingHttpHeaders
  body: string
}

/** Asks for a path exactly as written; `fetch` would tidy it first. */
function ask(path: string, method = 'GET', at = port): Promise<Reply> {
  return new Promise((resolve, reject) => {
    const asking = request({ host: '127.0.0.1', port: at, path, method }, (response) => {
      let body = ''
      response.setEncoding('utf8')
      response.on('data', (part) => {
        body += part
      })
      response.on('end', () =>
        resolve({ status: response.statusCode ?? 0, headers: response.headers, body }),
      )
    })
    asking.on('error', reject)
    asking.end()
  })
}

describe('the static server', () => {
  test('serves the page below its sub-path, and nothing beside it', async () => {
    expect(await ask(base)).toMatchObject({ status: 200, body: '<title>page</title>' })
    expect((await ask(`${base}index.html?x=1`)).body).toBe('<title>page</title>')
    expect(await ask('/jobs/phasogon')).toMatchObject({
      status: 301,
      headers: { location: base },
    })
    expect((await ask('/')).status).toBe(404)
    expect((await ask('/index.html')).status).toBe(404)
    expect((await ask(`${base}missing.js`)).status).toBe(404)
    expect((await ask(`${base}assets`)).status).toBe(404)
    expect((await ask(`${base}assets/`)).status).toBe(404)
  })

  test('names the type of each file, and lets browsers keep only what never changes', async () => {
    const page = await ask(base)
    expect(page.headers['content-type']).toBe('text/html; charset=utf-8')
    expect(page.headers['cache-control']).toBe('no-cache')
    const script = await ask(`${base}assets/a-1234.js`)
    expect(script.headers['content-type']).toBe('text/javascript; charset=utf-8')
    expect(script.headers['cache-control']).toBe('public, max-age=31536000, immutable')
    const drawing = await ask(`${base}sum%20%CE%A9.svg`)
    expect(drawing).toMatchObject({ status: 200, body: '<svg/>' })
    expect(drawing.headers['content-type']).toBe('image/svg+xml; charset=utf-8')
  })

  test('answers HEAD without a body, and refuses to be written to', async () => {
    const head = await ask(base, 'HEAD')
    expect(head).toMatchObject({ status: 200, body: '' })
    expect(head.headers['content-length']).toBe('19')
    for (const method of ['POST', 'PUT', 'DELETE']) {
      expect((await ask(base, method)).status).toBe(405)
    }
  })

  test('never leaves its folder', async () => {
    for (const path of [
      '../secret.txt',
      '%2e%2e/secret.txt',
      '%2e%2e%2fsecret.txt',
      'assets/../../secret.txt',
      '../dist-other/secret.txt',
      '..\\secret.txt',
      '/../secret.txt',
      '/etc/passwd',
      '.hidden',
      'way-out.txt',
      'index.html%00.txt',
      '%E0%A4%A',
    ]) {
      const reply = await ask(base + path)
      expect([400, 404], path).toContain(reply.status)
      expect(reply.body, path).toBe('')
    }
  })

  test('never leaves its folder, whatever a path is put together from', async () => {
    const part = fc.constantFrom('..', '.', '%2e%2e', '%2f', '/', '\\', 'assets', 'secret.txt', '')
    const path = fc.array(part, { maxLength: 8 }).map((parts) => parts.join('/'))
    await fc.assert(
      fc.asyncProperty(fc.constantFrom(base, '/'), path, async (start, rest) => {
        expect((await ask(`${start}${rest}`)).body).not.toContain('secret')
      }),
    )
  })

  test('takes the next port where one is in use', async () => {
    const next = await start(createStaticServer(folder), [port, 0])
    expect(next).not.toBe(port)
    expect((await ask('/', 'GET', next)).status).toBe(200)
    await expect(start(createStaticServer(folder), [port])).rejects.toThrow('None of the ports')
  })
})
