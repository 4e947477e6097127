import type { Plugin } from 'vite'
import headers from './headers.json' with { type: 'json' }

/**
 * Writes the content-security policy into the head of the built page, for hosts that send no headers
 * of ours. Not while developing: the development server's own scripts would break it.
 */
export function policyPlugin(): Plugin {
  return {
    name: 'content-security-policy',
    apply: 'build',
    transformIndexHtml: () => [
      {
        tag: 'meta',
        attrs: {
          'http-equiv': 'Content-Security-Policy',
          content: headers['Content-Security-Policy'],
        },
        injectTo: 'head-prepend',
      },
    ],
  }
}
