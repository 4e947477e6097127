import { promisifyRequest } from 'idb-keyval'
import { describe, expect, test } from 'vitest'
import { createEntry, type Entry, judge, parseEntry, toCopy } from '../../../src/app/keep/entry'
import { describeProblem, problemOf, StorageError } from '../../../src/app/keep/problem'
import { emptySheet, parseSheetText, type Sheet } from '../../../src/sheet'
import { createWorld, type Page, turns, type World } from './world'

function setTitle({ store }: Page, title: string): void {
  store.getState().edit({ kind: 'set-details', title })
}

async function quiet(page: Page): Promise<void> {
  await turns(20)
  await page.keeper.settled()
  await turns(20)
}

/** Writes into the object store past everything, as a hand does with the browser's own tools. */
function write(world: World, key: string, value: unknown): Promise<unknown> {
  return world.use('readwrite', (objects) => promisifyRequest(objects.put(value, key)))
}

function readRaw(world: World, key: string): Promise<unknown> {
  return world.use('readonly', (objects) => promisifyRequest<unknown>(objects.get(key)))
}

/** A world in which one sheet is kept, and its page gone. */
async function worldWithSheet(title: string): Promise<{ world: World; id: string }> {
  const world = createWorld()
  const page = await world.open()
  setTitle(page, title)
  await quiet(page)
  page.kill()
  return { world, id: page.store.getState().identity.id }
}

function entryOf(title: string, details: Partial<Entry> = {}): Entry {
  const sheet: Sheet = { ...emptySheet(), title }
  return createEntry(sheet, { id: 'a', base: 0, page: 'p', count: 1, ...details })
}

describe('a store that refuses', () => {
  test('for want of room: one sentence, the change stays on the page and in the journal, and is kept once there is room', async () => {
    const { world } = await worldWithSheet('Kept')
    const page = await world.open()
    world.refusal = new DOMException('no room', 'QuotaExceededError')
    setTitle(page, 'Not kept')
    await quiet(page)
    expect(page.keep.getState()).toMatchObject({ problem: 'full', isUnkept: true })
    expect(describeProblem('full')).toMatch(/full.*save the sheet to a file/)
    expect(page.store.getState().history.sheet.title).toBe('Not kept')

    world.refusal = undefined
    setTitle(page, 'Kept again')
    await quiet(page)
    expect(page.keep.getState()).toMatchObject({ problem: undefined, isUnkept: false })
    expect((await world.contents()).sheets.map(({ title }) => title)).toEqual(['Kept again'])
  })

  test('and a page killed then: the next one finds the change in the journal', async () => {
    const { world } = await worldWithSheet('Kept')
    const page = await world.open()
    world.refusal = new DOMException('no room', 'QuotaExceededError')
    setTitle(page, 'Only in the journal')
    await quiet(page)
    page.kill()
    world.refusal = undefined
    const next = await world.open()
    expect(next.store.getState().history.sheet.title).toBe('Only in the journal')
    expect(world.small.length).toBe(0)
  })

  test('altogether, as in some private windows: the example is shown and works, with a sentence', async () => {
    const world = createWorld()
    world.refusal = new DOMException('private', 'SecurityError')
    const page = await world.open()
    setTitle(page, 'Private')
    await quiet(page)
    expect(page.keep.getState().problem).toBe('refused')
    expect(describeProblem('refused')).toMatch(/keeps nothing.*save the sheet to a file/)
    expect(page.store.getState().history.sheet.title).toBe('Private')
  })

  test('because a newer version of the page wrote it: nothing is read, and nothing written over', async () => {
    const { world, id } = await worldWithSheet('From the future')
    const head = { version: 2, touched: 9, saved: 0, unheardOf: true }
    await write(world, 'store', head)
    const record = await readRaw(world, `sheet:${id}`)
    const page = await world.open()
    expect(page.keep.getState().problem).toBe('newer')
    expect(describeProblem('newer')).toMatch(/newer version of the page.*load the page again/)
    setTitle(page, 'Made by an old page')
    await quiet(page)
    expect(page.keep.getState()).toMatchObject({ problem: 'newer', isUnkept: true })
    expect(await readRaw(world, 'store')).toEqual(head)
    expect(await readRaw(world, `sheet:${id}`)).toEqual(record)
  })

  test('is told by the name of what the browser threw', () => {
    expect(problemOf(new DOMException('', 'QuotaExceededError'))).toBe('full')
    expect(problemOf(new DOMException('', 'SecurityError'))).toBe('refused')
    expect(problemOf(new DOMException('', 'InvalidStateError'))).toBe('refused')
    expect(problemOf(new ReferenceError('indexedDB is not defined'))).toBe('refused')
    expect(problemOf(new DOMException('', 'NotFoundError'))).toBe('broken')
    expect(problemOf(new StorageError('newer'))).toBe('newer')
  })
})

