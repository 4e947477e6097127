import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { serializeLink, serializeSheet } from '../../../src/sheet'
import { createWorld, type Page, turns, type World } from './world'

const titleOf = ({ store }: Page) => store.getState().history.sheet.title
const textOf = ({ store }: Page) => serializeSheet(store.getState().history.sheet)

function setTitle({ store }: Page, title: string): void {
  store.getState().edit({ kind: 'set-details', title })
}

/** Waits until nothing is under way: in the pages, and in what they tell each other. */
async function quiet(...pages: Page[]): Promise<void> {
  for (let round = 0; round < 4; round += 1) {
    await turns(12)
    for (const { keeper } of pages) await keeper.settled()
  }
}

async function titles(world: World): Promise<readonly string[]> {
  return (await world.contents()).sheets.map(({ title }) => title)
}

describe('keeping', () => {
  test('keeps nothing of the example until it is changed', async () => {
    const world = createWorld()
    const page = await world.open()
    await quiet(page)
    expect(await titles(world)).toEqual([])
    setTitle(page, 'Mine')
    await quiet(page)
    expect(await titles(world)).toEqual(['Mine'])
  })

  test('brings the last change back when the page is opened again', async () => {
    const world = createWorld()
    const page = await world.open()
    setTitle(page, 'One')
    setTitle(page, 'Two')
    page.store.getState().undo()
    await quiet(page)
    page.kill()
    const next = await world.open()
    expect(titleOf(next)).toBe('One')
    expect(next.store.getState().origin).toBe('kept')
    expect(next.store.getState().identity).toEqual(page.store.getState().identity)
  })

  test('keeps a sheet from a file at once, and each sheet by itself, the latest change on top', async () => {
    const world = createWorld()
    const page = await world.open()
    setTitle(page, 'First')
    const { sheet } = page.store.getState().history
    page.store.getState().open({ ...sheet, title: 'From a file' }, 'file')
    await quiet(page)
    expect(await titles(world)).toEqual(['From a file', 'First'])
    page.store.getState().goBack()
    setTitle(page, 'First, again')
    await quiet(page)
    expect(await titles(world)).toEqual(['First, again', 'From a file'])
  })

  test('leaves the journal empty once all is kept', async () => {
    const world = createWorld()
    const page = await world.open()
    setTitle(page, 'Noted')
    expect(world.small.length).toBe(1)
    await quiet(page)
    expect(world.small.length).toBe(0)
  })

  test('brings back the last committed change of 200 pages killed at any moment', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(
          fc.record({
            title: fc.string({ minLength: 1, maxLength: 12 }),
            kind: fc.constantFrom('edit', 'edit', 'edit', 'undo', 'redo'),
            pause: fc.integer({ min: 0, max: 9 }),
          }),
          { minLength: 1, maxLength: 12 },
        ),
        async (steps) => {
          const world = createWorld()
          const page = await world.open()
          let isChanged = false
          for (const { title, kind, pause } of steps) {
            if (kind === 'edit') setTitle(page, `t${title.trim()}`)
            else page.store.getState()[kind]()
            isChanged ||= page.store.getState().history.past.length > 0
            await turns(pause)
          }
          page.kill()
          const next = await world.open()
          expect(textOf(next)).toBe(textOf(page))
          expect((await world.contents()).sheets).toHaveLength(isChanged ? 1 : 0)
          expect((await world.contents()).broken).toEqual([])
        },
      ),
      { numRuns: 200 },
    )
  }, 120_000)
})

