import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { createFirst } from '../../../src/app/keep/first'
import type { Sheet } from '../../../src/sheet'

/** Links as the first version of their form wrote them. They are never written anew. */
const frozen: readonly { readonly link: string; readonly sheet: Sheet }[] = JSON.parse(
  readFileSync(new URL('fixtures/links-1.json', import.meta.url), 'utf8'),
)

describe('links from earlier versions', () => {
  test('open for ever, as copies that bear their title', () => {
    expect(frozen.length).toBeGreaterThanOrEqual(3)
    for (const { link, sheet } of frozen) {
      const recovered = { copies: 0, unread: 0 }
      const { store } = createFirst({ hash: link, sheets: [], last: undefined, recovered })
      const { history, identity, notice } = store.getState()
      expect(history.sheet).toEqual(sheet)
      expect(identity.copy).toEqual({ of: sheet.title, why: 'link' })
      expect(notice).toBeUndefined()
    }
  })
})
