import { engines } from './support/engines'
import { serve } from './support/own-server'
import { expect, test } from './support/test'
import type { Visitor } from './support/visitor'

/** Waits until an expression holds in the page. */
async function until(visitor: Visitor, expression: string): Promise<void> {
  await expect
    .poll(() => visitor.run<boolean>(`Boolean(${expression})`).catch(() => false), {
      message: expression,
      timeout: 20_000,
    })
    .toBe(true)
}

const isReady = "document.documentElement.dataset.ready === 'true'"
const isSettled = "document.documentElement.dataset.settled === 'true'"
const title = `document.querySelector('.title-field').value`

/** Types a title as the page hears it: the field is entered, changed and left. */
function typeTitle(text: string): string {
  return `(() => {
    const field = document.querySelector('.title-field')
    field.focus()
    Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value').set.call(field, ${JSON.stringify(text)})
    field.dispatchEvent(new InputEvent('input', { bubbles: true }))
    field.blur()
  })()`
}

function clickVerb(text: string): string {
  return `[...document.querySelectorAll('button')].find((each) => each.textContent === ${JSON.stringify(text)}).click()`
}

for (const { name, start } of engines()) {
  test(`opens and works in ${name} with the server down, after one visit`, async () => {
    test.skip(start === undefined, `${name} is not on this machine.`)
    test.setTimeout(600_000)
    const server = await serve()
    const visitor = await (start as NonNullable<typeof start>)()
    try {
      await visitor.open(server.address)
      await until(visitor, isSettled)
      await visitor.run(typeTitle('Typed at the switchboard'))
      await until(visitor, "location.hash.startsWith('#sheet=')")

      server.stop()
      await expect(fetch(server.address)).rejects.toThrow()
      await visitor.open(server.address)
      await until(visitor, isReady)
      await until(visitor, `${title} === 'Typed at the switchboard'`)
      expect(await visitor.run(`document.fonts.check('16px "Phasogon Symbol"')`)).toBe(true)

      // Everything works, also what is fetched at need.
      await until(visitor, isSettled)
      await visitor.run(typeTitle('Typed without a network'))
      await until(visitor, `document.title.startsWith('Typed without a network')`)
      await visitor.run(clickVerb('Share'))
      await visitor.run(clickVerb('QR code of the link'))
      await until(visitor, "document.querySelector('canvas.qr-code')?.width > 100")
      await visitor.open(`${server.address}index.html`)
      await until(visitor, `${isReady} && ${title} === 'Typed without a network'`)
    } finally {
      await visitor.end()
      server.stop()
    }
  })
}