describe('a store that was spoiled by hand', () => {
  test('is left as it is, and said; the sheets that can be read are there', async () => {
    const { world, id } = await worldWithSheet('Sound')
    const spoiled: { readonly [name: string]: unknown } = {
      nothing: null,
      text: 'not a record',
      half: { id: 'half', revision: 1 },
      list: [1, 2, 3],
    }
    for (const [name, value] of Object.entries(spoiled)) await write(world, `sheet:${name}`, value)
    const page = await world.open()
    expect(page.store.getState().identity.id).toBe(id)
    const { sheets, broken } = await world.contents()
    expect(sheets.map(({ title }) => title)).toEqual(['Sound'])
    expect(broken.map((record) => record.id).toSorted()).toEqual(Object.keys(spoiled).toSorted())
    setTitle(page, 'Sound, and changed')
    await quiet(page)
    for (const [name, value] of Object.entries(spoiled)) {
      expect(await readRaw(world, `sheet:${name}`)).toEqual(value)
    }
  })

  test('a sheet whose text was altered is not taken for the sheet, and a change to it becomes a copy', async () => {
    const { world, id } = await worldWithSheet('Sound')
    const page = await world.open()
    const record = (await readRaw(world, `sheet:${id}`)) as { text: string }
    const altered = { ...record, text: record.text.replace('Sound', 'Forged') }
    await write(world, `sheet:${id}`, altered)
    expect((await world.contents()).broken).toEqual([{ id, content: altered }])
    setTitle(page, 'Typed since')
    await quiet(page)
    expect(await readRaw(world, `sheet:${id}`)).toEqual(altered)
    expect((await world.contents()).sheets.map(({ title }) => title)).toEqual(['Typed since'])
  })

  test('a head that is gone or spoiled is found again from the sheets', async () => {
    const { world } = await worldWithSheet('First')
    for (const head of [undefined, 'spoiled', { version: 'one', touched: 'x' }]) {
      if (head === undefined) {
        await world.use('readwrite', (objects) => promisifyRequest(objects.delete('store')))
      } else await write(world, 'store', head)
      const page = await world.open()
      page.store.getState().open({ ...emptySheet(), title: `After ${String(head)}` }, 'file')
      await quiet(page)
      expect((await world.contents()).sheets[0]?.title).toBe(`After ${String(head)}`)
      page.kill()
    }
  })

  test('a note in the journal that cannot be read is said once, and is then gone', async () => {
    const { world } = await worldWithSheet('Sound')
    world.small.setItem('phasogon-unsaved:x:y', '{"id":')
    const page = await world.open()
    expect(page.store.getState().notice?.text).toMatch(/cannot be read/)
    expect(world.small.length).toBe(0)
    expect(page.store.getState().history.sheet.title).toBe('Sound')
  })
})

describe('a clock that was set back', () => {
  test('is said, and changes neither the order nor which change wins', async () => {
    const { world } = await worldWithSheet('Before')
    world.clock.now -= 400 * 24 * 3600 * 1000
    const page = await world.open()
    expect((await world.contents()).isClockBack).toBe(true)
    setTitle(page, 'After')
    page.store.getState().open({ ...emptySheet(), title: 'Newest' }, 'file')
    await quiet(page)
    expect((await world.contents()).sheets.map(({ title }) => title)).toEqual(['Newest', 'After'])
    page.kill()
    const next = await world.open()
    expect(next.store.getState().history.sheet.title).toBe('Newest')
  })

  test('by less than a minute, as the network does it, is nothing to speak of', async () => {
    const { world } = await worldWithSheet('Before')
    world.clock.now -= 30_000
    expect((await world.contents()).isClockBack).toBe(false)
  })
})

describe('a kept sheet', () => {
  test('is gone once it is deleted, and is back as it was once it is put back', async () => {
    const { world, id } = await worldWithSheet('To and fro')
    const page = await world.open()
    const before = await world.contents()
    await page.storage.remove(id)
    expect((await world.contents()).sheets).toEqual([])
    const [record] = before.sheets
    if (record) await page.storage.restore(record)
    expect(await world.contents()).toEqual(before)
  })

  test('that was deleted elsewhere is kept anew by the next change to it', async () => {
    const { world, id } = await worldWithSheet('Open here')
    const page = await world.open()
    await page.storage.remove(id)
    setTitle(page, 'Changed since')
    await quiet(page)
    expect((await world.contents()).sheets.map(({ title }) => title)).toEqual(['Changed since'])
  })

  test('put back does not undo a change that was kept since', async () => {
    const { world, id } = await worldWithSheet('Old')
    const page = await world.open()
    const [record] = (await world.contents()).sheets
    await page.storage.remove(id)
    setTitle(page, 'New')
    await quiet(page)
    if (record) await page.storage.restore(record)
    expect((await world.contents()).sheets.map(({ title }) => title)).toEqual(['New'])
  })
})

describe('a change on its way into the store', () => {
  test('survives being written as JSON', () => {
    const entry = entryOf('A', { copy: { of: 'B', why: 'link' } })
    expect(parseEntry(JSON.stringify(entry))).toEqual(entry)
    expect(parseEntry('{}')).toBeUndefined()
    expect(parseEntry('null')).toBeUndefined()
  })

  test('is kept once, whoever brings it in', async () => {
    const world = createWorld()
    const { storage } = await world.open()
    const first = await storage.save(entryOf('A'))
    const second = await storage.save(entryOf('A'))
    expect([first.kind, second.kind]).toEqual(['kept', 'included'])
    expect((await world.contents()).sheets[0]?.revision).toBe(1)
  })

  test('made upon what is no longer kept is in conflict, and its copy has one name whoever makes it', async () => {
    const world = createWorld()
    const { storage } = await world.open()
    await storage.save(entryOf('A'))
    await storage.save(entryOf('B', { page: 'q', base: 1 }))
    const late = entryOf('C', { page: 'r', base: 1 })
    expect((await storage.save(late)).kind).toBe('conflict')
    expect(toCopy(late)).toEqual(toCopy(late))
    expect(toCopy(late).id).not.toBe(toCopy({ ...late, count: 2 }).id)
    expect((await storage.save(toCopy(late))).kind).toBe('kept')
    expect((await storage.save(toCopy(late))).kind).toBe('included')
    const { sheets } = await world.contents()
    expect(sheets.map(({ text }) => parseSheetText(text).ok)).toEqual([true, true])
    expect(judge(undefined, late)).toBe('write')
  })
})
