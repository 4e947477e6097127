import { StrictMode } from 'react'
import { createRoot } from 'react-dom/client'
import { loadFonts } from './fonts'
import { KeepingContext, openKeeping } from './keep'
import { fetchLater } from './later'
import { acceptDrops, acceptLaunches, browserAddress, keepAddress, openLink } from './link'
import { createOfflineStore, OfflineContext, watchVersions } from './offline'
import { App } from './shell/App'
import { StoreContext } from './store'
import './style.css'
import { createEstimateWorker, createEstimator, settledAnswer, watchEstimate } from './worker'

async function start(): Promise<void> {
  const [{ store, keeping }] = await Promise.all([
    openKeeping(browserAddress.readHash()),
    loadFonts(),
  ])
  keepAddress(store, browserAddress, (hash) => void openLink(store, keeping, hash))
  acceptDrops(store, keeping)
  acceptLaunches(store, keeping)
  const showTitle = () => {
    document.title = `${store.getState().history.sheet.title || 'Untitled sheet'} · Phasogon`
  }
  showTitle()
  store.subscribe(showTitle)
  const root = document.getElementById('root')
  if (!root) throw new Error('The page has no element called root.')
  const offline = createOfflineStore()
  createRoot(root).render(
    <StrictMode>
      <StoreContext value={store}>
        <KeepingContext value={keeping}>
          <OfflineContext value={offline}>
            <App />
          </OfflineContext>
        </KeepingContext>
      </StoreContext>
    </StrictMode>,
  )
  // The development server has no service worker.
  const workers = import.meta.env.PROD ? navigator.serviceWorker : undefined
  await watchVersions(offline, workers, {
    settled: keeping.keeper.settled,
    reload: () => window.location.reload(),
  })
  watchEstimate(store, createEstimator(createEstimateWorker), {
    setTimeout: (act, milliseconds) => window.setTimeout(act, milliseconds),
    clearTimeout: (timer) => window.clearTimeout(timer),
  })
  await fetchLater()
  // The first answer shows that the worker was fetched, and its spare with it.
  await settledAnswer(store, 60_000)
  // From here on the page asks for nothing any more.
  document.documentElement.dataset.settled = 'true'
}

void start()
