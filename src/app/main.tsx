import { StrictMode } from 'react'
import { createRoot } from 'react-dom/client'
import { exampleSheet, parseLink } from '../sheet'
import { loadFonts } from './fonts'
import { acceptDrops, browserAddress, keepAddress, openLink } from './link'
import { App } from './shell/App'
import { createStore, type Store, StoreContext } from './store'
import './style.css'

/** The store with the sheet that the address carries, else with the example. */
function createFirstStore(hash: string): Store {
  if (hash === '' || hash === '#') return createStore(exampleSheet, 'example')
  const result = parseLink(hash)
  if (result.ok) return createStore(result.sheet, 'link')
  const store = createStore(exampleSheet, 'example')
  store.getState().notify({
    tone: 'problem',
    text: `The link in the address was not opened: ${result.errors[0]?.message ?? 'it holds no sheet.'} The example is shown instead.`,
  })
  return store
}

async function start(): Promise<void> {
  await loadFonts()
  const store = createFirstStore(browserAddress.readHash())
  keepAddress(store, browserAddress, (hash) => openLink(store, hash))
  acceptDrops(store)
  store.subscribe((state) => {
    document.title = `${state.history.sheet.title || 'Untitled sheet'} · Phasogon`
  })
  const root = document.getElementById('root')
  if (!root) throw new Error('The page has no element called root.')
  createRoot(root).render(
    <StrictMode>
      <StoreContext value={store}>
        <App />
      </StoreContext>
    </StrictMode>,
  )
}

void start()
