import { describe, expect, test } from 'vitest'
import { createOfflineStore } from '../../../src/app/offline/state'
import { type Workers, watchVersions } from '../../../src/app/offline/versions'

/** A browser's service workers, moved by hand. */
function createWorkers({
  isControlled,
  isWaiting = false,
}: {
  isControlled: boolean
  isWaiting?: boolean
}) {
  const posted: unknown[] = []
  const worker = { postMessage: (message: unknown) => posted.push(message) }
  const registration = Object.assign(new EventTarget(), {
    waiting: isWaiting ? worker : null,
    installing: null as EventTarget | null,
  })
  const container = Object.assign(new EventTarget(), {
    controller: isControlled ? {} : null,
    register: async () => registration,
    ready: Promise.resolve(registration),
  })
  return {
    workers: container as unknown as Workers,
    posted,
    /** A newer version is fetched, and waits. */
    fetchNewer: () => {
      const installing = new EventTarget()
      registration.installing = installing
      registration.dispatchEvent(new Event('updatefound'))
      registration.waiting = worker
      installing.dispatchEvent(new Event('statechange'))
    },
    takeControl: () => {
      container.controller = {}
      container.dispatchEvent(new Event('controllerchange'))
    },
  }
}

async function watch(workers: Workers | undefined) {
  const store = createOfflineStore()
  const done: string[] = []
  await watchVersions(store, workers, {
    settled: async () => {
      done.push('kept')
    },
    reload: () => done.push('reloaded'),
  })
  return { store, done }
}

const aMoment = () => new Promise((resolve) => setTimeout(resolve))

describe('a newer version of the page', () => {
  test('waits, is said, and comes only when the user agrees, with everything kept before', async () => {
    const { workers, posted, fetchNewer, takeControl } = createWorkers({ isControlled: true })
    const { store, done } = await watch(workers)
    expect(store.getState().newer).toBe('none')
    fetchNewer()
    expect(store.getState().newer).toBe('waiting')
    await aMoment()
    expect(posted).toEqual([])
    expect(done).toEqual([])

    store.getState().takeOver()
    expect(posted).toEqual(['take-over'])
    takeControl()
    await aMoment()
    expect(done).toEqual(['kept', 'reloaded'])
  })

  test('that waited since an earlier visit is said at once', async () => {
    const { workers } = createWorkers({ isControlled: true, isWaiting: true })
    expect((await watch(workers)).store.getState().newer).toBe('waiting')
  })

  test('let in by another tab reloads nothing here', async () => {
    const { workers, fetchNewer, takeControl } = createWorkers({ isControlled: true })
    const { store, done } = await watch(workers)
    fetchNewer()
    takeControl()
    await aMoment()
    expect(store.getState().newer).toBe('elsewhere')
    expect(done).toEqual([])
  })

  test('is none where the first version of all takes the page', async () => {
    const { workers, takeControl } = createWorkers({ isControlled: false })
    const { store, done } = await watch(workers)
    takeControl()
    await aMoment()
    expect(store.getState().newer).toBe('none')
    expect(done).toEqual([])
  })

  test('matters nothing where the browser has no service workers, or refuses them', async () => {
    expect((await watch(undefined)).store.getState().newer).toBe('none')
    const { workers } = createWorkers({ isControlled: false })
    const refusing = Object.assign(Object.create(workers) as Workers, {
      controller: null,
      register: () => Promise.reject(new Error('refused')),
    })
    expect((await watch(refusing)).store.getState().newer).toBe('none')
  })
})
