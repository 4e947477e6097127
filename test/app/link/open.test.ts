import { afterEach, describe, expect, test } from 'vitest'
import { acceptLaunches } from '../../../src/app/link/launch'
import { openFiles, openLink } from '../../../src/app/link/open'
import { emptySheet, type Sheet, serializeLink, serializeSheet } from '../../../src/sheet'
import { createWorld, type Page, turns, type World } from '../keep/world'

const sheetOf = (title: string): Sheet => ({ ...emptySheet(), title })

function fileOf(title: string, name = `${title}.phasogon.json`): File {
  return new File([serializeSheet(sheetOf(title))], name)
}

function drawingOf(title: string): File {
  const text = serializeSheet(sheetOf(title))
  return new File([`<svg><metadata><![CDATA[${text}]]></metadata></svg>`], `${title}.svg`)
}

/** As small as a PDF with an attachment can be; other readers would want more. */
function printOf(title: string): File {
  const text = new TextEncoder().encode(serializeSheet(sheetOf(title)))
  const head = `%PDF-1.7\n1 0 obj\n<< /Type /EmbeddedFile /Length ${text.length} >>\nstream\n`
  return new File([head, text, '\nendstream\nendobj\n%%EOF\n'], `${title}.pdf`)
}

async function keptTitles(world: World, page: Page): Promise<readonly string[]> {
  await turns(20)
  await page.keeper.settled()
  return (await world.contents()).sheets.map(({ title }) => title)
}

const titleOf = ({ store }: Page) => store.getState().history.sheet.title

describe('files', () => {
  test('of several the first is shown, and all are kept', async () => {
    const world = createWorld()
    const page = await world.open()
    await openFiles(page.store, page, [fileOf('One'), drawingOf('Two'), printOf('Three')])
    expect(titleOf(page)).toBe('One')
    expect(await keptTitles(world, page)).toEqual(['One', 'Two', 'Three'])
    expect(page.store.getState().notice?.text).toMatch(/^3 sheets opened/)
  })

  test('that hold no sheet are named with the reason, and cost nothing', async () => {
    const world = createWorld()
    const page = await world.open()
    const bare = new File(['<svg/>'], 'bare.svg')
    const notes = new File(['hello'], 'notes.txt')
    const huge = new File([' '.repeat(5_000_001)], 'huge.json')
    const print = new File(['%PDF-1.7\n%%EOF\n'], 'print.pdf')
    await openFiles(page.store, page, [bare, notes, fileOf('Good'), huge, print])
    expect(titleOf(page)).toBe('Good')
    const { notice } = page.store.getState()
    expect(notice?.tone).toBe('problem')
    for (const name of ['bare.svg', 'notes.txt', 'huge.json', 'print.pdf'])
      expect(notice?.text).toContain(name)
    expect(await keptTitles(world, page)).toEqual(['Good'])
  })

  test('opened again as they were are not kept twice', async () => {
    const world = createWorld()
    const page = await world.open()
    await openFiles(page.store, page, [fileOf('Same')])
    await keptTitles(world, page)
    page.store.getState().open(emptySheet(), 'new')
    await openFiles(page.store, page, [fileOf('Same')])
    expect(titleOf(page)).toBe('Same')
    expect(await keptTitles(world, page)).toEqual(['Same'])
  })

  test('never replace what is kept: another state of a sheet is a sheet of its own', async () => {
    const world = createWorld()
    const page = await world.open()
    await openFiles(page.store, page, [fileOf('State')])
    page.store.getState().edit({ kind: 'set-details', title: 'State, changed' })
    await keptTitles(world, page)
    await openFiles(page.store, page, [fileOf('State')])
    expect(await keptTitles(world, page)).toEqual(['State', 'State, changed'])
  })

  test('are opened where the browser keeps nothing', async () => {
    const world = createWorld()
    const page = await world.open()
    world.refusal = new DOMException('full', 'QuotaExceededError')
    await openFiles(page.store, page, [fileOf('Shown')])
    expect(titleOf(page)).toBe('Shown')
    await turns(20)
    expect(page.keep.getState().problem).toBe('full')
  })
})

describe('files with which the system starts the page', () => {
  afterEach(() => {
    Reflect.deleteProperty(globalThis, 'window')
  })

  test('are opened, as many as there are', async () => {
    const world = createWorld()
    const page = await world.open()
    let consumer: ((parameters: object) => unknown) | undefined
    const setConsumer = (given: typeof consumer) => {
      consumer = given
    }
    Object.assign(globalThis, { window: { launchQueue: { setConsumer } } })
    acceptLaunches(page.store, page)
    const files = [fileOf('First'), fileOf('Second')]
    await consumer?.({ files: files.map((file) => ({ getFile: async () => file })) })
    expect(titleOf(page)).toBe('First')
    expect(await keptTitles(world, page)).toEqual(['First', 'Second'])
    await consumer?.({})
    expect(titleOf(page)).toBe('First')
  })

  test('are none where the browser hands none over', async () => {
    const world = createWorld()
    const page = await world.open()
    Object.assign(globalThis, { window: {} })
    acceptLaunches(page.store, page)
    expect(page.store.getState().origin).toBe('example')
  })
})

describe('a link opened while the page runs', () => {
  test('shows the kept sheet where it is one’s own, and a copy where it is not', async () => {
    const world = createWorld()
    const page = await world.open()
    page.store.getState().edit({ kind: 'set-details', title: 'Early' })
    const early = serializeLink(page.store.getState().history.sheet)
    page.store.getState().edit({ kind: 'set-details', title: 'Late' })
    await keptTitles(world, page)
    page.store.getState().open(emptySheet(), 'new')
    expect(await openLink(page.store, page, early)).toBe(true)
    expect(titleOf(page)).toBe('Late')
    expect(page.store.getState().notice?.text).toMatch(/earlier state/)

    expect(await openLink(page.store, page, serializeLink(sheetOf('Theirs')))).toBe(true)
    expect(page.store.getState().identity.copy?.of).toBe('Theirs')
    expect(await keptTitles(world, page)).toEqual(['Late'])

    expect(await openLink(page.store, page, 'https://example.org/')).toBe(false)
    expect(titleOf(page)).toBe('Theirs')
  })
})
