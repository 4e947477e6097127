// Keeps the page for use without a network. The build writes the list of files and their version into
// the next two lines; a new version waits until a page asks for it.
const version = 'BUILD_VERSION'
const files = ['BUILD_FILES']

const prefix = 'phasogon-'
const cacheName = prefix + version
const page = new URL('./', self.location.href).href

self.addEventListener('install', (event) => {
  // Past the browser's own cache: a file of another version must not slip in.
  const requests = files.map((file) => new Request(file, { cache: 'no-cache' }))
  event.waitUntil(caches.open(cacheName).then((cache) => cache.addAll(requests)))
})

self.addEventListener('activate', (event) => {
  event.waitUntil(dropOldCaches().then(() => self.clients.claim()))
})

self.addEventListener('message', ({ data }) => {
  if (data === 'take-over') self.skipWaiting()
})

self.addEventListener('fetch', (event) => {
  const { request } = event
  const isOwn = request.url.startsWith(page)
  if (request.method === 'GET' && isOwn) event.respondWith(answer(request))
})

async function answer(request) {
  const cache = await caches.open(cacheName)
  const isPage = request.mode === 'navigate' && isPageAddress(request.url)
  const kept = await cache.match(isPage ? page : request, { ignoreSearch: isPage })
  return kept ?? fetch(request)
}

function isPageAddress(address) {
  const { origin, pathname } = new URL(address)
  return [page, `${page}index.html`].includes(origin + pathname)
}

async function dropOldCaches() {
  const names = await caches.keys()
  const old = names.filter((name) => name.startsWith(prefix) && name !== cacheName)
  await Promise.all(old.map((name) => caches.delete(name)))
}
