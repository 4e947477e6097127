import type { OfflineStore } from './state'

/** The part of the browser's service workers that is needed, so that a test can stand in for it. */
export type Workers = Pick<
  ServiceWorkerContainer,
  'controller' | 'register' | 'addEventListener' | 'ready'
>

/** What a newer version must wait for, and how the page is loaded anew. */
export interface PageServices {
  /** Settles when nothing is on its way into the store of sheets any longer. */
  readonly settled: () => Promise<void>
  readonly reload: () => void
}

/**
 * Keeps the page for use without a network, and tells `store` of newer versions. One that was fetched
 * waits until the user agrees; only then, and with everything kept, is the page loaded anew. Settles
 * when this version is kept, or where the browser keeps none.
 */
export async function watchVersions(
  store: OfflineStore,
  workers: Workers | undefined,
  { settled, reload }: PageServices,
): Promise<void> {
  if (!workers) return
  const isFirst = workers.controller === null
  const registration = await workers
    .register('./service-worker.js', { updateViaCache: 'none' })
    .catch(() => undefined)
  // Without a service worker the page needs its network to open, and works all the same.
  if (!registration) return
  let hasAgreed = false
  store.setState({
    takeOver: () => {
      hasAgreed = true
      registration.waiting?.postMessage('take-over')
    },
  })
  onNewer(registration, () => {
    if (workers.controller) store.setState({ newer: 'waiting' })
  })
  let isOwnStart = isFirst
  workers.addEventListener('controllerchange', () => {
    if (hasAgreed) void settled().then(reload)
    // The first worker of all takes the page as it is.
    else if (!isOwnStart) store.setState({ newer: 'elsewhere' })
    isOwnStart = false
  })
  if (isFirst) await workers.ready
}

/** Calls back where a version waits, now or later. */
function onNewer(registration: ServiceWorkerRegistration, listener: () => void): void {
  const check = () => {
    if (registration.waiting) listener()
  }
  registration.addEventListener('updatefound', () => {
    registration.installing?.addEventListener('statechange', check)
  })
  check()
}
