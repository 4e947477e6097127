import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { policyPlugin } from '../../.config/policy-plugin'
import { createStaticServer, listen } from '../../src/command/static-server.mjs'

const wanted: Record<string, string> = JSON.parse(readFileSync('.config/headers.json', 'utf8'))
const policy = wanted['Content-Security-Policy'] ?? ''

/** The headers in the form that static hosts read: a path, then a header a line, indented. */
function parseHeadersFile(text: string): Record<string, string> {
  const [path, ...lines] = text.trimEnd().split('\n')
  expect(path).toBe('/*')
  return Object.fromEntries(
    lines.map((line) => {
      const [, name = '', value = ''] = /^ {2}([\w-]+): (.+)$/.exec(line) ?? []
      return [name, value]
    }),
  )
}

describe('the content-security policy', () => {
  test('is strict: nothing from elsewhere, nothing inline, nothing evaluated', () => {
    expect(policy).toMatch(/^default-src 'none';/)
    expect(policy).not.toMatch(/unsafe|https?:|\*/)
    expect(policy).toContain("script-src 'self';")
    expect(policy).toContain("style-src 'self';")
    expect(policy).toContain("base-uri 'none'")
    expect(policy).toContain("form-action 'none'")
  })

  test('is one in its three copies: what is served, what static hosts read, what the page carries', async () => {
    expect(parseHeadersFile(readFileSync('public/_headers', 'utf8'))).toEqual(wanted)

    const server = createStaticServer('public')
    const port = await listen(server, [0])
    const served = await fetch(`http://127.0.0.1:${port}/_headers`)
    server.close()
    for (const [name, value] of Object.entries(wanted)) expect(served.headers.get(name)).toBe(value)

    const plugin = policyPlugin()
    expect(plugin.apply).toBe('build')
    expect(plugin.transformIndexHtml).toBeTypeOf('function')
    const tags = (plugin.transformIndexHtml as () => unknown)()
    expect(tags).toEqual([
      {
        tag: 'meta',
        attrs: { 'http-equiv': 'Content-Security-Policy', content: policy },
        injectTo: 'head-prepend',
      },
    ])
  })
})
