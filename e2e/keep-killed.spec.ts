import type { BrowserContext, Page } from '@playwright/test'
import { parseSheetText } from '../src/sheet'
import { addDrivers, createRandom } from './support/drive'
import { keptOf } from './support/kept'
import { isDrawn } from './support/page'
import { expect, test } from './support/test'

/** What the fields show: title, then the magnitudes. */
type Fields = readonly string[]

/** One change that a hand makes, and the pause after it. */
interface Step {
  readonly kind: 'type' | 'Undo' | 'Redo'
  readonly field: number
  readonly text: string
  readonly pause: number
}

const names = [
  'Title of the sheet',
  'Magnitude of Vcable',
  'Magnitude of Vmotor',
  'Angle of Vcable',
] as const

/** In every run of the tests; SEQUENCES=200 kills as many pages as a release is held to. */
const sequences = Number(process.env.SEQUENCES ?? 40)
const parts = 4

test.describe.configure({ mode: 'parallel' })
// Many pages are loaded: as small as they can be, and without their service worker.
test.use({ viewport: { width: 320, height: 240 }, serviceWorkers: 'block' })

for (let part = 0; part < parts; part += 1) {
  test(`the last committed edit is back after a page was killed, part ${part + 1} of ${parts}`, async ({
    context,
    faults,
  }) => {
    test.setTimeout(3_600_000)
    await addDrivers(context)
    let done = 0
    await context.exposeBinding('reportStep', (_, count: number) => {
      done = count
    })
    const seed = 7_001 + part
    const random = createRandom(seed)
    let page = await openPage(context)
    let fields = await readFields(page)
    for (let sequence = 0; sequence < sequences / parts; sequence += 1) {
      const steps = createSteps(random, `${part}.${sequence}`)
      const states = statesAfter(fields, steps)
      done = 0
      const before = await readFields(page)
      expect(before, `seed ${seed}, before sequence ${sequence}`).toEqual(fields)
      await runUntilKilled(page, steps, random)
      const seen = done

      page = await openPage(context)
      fields = await readFields(page)
      // What was reported was committed; what came after it may have been, before its report got out.
      const allowed = states.slice(seen)
      expect(allowed, `seed ${seed}, sequence ${sequence}, after ${seen} steps`).toContainEqual(
        fields,
      )
    }
    const kept = await keptOf(page)
    expect(kept).toHaveLength(1)
    expect(parseSheetText(kept[0]?.text ?? '').ok).toBe(true)
    faults.seen.length = 0
  })
}

async function openPage(context: BrowserContext): Promise<Page> {
  const page = await context.newPage()
  await page.goto('./')
  await isDrawn(page)
  return page
}

function readFields(page: Page): Promise<Fields> {
  return page.evaluate((all) => all.map((name) => window.drive.read(name)), names)
}

function createSteps(random: () => number, name: string): readonly Step[] {
  const count = 1 + Math.floor(random() * 8)
  return Array.from({ length: count }, (_, index): Step => {
    const choice = random()
    const kind = choice < 0.7 ? 'type' : choice < 0.9 ? 'Undo' : 'Redo'
    const field = Math.floor(random() * names.length)
    const figure = (1 + Math.floor(random() * 890) / 100).toFixed(2)
    const unit = field === 0 ? '' : field === 3 ? '°' : ' V'
    return {
      kind,
      field,
      text: field === 0 ? `Sheet ${name}.${index}` : `${figure}${unit}`,
      pause: Math.floor(random() ** 3 * 30),
    }
  })
}

/** What the fields show at first, and after each step: a model of the page, undo and redo included. */
function statesAfter(first: Fields, steps: readonly Step[]): readonly Fields[] {
  let past: readonly Fields[] = []
  let future: readonly Fields[] = []
  let now = first
  return [
    first,
    ...steps.map(({ kind, field, text }) => {
      const [last, next] = [past.at(-1), future[0]]
      if (kind === 'type' && text !== now[field]) {
        past = [...past, now]
        future = []
        now = now.map((old, at) => (at === field ? text : old))
      } else if (kind === 'Undo' && last) {
        future = [now, ...future]
        past = past.slice(0, -1)
        now = last
      } else if (kind === 'Redo' && next) {
        past = [...past, now]
        future = future.slice(1)
        now = next
      }
      return now
    }),
  ]
}

/** Makes the steps as fast as they come, and kills the page at a random moment during or after them. */
async function runUntilKilled(
  page: Page,
  steps: readonly Step[],
  random: () => number,
): Promise<void> {
  const session = await page.context().newCDPSession(page)
  const isCrash = random() < 0.7
  const running = page
    .evaluate(
      async ([all, list]) => {
        const { reportStep } = window as unknown as { reportStep: (count: number) => void }
        for (const [index, { kind, field, text, pause }] of list.entries()) {
          if (kind === 'type') await window.drive.type(all[field] as string, text)
          else await window.drive.press(kind)
          reportStep(index + 1)
          if (pause > 0) await window.drive.wait(pause)
        }
      },
      [names, steps] as const,
    )
    .catch(() => undefined)
  const duration = steps.reduce((sum, { pause }) => sum + pause + 6, 0)
  const moment = new Promise((resolve) => setTimeout(resolve, random() * 1.3 * duration))
  // Some are killed in the midst of their steps, some at the very end of the last one.
  await (random() < 0.6 ? moment : running)
  if (isCrash) {
    const crashed = page.waitForEvent('crash')
    void session.send('Page.crash').catch(() => undefined)
    await crashed
  }
  await page.close()
  await running
}
