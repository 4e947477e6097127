import { svg } from '../../drawing'
import { serializeSheet } from '../../sheet'
import type { ViewOptions } from '../board'
import type { Store } from '../store'
import { settledAnswer } from '../worker'
import { download } from './download'
import { fileNameOf } from './file-name'
import { printedScene, toPng } from './picture'

/** How long a file waits for the verdict, in milliseconds. */
const PATIENCE_OF_EXPORT = 10_000

/** Saves the drawing as an SVG, true to scale, which carries its sheet. */
export async function saveSvg(store: Store): Promise<void> {
  const isStamped = await settledAnswer(store, PATIENCE_OF_EXPORT)
  const { sheet } = store.getState().history
  const text = svg(printedScene(sheet, viewToSave(store)), serializeSheet(sheet))
  const name = fileNameOf(sheet, 'svg')
  download(new Blob([text], { type: 'image/svg+xml' }), name)
  tell(
    store,
    `Saved “${name}”. Its millimetres are true, and it opens here again.${stampNote(isStamped)}`,
  )
}

/** Saves the drawing as a PNG at 300 dots an inch. */
export async function savePng(store: Store): Promise<void> {
  const isStamped = await settledAnswer(store, PATIENCE_OF_EXPORT)
  const { sheet } = store.getState().history
  await attempt(store, 'No picture was saved', async () => {
    const name = fileNameOf(sheet, 'png')
    download(await toPng(sheet, viewToSave(store)), name)
    tell(
      store,
      `Saved “${name}”. A PNG carries no sheet: save the SVG to open it again.${stampNote(isStamped)}`,
    )
  })
}

/** Puts the drawing on the clipboard as a picture. */
export async function copyPicture(store: Store): Promise<void> {
  const { sheet } = store.getState().history
  await attempt(store, 'The picture was not copied', async () => {
    if (!('ClipboardItem' in window))
      throw new Error('this browser keeps pictures off the clipboard.')
    // Some browsers let a page write only at once after the click, so the picture itself is waited for.
    const settled = settledAnswer(store, PATIENCE_OF_EXPORT)
    const picture = settled.then(() => toPng(sheet, viewToSave(store)))
    await navigator.clipboard.write([new ClipboardItem({ 'image/png': picture })])
    tell(store, `Picture copied: paste it into the report.${stampNote(await settled)}`)
  })
}

/** What of the view stands in what is saved: terminals and regions, and construction lines on request. */
function viewToSave(store: Store): ViewOptions {
  const {
    areTerminalsShown,
    areRegionsShown,
    isConstructionSaved,
    construction,
    isPredictionHidden,
  } = store.getState().pen
  return {
    terminals: areTerminalsShown,
    areRegionsShown,
    withoutPrediction: isPredictionHidden,
    ...(isConstructionSaved && { construction }),
  }
}

function stampNote(isStamped: boolean): string {
  return isStamped
    ? ''
    : ' The stamp is left out: whether the readings agree is not worked out yet.'
}

async function attempt(store: Store, refusal: string, work: () => Promise<void>): Promise<void> {
  try {
    await work()
  } catch (error) {
    const reason = error instanceof Error ? error.message : 'the browser refused.'
    store.getState().notify({
      tone: 'problem',
      text: `${refusal}: ${reason} Save the drawing as an SVG instead.`,
    })
  }
}

function tell(store: Store, text: string): void {
  store.getState().notify({ tone: 'news', text })
}