describe('two tabs on one sheet', () => {
  async function openTwo(world: World): Promise<[Page, Page]> {
    const first = await world.open()
    setTitle(first, 'Start')
    await quiet(first)
    return [first, await world.open()]
  }

  test('see each other’s changes, each as a step that can be taken back', async () => {
    const world = createWorld()
    const [first, second] = await openTwo(world)
    setTitle(first, 'From the first')
    await quiet(first, second)
    expect(titleOf(second)).toBe('From the first')
    second.store.getState().undo()
    await quiet(first, second)
    expect(titleOf(first)).toBe('Start')
    expect(await titles(world)).toEqual(['Start'])
  })

  test('end in a copy where both change it at once, and the page says so', async () => {
    const world = createWorld()
    const [first, second] = await openTwo(world)
    setTitle(first, 'From the first')
    setTitle(second, 'From the second')
    await quiet(first, second)
    expect((await titles(world)).toSorted()).toEqual(['From the first', 'From the second'])
    const copies = [first, second].filter((page) => page.store.getState().identity.copy)
    expect(copies).toHaveLength(1)
    expect(copies[0]?.store.getState().identity.copy?.why).toBe('tabs')
    expect(copies[0]?.store.getState().notice?.text).toMatch(
      /changed in another tab.*Both are kept/,
    )
    // From here on each goes its own way.
    setTitle(first, 'First goes on')
    setTitle(second, 'Second goes on')
    await quiet(first, second)
    expect((await titles(world)).toSorted()).toEqual(['First goes on', 'Second goes on'])
  })

  test('go on with a drag while the other tab’s change comes in', async () => {
    const world = createWorld()
    const [first, second] = await openTwo(world)
    const drag = { kind: 'drag-tip', id: 'Vcable', magnitude: 3, angle: 10 } as const
    second.store.getState().preview(drag)
    setTitle(first, 'Changed during the drag')
    await quiet(first, second)
    expect(second.store.getState().draft?.sheet.title).toBe('Changed during the drag')
    second.store.getState().edit(drag)
    await quiet(first, second)
    expect(titleOf(second)).toBe('Changed during the drag')
    expect(textOf(first)).toBe(textOf(second))
    expect(await titles(world)).toHaveLength(1)
  })

  test('a tab that heard nothing finds out when it comes to the front', async () => {
    const world = createWorld()
    const [first, second] = await openTwo(world)
    const { id } = first.store.getState().identity
    const { sheet } = first.store.getState().history
    first.kill()
    const third = await world.open()
    second.kill()
    setTitle(third, 'Unheard')
    await quiet(third)
    const deaf = await world.open()
    await third.storage.save({
      id,
      base: (await world.contents()).sheets[0]?.revision ?? 0,
      page: 'elsewhere',
      count: 1,
      title: 'Never told',
      words: '',
      text: serializeSheet({ ...sheet, title: 'Never told' }),
    })
    expect(titleOf(deaf)).toBe('Unheard')
    await deaf.keeper.refresh()
    expect(titleOf(deaf)).toBe('Never told')
  })

  test('lose no change of 500 interleaved ones: each is in a kept sheet', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(fc.record({ isFirst: fc.boolean(), pause: fc.integer({ min: 0, max: 14 }) }), {
          minLength: 500,
          maxLength: 500,
        }),
        async (steps) => {
          const world = createWorld()
          const pages = await openTwo(world)
          for (const [index, { isFirst, pause }] of steps.entries()) {
            const page = isFirst ? pages[0] : pages[1]
            const { sheet } = page.store.getState().history
            const notes = `${sheet.job?.notes ?? ''} e${index};`
            expect(page.store.getState().edit({ kind: 'set-job', job: { notes } })).toBe(true)
            await turns(pause)
            if (index % 25 === 24) await joinAgain(world, pages)
          }
          await quiet(...pages)
          const kept = (await world.contents()).sheets.map(({ text }) => text).join('\n')
          const lost = steps.map((_, index) => ` e${index};`).filter((note) => !kept.includes(note))
          expect(lost).toEqual([])
          // Both happen: changes that meet, and changes that cross.
          expect((await world.contents()).sheets.length).toBeGreaterThan(1)
        },
      ),
      { numRuns: 3 },
    )
  }, 120_000)

  /** Brings both pages back to one sheet: that which was changed last. */
  async function joinAgain(world: World, pages: readonly Page[]): Promise<void> {
    await quiet(...pages)
    const [record] = (await world.contents()).sheets
    if (!record) throw new Error('Nothing is kept.')
    for (const { store, keeper } of pages) {
      if (store.getState().identity.id === record.id) continue
      const sheet = JSON.parse(record.text)
      store.getState().open(sheet, 'kept', undefined, { id: record.id })
      keeper.follow(record)
    }
  }
})

