export { createOfflineStore } from './state'
export { OfflineContext, VersionNote } from './VersionNote'
export { type Workers, watchVersions } from './versions'
