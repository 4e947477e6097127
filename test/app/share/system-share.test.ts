import { afterEach, describe, expect, test, vi } from 'vitest'
import { canShare, linkTo, shareSheet, warnedLength } from '../../../src/app/share/system-share'
import { exampleSheet, parseLink, type Sheet } from '../../../src/sheet'

/** A sheet whose link is longer than mail programs bear: its notes hold what hardly packs. */
const longSheet: Sheet = {
  ...exampleSheet,
  job: { notes: Array.from({ length: 900 }, (_, index) => Math.imul(index, 2654435761)).join(' ') },
}

function stubSystem(system: Partial<Navigator>): void {
  vi.stubGlobal('navigator', system)
  vi.stubGlobal('window', { location: { href: 'https://sheets.example.org/phasogon/#old' } })
}

afterEach(() => vi.unstubAllGlobals())

describe('the system’s share sheet', () => {
  test('is offered only where there is one', () => {
    stubSystem({})
    expect(canShare()).toBe(false)
    stubSystem({ share: async () => undefined })
    expect(canShare()).toBe(true)
  })

  test('gets the link to the sheet, upon the address of the page', async () => {
    const shared: ShareData[] = []
    stubSystem({ share: async (data = {}) => void shared.push(data), canShare: () => true })
    expect(await shareSheet(exampleSheet)).toBeUndefined()
    const url = shared[0]?.url ?? ''
    expect(url).toBe(linkTo(exampleSheet))
    expect(url.startsWith('https://sheets.example.org/phasogon/#sheet=')).toBe(true)
    expect(parseLink(url)).toMatchObject({ ok: true, sheet: { title: exampleSheet.title } })
  })

  test('gets the file where the link is too long and the system takes files, else the link', async () => {
    const shared: ShareData[] = []
    const share = async (data = {}) => void shared.push(data)
    stubSystem({ share, canShare: () => true })
    expect(linkTo(longSheet).length).toBeGreaterThan(warnedLength)
    await shareSheet(longSheet)
    expect(shared[0]?.files?.[0]?.name).toMatch(/\.phasogon\.json$/)
    stubSystem({ share, canShare: () => false })
    await shareSheet(longSheet)
    expect(shared[1]?.url).toBe(linkTo(longSheet))
  })

  test('may be put away by the user, and says what else to do where it fails', async () => {
    stubSystem({ share: () => Promise.reject(new DOMException('', 'AbortError')) })
    expect(await shareSheet(exampleSheet)).toBeUndefined()
    stubSystem({ share: () => Promise.reject(new DOMException('', 'NotAllowedError')) })
    expect(await shareSheet(exampleSheet)).toMatch(/copy the link, or save the sheet to a file/)
  })
})
