import { test as base, expect } from '@playwright/test'

/** What went wrong in the browser without any test asking for it, as sentences. */
export interface Faults {
  readonly seen: string[]
}

/**
 * Every test is also a test that the page keeps quiet: no script error, nothing that the
 * content-security policy had to stop, no request to anywhere but the folder the page was served
 * from. A test that provokes such a thing takes it out of `faults.seen` itself.
 */
export const test = base.extend<{ faults: Faults }>({
  faults: [
    async ({ context, baseURL }, use) => {
      const seen: string[] = []
      await context.addInitScript(() => {
        document.addEventListener('securitypolicyviolation', (event) => {
          console.error(`The policy stopped ${event.violatedDirective} ${event.blockedURI}`)
        })
      })
      context.on('console', (message) => {
        if (message.type() === 'error') seen.push(`Console: ${message.text()}`)
      })
      context.on('weberror', (error) => seen.push(`Script: ${error.error()}`))
      context.on('request', (request) => {
        if (!isOwn(request.url(), baseURL ?? '')) seen.push(`Request: ${request.url()}`)
      })
      await use({ seen })
      expect(seen, 'what the browser complained of').toEqual([])
    },
    { auto: true },
  ],
})

/** Whether a request stays with the page: its own files, and what it made itself. */
function isOwn(address: string, base: string): boolean {
  return address.startsWith(base) || /^(blob|data|file|about):/.test(address)
}

export { expect }