describe('a page that is killed while another tab changed its sheet', () => {
  test('leaves its last change as a copy', async () => {
    const world = createWorld()
    const first = await world.open()
    setTitle(first, 'Start')
    await quiet(first)
    const second = await world.open()
    world.refusal = new DOMException('full', 'QuotaExceededError')
    setTitle(first, 'Only noted')
    await quiet(first)
    first.kill()
    world.refusal = undefined
    setTitle(second, 'Kept elsewhere')
    await quiet(second)
    const next = await world.open()
    expect(next.recovered.copies).toBe(1)
    expect(next.store.getState().notice?.text).toMatch(/kept as a copy/)
    expect((await titles(world)).toSorted()).toEqual(['Kept elsewhere', 'Only noted'])
  })
})

describe('links beside what is kept', () => {
  async function keepTwoStates(world: World) {
    const page = await world.open()
    setTitle(page, 'Earlier')
    const link = serializeLink(page.store.getState().history.sheet)
    setTitle(page, 'Later')
    await quiet(page)
    page.kill()
    return link
  }

  test('one’s own stale link loses to the newer state that was kept, and its state can be had as a copy', async () => {
    const world = createWorld()
    const hash = await keepTwoStates(world)
    const page = await world.open({ hash })
    expect(titleOf(page)).toBe('Later')
    const { notice } = page.store.getState()
    expect(notice?.text).toMatch(/earlier state/)
    notice?.verbs?.[0]?.act()
    expect(titleOf(page)).toBe('Earlier')
    expect(page.store.getState().identity.copy).toEqual({ of: 'Earlier', why: 'link' })
    await quiet(page)
    expect(await titles(world)).toEqual(['Later'])
  })

  test('one’s own link to the last state says nothing', async () => {
    const world = createWorld()
    await keepTwoStates(world)
    const last = await world.open()
    const page = await world.open({ hash: serializeLink(last.store.getState().history.sheet) })
    expect(page.store.getState().notice).toBeUndefined()
    expect(page.store.getState().identity).toEqual(last.store.getState().identity)
  })

  test('anyone else’s opens as a copy that bears its title, replaces nothing, and is kept once it is changed', async () => {
    const world = createWorld()
    await keepTwoStates(world)
    const elsewhere = createWorld()
    const theirs = await elsewhere.open()
    setTitle(theirs, 'Theirs')
    const hash = serializeLink(theirs.store.getState().history.sheet)
    await quiet(theirs)
    Object.assign(globalThis, { indexedDB: undefined })

    const page = await world.open({ hash })
    expect(titleOf(page)).toBe('Theirs')
    expect(page.store.getState().identity.copy).toEqual({ of: 'Theirs', why: 'link' })
    await quiet(page)
    expect(await titles(world)).toEqual(['Later'])

    setTitle(page, 'Theirs, checked')
    await quiet(page)
    expect(await titles(world)).toEqual(['Theirs, checked', 'Later'])
    const [record] = (await world.contents()).sheets
    expect(record?.copy).toEqual({ of: 'Theirs', why: 'link' })

    // "Make it mine" leaves nothing of the copy but the sheet.
    const { id } = page.store.getState().identity
    page.store.getState().identify(id, { id })
    await quiet(page)
    expect((await world.contents()).sheets[0]?.copy).toBeUndefined()
    expect((await world.contents()).sheets[0]?.title).toBe('Theirs, checked')
  })

  test('of two sheets with the same state, the tab’s own is meant', async () => {
    const world = createWorld()
    const hash = await keepTwoStates(world)
    const page = await world.open()
    const { identity, history } = page.store.getState()
    await page.keeper.keepAside('twin', history.sheet, 0)
    page.kill()
    const own = await world.open({ hash: serializeLink(history.sheet), last: identity.id })
    expect(own.store.getState().identity.id).toBe(identity.id)
    expect(hash).not.toBe('')
    const twin = await world.open({ hash: serializeLink(history.sheet), last: 'twin' })
    expect(twin.store.getState().identity.id).toBe('twin')
  })
})
