import type { Keeping } from '../keep'
import type { Store } from '../store'
import { openFiles } from './open'

interface LaunchParameters {
  readonly files?: readonly FileSystemFileHandle[]
}

/** What a browser offers where the page is installed: files that the system hands to it. */
interface LaunchQueue {
  setConsumer(consumer: (parameters: LaunchParameters) => void): void
}

/** Opens the files with which the system starts the installed page, where there is such a thing. */
export function acceptLaunches(store: Store, keeping: Keeping): void {
  const { launchQueue }: { launchQueue?: LaunchQueue } = window as { launchQueue?: LaunchQueue }
  launchQueue?.setConsumer(async ({ files: handles = [] }) => {
    const files = await Promise.all(handles.map((handle) => handle.getFile()))
    if (files.length > 0) await openFiles(store, keeping, files)
  })
}
